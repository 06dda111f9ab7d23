import { parseArgs } from 'node:util';
import { BUILTIN_PROFILES } from '#shared/kernel/profiles/builtin-profiles.ts';
import { UsageError } from './usage-error.ts';

/** What the `frame` command was asked for. */
export interface FrameOptions {
  /** Path of the frame file, or '-' for standard input. */
  readonly file: string;
  readonly out: string;
  /** Name or id of a built-in profile, or path of a profile file. */
  readonly profile: string;
  readonly zip: boolean;
  /** '' for a draft. */
  readonly revision: string;
  readonly job: string;
  readonly shop: string;
  readonly author: string;
  readonly note: string;
  /** Day as YYYY-MM-DD. */
  readonly date: string;
  /** undefined: by the frame's unit. */
  readonly paper: 'A4' | 'Letter' | undefined;
}

export const USAGE = `Writes the layer set of a frame: both DXF files, setup sheet, frame file, layers.csv, SHA256SUMS.

  npm run frame -- FILE.frame.json [--out DIR] [--profile NAME|FILE] [--zip]

  FILE               frame file; - reads standard input
  --out DIR          folder for the files, made when missing (default: where you are)
  --profile NAME     file profile by name, ${BUILTIN_PROFILES.map((p) => p.id).join(', ')} (default: ${BUILTIN_PROFILES[0]!.id})
  --profile FILE     file profile from a JSON file
  --zip              one zip in place of the files
  --revision A       revision letter; without it the sheet is marked "draft, not for cutting"
  --job NAME         job, in the zip's name and on the sheet (default: "Single frame")
  --shop NAME        shop, on the sheet
  --author NAME      who drew it, on the sheet
  --note TEXT        note to the revision, on the sheet
  --date YYYY-MM-DD  date on the sheet and in the zip (default: today); the same date gives the same bytes
  --paper A4|Letter  paper of the sheet (default: Letter for a frame in inches, A4 for one in millimetres)
  --help             this text

Exit code: 0 written, paths on standard output; 1 a stop or the proof forbids, findings on standard error, nothing
written; 2 the command, the frame file or the profile cannot be read or is not valid, or the files cannot be written;
3 a mistake of the program.
`;

const OPTIONS = {
  out: { type: 'string', default: '.' },
  profile: { type: 'string', default: BUILTIN_PROFILES[0]!.id },
  zip: { type: 'boolean', default: false },
  revision: { type: 'string', default: '' },
  job: { type: 'string', default: 'Single frame' },
  shop: { type: 'string', default: '' },
  author: { type: 'string', default: '' },
  note: { type: 'string', default: '' },
  date: { type: 'string' },
  paper: { type: 'string' },
  help: { type: 'boolean', default: false },
} as const;

function readDate(text: string): string {
  const isDay =
    /^\d{4}-\d{2}-\d{2}$/.test(text) &&
    !Number.isNaN(Date.parse(text)) &&
    new Date(text).toISOString().startsWith(text);
  if (!isDay) throw new UsageError(`--date: got "${text}", takes a day as YYYY-MM-DD`);
  return text;
}

function readPaper(text: string | undefined): FrameOptions['paper'] {
  if (text === undefined || text === 'A4' || text === 'Letter') return text;
  throw new UsageError(`--paper: got "${text}", takes A4 or Letter`);
}

/** Reads the command's arguments; 'help' when that was asked for. `today` is a day as YYYY-MM-DD. Throws UsageError. */
export function readFrameOptions(args: readonly string[], today: string): FrameOptions | 'help' {
  let parsed;
  try {
    parsed = parseArgs({ args: [...args], options: OPTIONS, allowPositionals: true });
  } catch (error) {
    throw new UsageError((error as Error).message);
  }
  const { values, positionals } = parsed;
  if (values.help) return 'help';
  const [file, ...more] = positionals;
  if (file === undefined || more.length > 0)
    throw new UsageError(`got ${positionals.length} files, takes one frame file, or - for standard input`);
  const { out, profile, zip, revision, job, shop, author, note } = values;
  if (!/^[A-Z]{0,4}$/.test(revision))
    throw new UsageError(`--revision: got "${revision}", takes capital letters such as A`);
  if (out === '') throw new UsageError('--out: got "", takes a folder');
  const date = readDate(values.date ?? today);
  return { file, out, profile, zip, revision, job, shop, author, note, date, paper: readPaper(values.paper) };
}
