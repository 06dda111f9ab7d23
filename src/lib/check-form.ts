import type { z } from 'zod';
import { fieldErrors } from '#shared/contracts/field-errors.ts';
import { fieldMessages, type FieldMessages } from './field-messages.ts';

export type CheckedForm<T> =
  { readonly ok: true; readonly value: T } | { readonly ok: false; readonly fields: FieldMessages };

/** Holds what a form collected against the schema of the request, before anything is sent. */
export function checkForm<T>(schema: z.ZodType<T>, input: unknown): CheckedForm<T> {
  const read = schema.safeParse(input);
  return read.success
    ? { ok: true, value: read.data }
    : { ok: false, fields: fieldMessages(fieldErrors(read.error, input)) };
}
