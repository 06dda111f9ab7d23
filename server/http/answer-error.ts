import type { ErrorRequestHandler, RequestHandler } from 'express';
import { MulterError } from 'multer';
import type { Logger } from 'pino';
import type { ErrorBody } from '#shared/contracts/error-codes.ts';
import { LIMITS } from '#shared/contracts/limits.ts';
import { AppError, notFound, statusOf, wrongField } from '../errors.ts';

/** What body-parser and Express put on the errors they throw themselves (http-errors). */
interface HttpError extends Error {
  status: number;
  type?: string;
}

const isHttpError = (error: unknown): error is HttpError =>
  error instanceof Error && 'status' in error && typeof error.status === 'number';

function fromHttpError(error: HttpError): AppError | null {
  if (error.type === 'entity.too.large') {
    const message = `That is too large: a request takes at most ${LIMITS.jsonBodyBytes} bytes.`;
    return new AppError('too-large', error.message, { message });
  }
  if (error.type === 'entity.parse.failed') {
    return new AppError('invalid-input', error.message, { message: `The request is not valid JSON: ${error.message}` });
  }
  // A path that is no UTF-8 names nothing.
  if (error instanceof URIError || error.status === 404) return notFound('path');
  if (error.status >= 400 && error.status < 500)
    return new AppError('invalid-input', error.message, { message: error.message });
  return null;
}

function fromMulterError(error: MulterError): AppError {
  const field = error.field ?? 'files';
  switch (error.code) {
    case 'LIMIT_FILE_COUNT':
      return wrongField(field, 'more', `at most ${LIMITS.frameFilesAtOnce} files at once`);
    case 'LIMIT_UNEXPECTED_FILE':
      return wrongField(field, 'a file', 'files in the field "files" only');
    default:
      return wrongField(field, error.message, 'frame files, as multipart form data');
  }
}

/** Any error as one that can be answered; what nobody foresaw is 'internal'. */
export function toAppError(error: unknown): AppError {
  if (error instanceof AppError) return error;
  if (error instanceof MulterError) return fromMulterError(error);
  const known = isHttpError(error) ? fromHttpError(error) : null;
  return known ?? new AppError('internal', error instanceof Error ? (error.stack ?? error.message) : String(error));
}

/** The last handler: every error becomes JSON with a stable code. */
export const answerError =
  (log: Logger): ErrorRequestHandler =>
  (error, req, res, next) => {
    // Nobody is there to be answered, and what was given up for that is no fault.
    if (res.destroyed && !res.writableFinished) {
      log.info({ method: req.method, url: req.originalUrl }, 'the asker went away');
      return;
    }
    const known = toAppError(error);
    const status = statusOf(known.code);
    if (status >= 500) log.error({ err: error, method: req.method, url: req.originalUrl }, known.message);
    else log.info({ code: known.code, method: req.method, url: req.originalUrl }, known.message);
    if (res.headersSent) {
      next(error);
      return;
    }
    const body: ErrorBody = {
      code: known.code,
      message: known.userMessage,
      ...(known.fields && { fields: known.fields }),
      ...(known.details !== undefined && { details: known.details }),
    };
    if (known.retryAfter !== undefined) res.setHeader('Retry-After', String(Math.ceil(known.retryAfter)));
    res.removeHeader('Content-Disposition');
    res.setHeader('Cache-Control', 'no-store');
    res.status(status).json(body);
  };

/** For paths under /api that no route took. */
export const noSuchRoute: RequestHandler = (req) => {
  throw new AppError('not-found', `no route ${req.method} ${req.originalUrl}`);
};
