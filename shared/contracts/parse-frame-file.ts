import type { Particulars } from '../kernel/particulars/particulars.ts';
import type { FieldError } from './error-codes.ts';
import { fieldErrors } from './field-errors.ts';
import { particulars } from './particulars.ts';

export type ReadFrameFile =
  | { readonly ok: true; readonly particulars: Particulars }
  | { readonly ok: false; readonly message: string; readonly fields: FieldError[] };

/** Reads the text of a frame file. Never throws: what is wrong comes back as a message and field errors. A byte order mark is passed over. */
export function parseFrameFile(text: string): ReadFrameFile {
  let data: unknown;
  try {
    data = JSON.parse(text.replace(/^\uFEFF/, ''));
  } catch (error) {
    return { ok: false, message: `not a frame file: it is not JSON (${(error as Error).message})`, fields: [] };
  }
  const read = particulars.safeParse(data);
  if (read.success) return { ok: true, particulars: read.data };
  const fields = fieldErrors(read.error, data);
  return {
    ok: false,
    message: `not a valid frame file: ${fields.length} ${fields.length === 1 ? 'entry' : 'entries'} to mend`,
    fields,
  };
}
