import { writeFrameFile } from '#shared/contracts/write-frame-file.ts';
import { buildDrawing } from '#shared/kernel/drawing/build-drawing.ts';
import { DrawingRefused } from '#shared/kernel/drawing/drawing-refused.ts';
import type { Drawing } from '#shared/kernel/drawing/drawing.ts';
import type { Face } from '#shared/kernel/line-sets/line-set.ts';
import type { FileProfile } from '#shared/kernel/profiles/file-profile.ts';
import { describeSheet } from '#shared/kernel/sheet/describe-sheet.ts';
import type { Proof } from '#shared/kernel/sheet/proof.ts';
import { workFrame } from '#shared/kernel/work-frame.ts';
import type { WorkedFrame } from '#shared/kernel/worked-frame.ts';
import { proveLayerSet } from '../dxf/prove-layer-set.ts';
import { writeDxf } from '../dxf/write-dxf.ts';
import { writeSetupSheet } from '../pdf/write-setup-sheet.ts';
import { checksums } from './checksums.ts';
import { ProofFailed, type LayerSetFile, type LayerSetInput } from './layer-set.ts';
import { layersCsv } from './layers-csv.ts';

/** A proof that failed before there were files to read back. */
const refused = (name: string, got: string, wanted: string): Proof => ({
  ok: false,
  checks: [{ name, ok: false, got, wanted }],
});

function refuseStops({ particulars, findings }: WorkedFrame): void {
  const stops = findings.filter((f) => f.level === 'stop').map((f) => f.text);
  if (stops.length > 0)
    throw new ProofFailed(particulars.name, refused('frame: stops among the findings', stops.join('; '), 'none'));
}

function draw(worked: WorkedFrame, profile: FileProfile): Record<Face, Drawing> {
  try {
    return { back: buildDrawing(worked, 'back', profile), front: buildDrawing(worked, 'front', profile) };
  } catch (error) {
    if (!(error instanceof DrawingRefused)) throw error;
    throw new ProofFailed(
      worked.particulars.name,
      refused('frame: drawn as the file profile asks', error.message, 'lines, each set on its own layer'),
    );
  }
}

const utf8 = (name: string, text: string): LayerSetFile => ({ name, bytes: new TextEncoder().encode(text) });

/** The files of one frame's layer set, SHA256SUMS last, their proof, and what they were made from. */
export interface FrameFiles {
  readonly files: readonly LayerSetFile[];
  readonly proof: Proof;
  readonly worked: WorkedFrame;
}

/**
 * Makes the files of one frame's layer set and proves them. `frame` is the frame's name as it stands in
 * file names. Throws ProofFailed when the frame has a stop, cannot be drawn as the profile asks, or fails its proof.
 */
export async function makeFiles(input: LayerSetInput, frame: string): Promise<FrameFiles> {
  const { particulars, profile, paper, revision } = input;
  const worked = workFrame(particulars);
  refuseStops(worked);
  const drawings = draw(worked, profile);
  const back = writeDxf(drawings.back, profile.flavour);
  const front = writeDxf(drawings.front, profile.flavour);
  const proof = proveLayerSet(worked, profile, { back, front });
  if (!proof.ok) throw new ProofFailed(particulars.name, proof);

  const stem = `${frame}_${revisionWord(revision)}`;
  const sheet = await writeSetupSheet(describeSheet(worked, { ...input, proof }), paper);
  const files = [
    utf8(`${stem}_back.dxf`, back),
    utf8(`${stem}_front.dxf`, front),
    { name: 'setup-sheet.pdf', bytes: sheet },
    utf8(`${stem}.frame.json`, writeFrameFile(particulars)),
    utf8('layers.csv', layersCsv(worked, profile, drawings)),
  ];
  return { files: [...files, checksums(files)], proof, worked };
}

/** How a revision stands in a file name: "rev-A", or "draft". Throws for what is no revision letter. */
export function revisionWord(revision: string): string {
  if (!/^[A-Z]{0,4}$/.test(revision))
    throw new RangeError(`revision: got ${JSON.stringify(revision)}, takes capital letters, or nothing for a draft`);
  return revision === '' ? 'draft' : `rev-${revision}`;
}
