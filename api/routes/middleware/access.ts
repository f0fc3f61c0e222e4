import type { RequestHandler } from 'express';

import { mayDo, type Permission } from '@/api/contracts/permission';
import { AppError } from '@/api/errors';

import { memberOf } from './member';

/** Who may pass a route: a permission, or everyone for a stated reason. */
export type Rule = { permission: Permission } | { open: string };
export type Guard = RequestHandler & { rule: Rule };

/** Lets through whoever is signed in and has the permission. */
export function may(permission: Permission): Guard {
  const guard: RequestHandler = (request, _response, next) => {
    if (!mayDo(memberOf(request), permission)) throw new AppError('not-allowed');
    next();
  };
  return Object.assign(guard, { rule: { permission } });
}

/** Lets everyone through; the reason stands where the route is declared. */
export function open(reason: string): Guard {
  const guard: RequestHandler = (_request, _response, next) => next();
  return Object.assign(guard, { rule: { open: reason } });
}
