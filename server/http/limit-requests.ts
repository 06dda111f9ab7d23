import { rateLimit } from 'express-rate-limit';
import type { RequestHandler } from 'express';
import { AppError } from '../errors.ts';

/** So many requests from one address in a window; more get 'too-many-requests'. */
export function limitRequests(limit: number, windowMs: number): RequestHandler {
  return rateLimit({
    windowMs,
    limit,
    standardHeaders: 'draft-8',
    legacyHeaders: false,
    handler: (req) => {
      throw new AppError('too-many-requests', `more than ${limit} requests in ${windowMs} ms to ${req.path}`, {
        retryAfter: windowMs / 1000,
      });
    },
  });
}
