import { mayDo, type Permission } from '@/api/contracts/permission';
import type { Member } from '@/api/contracts/session';
import { AppError } from '@/api/errors';

/** @throws AppError `not-allowed` when the member's role or permissions do not reach that far */
export function allow(member: Member, permission: Permission): void {
  if (!mayDo(member, permission)) throw new AppError('not-allowed');
}
