import { DRAWER_LIMITS, type CuttersTaken } from '#shared/contracts/cutters.ts';
import { parseCuttersCsv, type ReadCuttersCsv } from '#shared/contracts/parse-cutters-csv.ts';
import { wrongField } from '../../errors.ts';
import type { UploadedFile } from '../../http/take-files.ts';
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

/** Rows whose name is in the drawer already become problems. */
function holdAgainstDrawer({ cutters, problems }: ReadCuttersCsv, names: ReadonlySet<string>): ReadCuttersCsv {
  const taken = (name: string) => names.has(name.toLowerCase());
  const clashes = cutters.flatMap(({ line, entry }) => {
    const got = JSON.stringify(entry.cutter.name);
    const takes = 'a name that is not in the drawer yet';
    const message = `line ${line}, name: got ${got}, takes ${takes}`;
    return taken(entry.cutter.name) ? [{ line, column: 'name', got, takes, message }] : [];
  });
  return {
    cutters: cutters.filter(({ entry }) => !taken(entry.cutter.name)),
    problems: [...problems, ...clashes].sort((a, b) => a.line - b.line),
  };
}

/**
 * Puts the cutters of a CSV file into the drawer. Where anything is wrong with it nothing is taken and the answer names
 * each problem by line and column, unless `keepGood` says to take the good rows.
 */
export async function takeCuttersCsv(
  service: CuttersService,
  shopId: string,
  files: readonly UploadedFile[],
  keepGood: boolean,
): Promise<CuttersTaken> {
  const read = parseCuttersCsv(textOf(files));
  const { cutters } = await service.list(shopId);
  const held = holdAgainstDrawer(read, new Set(cutters.map(({ cutter }) => cutter.name.toLowerCase())));
  const good = held.cutters.map(({ entry }) => entry);
  const problems = [...held.problems];
  if (problems.length === 0 && good.length === 0)
    throw wrongField('file', 'a header row alone', 'a CSV file with a cutter on each line');
  const isTaken = problems.length === 0 || keepGood;
  return { taken: isTaken ? await service.add(shopId, good) : [], good: good.length, problems };
}
