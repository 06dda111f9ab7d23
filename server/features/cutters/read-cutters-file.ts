import { DRAWER_LIMITS, type CuttersRead } from '#shared/contracts/cutters.ts';
import { parseCuttersCsv } from '#shared/contracts/parse-cutters-csv.ts';
import { readCsv } from '#shared/kernel/csv/read-csv.ts';
import { wrongField } from '../../errors.ts';
import type { UploadedFile } from '../../http/take-files.ts';
import { compareWithDrawer } from './compare-with-drawer.ts';
import type { CuttersService } from './cutters.service.ts';

/** The text of the one file. Throws 'invalid-input' for anything but one CSV file in UTF-8 of a fair size. */
function textOf(files: readonly UploadedFile[]): string {
  const [file] = files;
  if (!file || files.length > 1) throw wrongField('file', `${files.length} files`, 'one CSV file');
  if (file.bytes === null || file.bytes.length > DRAWER_LIMITS.csvBytes)
    throw wrongField('file', 'a larger file', `a CSV file of at most ${DRAWER_LIMITS.csvBytes} bytes`);
  try {
    return new TextDecoder('utf-8', { fatal: true }).decode(file.bytes);
  } catch {
    throw wrongField('file', 'something else', 'a CSV file, text in UTF-8');
  }
}

const headingsOf = (text: string): ReadonlySet<string> =>
  new Set(readCsv(text).rows[0]?.cells.map((cell) => cell.trim().toLowerCase()) ?? []);

/**
 * Says of each row of a CSV file what it is to the drawer, and each problem by line and column. With `take` the good rows
 * are put in and changed; rows that are in the drawer as they are stay untouched.
 */
export async function readCuttersFile(
  service: CuttersService,
  shopId: string,
  files: readonly UploadedFile[],
  take: boolean,
): Promise<CuttersRead> {
  const text = textOf(files);
  const read = parseCuttersCsv(text);
  const { cutters } = await service.list(shopId);
  const { rows, problems } = compareWithDrawer(read.cutters, headingsOf(text), cutters);
  const all = [...read.problems, ...problems].sort((a, b) => a.line - b.line);
  if (all.length === 0 && rows.length === 0)
    throw wrongField('file', 'a header row alone', 'a CSV file with a cutter on each line');
  const { added, changed } = take ? await service.take(shopId, rows) : { added: [], changed: [] };
  return {
    rows: rows.map(({ line, entry, is, changes }) => ({ line, name: entry.cutter.name, is, changes })),
    problems: all,
    added,
    changed,
  };
}
