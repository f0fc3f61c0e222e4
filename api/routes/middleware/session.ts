import connectPgSimple from 'connect-pg-simple';
import type { Request, RequestHandler, Response } from 'express';
import session from 'express-session';
import type { Pool } from 'pg';

declare module 'express-session' {
  interface SessionData {
    accountId: string;
    firmId: string;
  }
}

type SessionOptions = { pool: Pool; secret: string; secure: boolean; prune?: boolean };
const cookieName = 'thickset';
const lifetime = 14 * 24 * 3600 * 1000;

/** Sessions in PostgreSQL, so that two servers share them; each use puts the end off again. */
export function sessions({ pool, secret, secure, prune = true }: SessionOptions): RequestHandler {
  const Store = connectPgSimple(session);
  return session({
    name: cookieName,
    store: new Store({
      pool,
      tableName: 'sessions',
      createTableIfMissing: false,
      pruneSessionInterval: prune ? 900 : false,
    }),
    secret,
    resave: false,
    saveUninitialized: false,
    rolling: true,
    cookie: { httpOnly: true, sameSite: 'lax', secure, maxAge: lifetime },
  });
}

/** A new session id at sign-in, so that an id planted before it is worth nothing. */
export async function beginSession(request: Request, { accountId, firmId }: { accountId: string; firmId: string }) {
  await done((then) => request.session.regenerate(then));
  Object.assign(request.session, { accountId, firmId });
  await done((then) => request.session.save(then));
}

export async function endSession(request: Request, response: Response) {
  await done((then) => request.session.destroy(then));
  response.clearCookie(cookieName);
}

const done = (start: (then: (error?: unknown) => void) => void) =>
  new Promise<void>((resolve, reject) => start((error) => (error ? reject(error) : resolve())));
