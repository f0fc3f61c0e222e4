/** Who may do what: the one table behind routes, services and screens. */
export const roles = ['owner', 'estimator', 'foreman'] as const;
export type Role = (typeof roles)[number];

export const permissions = [
  'own-account',
  'see-jobs',
  'edit-jobs',
  'revise',
  'send',
  'see-prices',
  'see-margin',
  'see-price-book',
  'field',
  'manage-firm',
] as const;
export type Permission = (typeof permissions)[number];

type Standing = { role: Role; maySend: boolean; seesMargin: boolean };

const estimatorsOwn: readonly Permission[] = [
  'own-account',
  'see-jobs',
  'edit-jobs',
  'revise',
  'see-prices',
  'see-price-book',
  'field',
];
const foremansOwn: readonly Permission[] = ['own-account', 'see-jobs', 'field'];

/** An owner may do everything; an estimator sends and sees the margin only where the owner lets them. */
export function mayDo({ role, maySend, seesMargin }: Standing, permission: Permission): boolean {
  if (role === 'owner') return true;
  if (role === 'foreman') return foremansOwn.includes(permission);
  if (permission === 'send') return maySend;
  if (permission === 'see-margin') return seesMargin;
  return estimatorsOwn.includes(permission);
}
