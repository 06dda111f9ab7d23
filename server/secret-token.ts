import { createHash, randomBytes } from 'node:crypto';

/** SHA-256 of a token, in hex: all that is stored of it. */
export const hashToken = (token: string): string => createHash('sha256').update(token).digest('hex');

/** 256 random bits for a link, in letters that an address may hold, and the hash to know it again by. */
export function newToken(): { readonly token: string; readonly tokenHash: string } {
  const token = randomBytes(32).toString('base64url');
  return { token, tokenHash: hashToken(token) };
}
