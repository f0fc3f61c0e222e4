import { createHash } from 'node:crypto';

/** In hexadecimal, as it is stored and compared. */
export const sha256 = (bytes: Buffer): string => createHash('sha256').update(bytes).digest('hex');

/** A link's token is kept as this alone. */
export const tokenHash = (token: string): Buffer => createHash('sha256').update(token, 'utf8').digest();
