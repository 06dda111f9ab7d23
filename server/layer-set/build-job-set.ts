import type { CoverFrame } from '#shared/kernel/sheet/cover-model.ts';
import { describeCover } from '#shared/kernel/sheet/describe-cover.ts';
import { writeCoverSheet } from '../pdf/write-cover-sheet.ts';
import { CHECKSUMS, checksums } from './checksums.ts';
import type { LayerSetFile, LayerSetInput } from './layer-set.ts';
import { makeFiles } from './make-files.ts';
import { packZip } from './pack-zip.ts';
import { safeName, safeNames } from './safe-name.ts';

export interface JobSetInput {
  readonly jobName: string;
  readonly shopName: string;
  readonly paper: LayerSetInput['paper'];
  /** The newest revision of each frame, in the order of the cover sheet, all in one file profile. At least one. */
  readonly sets: readonly LayerSetInput[];
  /** Frames of the job that have no revision, by name. */
  readonly leftOut?: readonly string[];
}

export interface JobSet {
  readonly zipName: string;
  readonly files: readonly LayerSetFile[];
  readonly zip: Uint8Array;
}

const COVER = 'cover-sheet.pdf';

/**
 * A whole job's layer sets: a folder a frame, a cover sheet that lists them, and SHA256SUMS over all. Frames of the
 * same name get names of their own, in folders and files. The same input gives the same bytes. Throws ProofFailed for
 * the first frame that may not leave the house, RangeError when there are no frames.
 */
export async function buildJobSet({ jobName, shopName, paper, sets, leftOut = [] }: JobSetInput): Promise<JobSet> {
  const [first] = sets;
  if (first === undefined) throw new RangeError('job set: got no frames, takes at least one');
  const newest = sets.map((s) => s.releasedAt).reduce((a, b) => (Date.parse(b) > Date.parse(a) ? b : a));
  const folders = safeNames(
    sets.map((s) => s.particulars.name),
    'frame',
    [COVER, CHECKSUMS],
  );

  const frames: CoverFrame[] = [];
  const files: LayerSetFile[] = [];
  for (const [i, set] of sets.entries()) {
    const folder = folders[i]!;
    const made = await makeFiles(set, folder);
    frames.push({ worked: made.worked, revision: set.revision, folder, files: made.files.map((f) => f.name) });
    files.push(...made.files.map(({ name, bytes }) => ({ name: `${folder}/${name}`, bytes })));
  }
  const context = { shopName, jobName, author: '', releasedAt: newest, profileName: first.profile.name, leftOut };
  const cover = { name: COVER, bytes: await writeCoverSheet(describeCover(frames, context), paper) };
  const all = [cover, ...files];
  const withSums = [...all, checksums(all)];
  return {
    zipName: `${safeName(jobName, 'job')}_layer-sets.zip`,
    files: withSums,
    zip: await packZip(withSums, newest),
  };
}
