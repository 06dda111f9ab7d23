import { buildDrawing } from '#shared/kernel/drawing/build-drawing.ts';
import type { FileProfile } from '#shared/kernel/profiles/file-profile.ts';
import { nameLayers } from '#shared/kernel/profiles/name-layers.ts';
import type { Proof, ProofCheck } from '#shared/kernel/sheet/proof.ts';
import type { WorkedFrame } from '#shared/kernel/worked-frame.ts';
import { compareDrawing } from './compare-drawing.ts';
import { proveTurnedOver } from './prove-turned-over.ts';
import { readOwnDxf, type ReadDxf } from './read-own-dxf.ts';

/** The texts of the two DXF files of a layer set. */
export interface DxfPair {
  readonly back: string;
  readonly front: string;
}

/**
 * Reads both DXF files back with an independent reader and holds them against the intended drawings, and the back,
 * turned over, against frame view. Never throws for a bad file: that is a check that fails, with the reason in `got`.
 */
export function proveLayerSet(worked: WorkedFrame, profile: FileProfile, files: DxfPair): Proof {
  const checks: ProofCheck[] = [];
  const read = (face: 'back' | 'front'): ReadDxf | undefined => {
    try {
      const file = readOwnDxf(files[face]);
      checks.push({ name: `${face}: read back`, ok: true, got: 'read', wanted: 'read' });
      return file;
    } catch (error) {
      checks.push({ name: `${face}: read back`, ok: false, got: (error as Error).message, wanted: 'read' });
      return undefined;
    }
  };
  const back = read('back');
  const front = read('front');
  const { flavour } = profile;
  const layers = nameLayers(worked, profile);
  const oneCut = new Set(['front/OPENING', 'front/OPENING_AXIS'].flatMap((key) => layers.get(key)?.name ?? []));
  if (back) checks.push(...compareDrawing('back', back, buildDrawing(worked, 'back', profile), flavour, oneCut));
  if (front) checks.push(...compareDrawing('front', front, buildDrawing(worked, 'front', profile), flavour, oneCut));
  if (back && front) checks.push(...proveTurnedOver(worked, profile, back, front));
  return { ok: checks.every((c) => c.ok), checks };
}
