import type { ErrorCode, FieldError } from '#shared/contracts/error-codes.ts';

/** Codes of our own for answers that never came, or that no contract knows. */
export type ClientErrorCode = ErrorCode | 'unreachable' | 'unexpected-answer';

/** Every failure of a call to the server, decoded once. */
export class ApiError extends Error {
  /** HTTP status; 0 when there was no answer. */
  readonly status: number;
  readonly code: ClientErrorCode;
  readonly fields: readonly FieldError[];
  /** By code, see the contract of the call. */
  readonly details: unknown;

  constructor(
    status: number,
    code: ClientErrorCode,
    message: string,
    fields: readonly FieldError[] = [],
    details?: unknown,
  ) {
    super(message);
    this.name = 'ApiError';
    this.status = status;
    this.code = code;
    this.fields = fields;
    this.details = details;
  }
}

export const isCode = (error: unknown, code: ClientErrorCode): error is ApiError =>
  error instanceof ApiError && error.code === code;
