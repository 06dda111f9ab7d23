import type { ErrorCode, FieldError } from '#shared/contracts/error-codes.ts';

/** Status of each code, and what a person reads unless the error says it better. Exhaustive by its type. */
const TABLE: Record<ErrorCode, { status: number; message: string }> = {
  'invalid-input': { status: 400, message: 'Some entries need mending.' },
  'not-signed-in': { status: 401, message: 'Sign in first.' },
  'wrong-sign-in': { status: 401, message: 'E-mail address and password do not match.' },
  'not-allowed': { status: 403, message: 'Your role in this shop does not allow that.' },
  'not-found': { status: 404, message: 'There is nothing here, or it is not yours to see.' },
  'email-taken': { status: 409, message: 'Somebody has already signed up with this e-mail address.' },
  'name-taken': { status: 409, message: 'This name is taken. Choose another.' },
  'last-owner': { status: 409, message: 'A shop needs an owner. Make somebody else an owner first.' },
  'own-role': { status: 409, message: 'Nobody changes their own role. Another owner can.' },
  'demo-person': { status: 409, message: 'Anybody may enter the demo shop as this person, so they stay as they are.' },
  'stale-draft': { status: 409, message: 'This draft was changed meanwhile.' },
  'frame-has-stops': { status: 422, message: 'A frame with a stop cannot be released.' },
  'cautions-not-acknowledged': { status: 422, message: 'Each caution must be acknowledged before release.' },
  'nothing-changed': { status: 422, message: 'Nothing was changed since the newest revision.' },
  'proof-failed': { status: 422, message: 'The files did not pass their proof, so there is nothing to download.' },
  'drawing-refused': { status: 422, message: 'This file cannot be read as a drawing.' },
  'too-large': { status: 413, message: 'That is too large.' },
  'too-many-requests': { status: 429, message: 'Too many requests. Wait a little and try again.' },
  'cross-site': { status: 403, message: 'This request came from another site and was refused.' },
  internal: { status: 500, message: 'Something went wrong on the server. It has been written to its log.' },
};

export const statusOf = (code: ErrorCode): number => TABLE[code].status;

interface AppErrorParts {
  /** What the person reads; the code's own sentence when absent. */
  message?: string;
  fields?: FieldError[];
  /** Its shape depends on the code; see the contracts. */
  details?: unknown;
  /** Seconds to wait before the next try. */
  retryAfter?: number;
}

/** An error that the server answers with on purpose. `log` is for the server's log, `userMessage` for the person. */
export class AppError extends Error {
  readonly code: ErrorCode;
  readonly userMessage: string;
  readonly fields: FieldError[] | undefined;
  readonly details: unknown;
  readonly retryAfter: number | undefined;

  constructor(code: ErrorCode, log: string, parts: AppErrorParts = {}) {
    super(log);
    this.name = 'AppError';
    this.code = code;
    this.userMessage = parts.message ?? TABLE[code].message;
    this.fields = parts.fields;
    this.details = parts.details;
    this.retryAfter = parts.retryAfter;
  }
}

/** One wrong field, found by something other than a schema. */
export function wrongField(path: string, got: string, takes: string): AppError {
  const message = `${path}: got ${got}, takes ${takes}`;
  return new AppError('invalid-input', message, { fields: [{ path, got, takes, message }] });
}

/** Also what another shop's ids get, so that nobody learns that they exist. */
export const notFound = (what: string): AppError => new AppError('not-found', `no such ${what} in this shop`);
