import type { LayerSet, LayerSetInput } from './layer-set.ts';
import { makeFiles, revisionWord } from './make-files.ts';
import { packZip } from './pack-zip.ts';
import { safeName } from './safe-name.ts';

/**
 * A frame's layer set: both DXF files, setup sheet, frame file, layers.csv and SHA256SUMS, one by one and as a zip.
 * The same input gives the same bytes. Throws ProofFailed when the set may not leave the house.
 */
export async function buildLayerSet(input: LayerSetInput): Promise<LayerSet> {
  const frame = safeName(input.particulars.name, 'frame');
  const { files, proof } = await makeFiles(input, frame);
  const zipName = `${safeName(input.jobName, 'job')}_${frame}_${revisionWord(input.revision)}.zip`;
  return { zipName, files, zip: await packZip(files, input.releasedAt), proof };
}
