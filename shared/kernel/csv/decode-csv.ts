import { decodeCp1252 } from './decode-cp1252.ts';

export type DecodedCsv =
  | { readonly ok: true; readonly text: string; readonly letters: 'utf-8' | 'windows-1252' }
  | { readonly ok: false; readonly got: string; readonly takes: string };

/** First bytes of files that are taken for a table by mistake, and what each is. */
const OTHERS: readonly (readonly [start: readonly number[], what: string])[] = [
  [[0x50, 0x4b, 0x03, 0x04], 'a spreadsheet’s own file or a zip'],
  [[0xd0, 0xcf, 0x11, 0xe0], 'a spreadsheet’s own file of an older kind'],
  [[0x25, 0x50, 0x44, 0x46], 'a PDF'],
  [[0xff, 0xfe], 'text in UTF-16'],
  [[0xfe, 0xff], 'text in UTF-16'],
];

const TAKES = 'a CSV file: save the table as “CSV UTF-8”';

/** Control characters that no text has, line ends and tabs aside. */
const isControl = (byte: number): boolean => byte < 9 || (byte > 13 && byte < 32);

/**
 * The text of a CSV file. Bytes that are no UTF-8 are taken for Windows-1252, as spreadsheets write it, and `letters` says
 * so: names are then to be looked at. A file that is no text is refused by what it is. Never throws.
 */
export function decodeCsv(bytes: Uint8Array): DecodedCsv {
  if (bytes.length === 0) return { ok: false, got: 'an empty file', takes: TAKES };
  const other = OTHERS.find(([start]) => start.every((byte, i) => bytes[i] === byte));
  if (other) return { ok: false, got: other[1], takes: TAKES };
  if (bytes.some(isControl)) return { ok: false, got: 'a file that is no text', takes: TAKES };
  try {
    return { ok: true, text: new TextDecoder('utf-8', { fatal: true }).decode(bytes), letters: 'utf-8' };
  } catch {
    return { ok: true, text: decodeCp1252(bytes), letters: 'windows-1252' };
  }
}
