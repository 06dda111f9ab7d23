import type { RequestHandler } from 'express';
import { AppError } from '../errors.ts';

const SAFE = new Set(['GET', 'HEAD', 'OPTIONS']);

/**
 * Refuses changes that another site's page sends with a person's cookie. Browsers say where a request comes from in
 * Sec-Fetch-Site, older ones in Origin; a request with neither comes from no browser, and carries nobody's cookie unasked.
 */
export const refuseCrossSite: RequestHandler = (req, _res, next) => {
  if (SAFE.has(req.method)) return next();
  const site = req.get('sec-fetch-site');
  if (site !== undefined) {
    if (site === 'same-origin' || site === 'none') return next();
    throw new AppError('cross-site', `Sec-Fetch-Site: ${site} on ${req.method} ${req.path}`);
  }
  const origin = req.get('origin');
  if (origin !== undefined && hostOf(origin) !== req.host) {
    throw new AppError('cross-site', `Origin ${origin} against Host ${req.host} on ${req.method} ${req.path}`);
  }
  next();
};

function hostOf(origin: string): string | null {
  return URL.canParse(origin) ? new URL(origin).host : null;
}
