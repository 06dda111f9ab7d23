import { readFileSync } from 'node:fs';
import { parseFrameFile } from '#shared/contracts/parse-frame-file.ts';
import { LIMITS } from '#shared/contracts/limits.ts';
import type { Particulars } from '#shared/kernel/particulars/particulars.ts';
import { InputError } from './input-error.ts';

const STANDARD_INPUT = 0;

/** Reads a frame file, or standard input for '-'. Throws InputError that names each wrong field. */
export function loadFrame(path: string): Particulars {
  const name = path === '-' ? 'standard input' : path;
  let bytes: Buffer;
  try {
    bytes = readFileSync(path === '-' ? STANDARD_INPUT : path);
  } catch (error) {
    throw new InputError(`${name}: cannot be read (${(error as Error).message})`);
  }
  if (bytes.length > LIMITS.frameFileBytes)
    throw new InputError(`${name}: got ${bytes.length} bytes, takes at most ${LIMITS.frameFileBytes}`);
  const read = parseFrameFile(bytes.toString('utf8'));
  if (!read.ok)
    throw new InputError(
      `${name}: ${read.message}`,
      read.fields.map((f) => f.message),
    );
  return read.particulars;
}
