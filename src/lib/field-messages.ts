import type { FieldError } from '#shared/contracts/error-codes.ts';
import { ApiError } from './api-error.ts';

/** Message of each wrong field by its path; what is not here is fine. */
export type FieldMessages = Readonly<Record<string, string>>;

/** Fields whose content is never shown again. */
const SECRET = /password/i;

/** Messages of field errors, without the path: they stand beside the field. The first one of a field counts. */
export function fieldMessages(errors: readonly FieldError[]): FieldMessages {
  const messages: Record<string, string> = {};
  for (const { path, got, takes } of errors) {
    messages[path] ??= SECRET.test(path) ? `Takes ${takes}.` : `Got ${got === '""' ? 'nothing' : got}; takes ${takes}.`;
  }
  return messages;
}

/** Field messages of a failed call; empty when it failed for another reason. */
export const fieldMessagesOf = (error: unknown): FieldMessages =>
  error instanceof ApiError ? fieldMessages(error.fields) : {};
