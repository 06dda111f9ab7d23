import type { Request } from 'express';
import { AppError } from '../errors.ts';

/**
 * Where links in mails lead: the configured origin, else the one that the request was sent to, as far as proxies are believed.
 * Throws 'invalid-input' for a host that is none.
 */
export function originOf(req: Request, publicUrl: string | undefined): string {
  if (publicUrl !== undefined) return publicUrl;
  const address = `${req.protocol}://${req.host}`;
  if (!URL.canParse(address)) throw new AppError('invalid-input', `no host to lead a link to: ${address}`);
  return new URL(address).origin;
}
