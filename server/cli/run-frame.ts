import type { Finding } from '#shared/kernel/checks/finding.ts';
import { workFrame } from '#shared/kernel/work-frame.ts';
import { buildLayerSet } from '../layer-set/build-layer-set.ts';
import { ProofFailed } from '../layer-set/layer-set.ts';
import { readFrameOptions, USAGE, type FrameOptions } from './frame-options.ts';
import { InputError } from './input-error.ts';
import { loadFrame } from './load-frame.ts';
import { loadProfile } from './load-profile.ts';
import { saveFiles } from './save-files.ts';
import { UsageError } from './usage-error.ts';

/** Where the command writes its lines. */
export interface Output {
  out(text: string): void;
  err(text: string): void;
}

const findingLine = ({ level, text, remedy, field }: Finding): string =>
  `${level}: ${text}${remedy === '' ? '' : ` ${remedy}`}${field === undefined ? '' : ` (${field})`}\n`;

async function writeSet(options: FrameOptions, output: Output): Promise<number> {
  const particulars = loadFrame(options.file);
  const profile = loadProfile(options.profile);
  const { findings } = workFrame(particulars);
  for (const finding of findings) output.err(findingLine(finding));
  if (findings.some((f) => f.level === 'stop')) return 1;
  const set = await buildLayerSet({
    particulars,
    profile,
    shopName: options.shop,
    jobName: options.job,
    revision: options.revision,
    author: options.author,
    releasedAt: `${options.date}T00:00:00.000Z`,
    note: options.note,
    paper: options.paper ?? (particulars.unit === 'in' ? 'Letter' : 'A4'),
  });
  const files = options.zip ? [{ name: set.zipName, bytes: set.zip }] : set.files;
  for (const path of saveFiles(options.out, files)) output.out(`${path}\n`);
  return 0;
}

/** The `frame` command; returns its exit code. `today` is a day as YYYY-MM-DD. */
export async function runFrame(args: readonly string[], today: string, output: Output): Promise<number> {
  try {
    const options = readFrameOptions(args, today);
    if (options !== 'help') return await writeSet(options, output);
    output.out(USAGE);
    return 0;
  } catch (error) {
    if (error instanceof UsageError) {
      output.err(`${error.message}\n\n${USAGE}`);
      return 2;
    }
    if (error instanceof InputError) {
      output.err([error.message, ...error.details.map((d) => `  ${d}`), ''].join('\n'));
      return 2;
    }
    if (!(error instanceof ProofFailed)) throw error;
    for (const { name, got, wanted } of error.proof.checks.filter((c) => !c.ok))
      output.err(`proof: ${name}: got ${got}, wanted ${wanted}\n`);
    return 1;
  }
}
