import { createHash } from 'node:crypto';
import { parseFrameFile } from '#shared/contracts/parse-frame-file.ts';
import type { Particulars } from '#shared/kernel/particulars/particulars.ts';

/** A revision as it was stored. */
interface Frozen {
  readonly file: Uint8Array;
  readonly sha256: string;
  readonly letter: string;
  readonly frameId: string;
}

/** The particulars that a revision froze. Throws when its bytes are not those that were released. */
export function frozenParticulars(row: Frozen): Particulars {
  const sum = createHash('sha256').update(row.file).digest('hex');
  if (sum !== row.sha256)
    throw new Error(`revision ${row.letter} of frame ${row.frameId}: SHA-256 is ${sum}, was ${row.sha256} at release`);
  const read = parseFrameFile(new TextDecoder().decode(row.file));
  if (!read.ok) throw new Error(`revision ${row.letter} of frame ${row.frameId}: ${read.message}`);
  return read.particulars;
}
