import type { Request, RequestHandler } from 'express';
import 'express-session';

import type { Member } from '@/api/contracts/session';
import { AppError } from '@/api/errors';
import type { SessionService } from '@/api/services/session-service';

const members = new WeakMap<Request, Member>();

/** Looks up who asks at each request, so that a changed role or a removed person counts at once. */
export function withMember(sessionService: SessionService): RequestHandler {
  return async (request, _response, next) => {
    const { accountId, firmId } = request.session;
    const member = accountId && firmId ? await sessionService.member(firmId, accountId) : undefined;
    if (member) members.set(request, member);
    next();
  };
}

/** @throws AppError `sign-in` when nobody is signed in */
export function memberOf(request: Request): Member {
  const member = members.get(request);
  if (!member) throw new AppError('sign-in');
  return member;
}
