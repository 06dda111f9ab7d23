import type { RequestHandler } from 'express';
import type { Logger } from 'pino';

/** Mailed links open doors: what follows these stays out of the log. */
const SECRET = /(\/(?:join|reset-password)\/)[^/?]+/;

/** A line for each answered request, at level info. Headers are left out: they hold cookies. */
export const logRequests =
  (log: Logger): RequestHandler =>
  (req, res, next) => {
    const began = performance.now();
    res.once('close', () => {
      const ms = Math.round(performance.now() - began);
      log.info(
        {
          method: req.method,
          url: req.originalUrl.replace(SECRET, '$1…'),
          status: res.statusCode,
          complete: res.writableFinished,
          ms,
        },
        'request',
      );
    });
    next();
  };
