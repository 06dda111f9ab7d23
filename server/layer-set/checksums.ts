import { createHash } from 'node:crypto';
import type { LayerSetFile } from './layer-set.ts';

/** Name of the list of checksums. */
export const CHECKSUMS = 'SHA256SUMS';

/** The list that `sha256sum -c` takes: for each file its SHA-256 in hexadecimal, two blanks, its name. */
export function checksums(files: readonly LayerSetFile[]): LayerSetFile {
  const lines = files.map(({ name, bytes }) => `${createHash('sha256').update(bytes).digest('hex')}  ${name}\n`);
  return { name: CHECKSUMS, bytes: new TextEncoder().encode(lines.join('')) };
}
