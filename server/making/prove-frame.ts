import { buildDrawing } from '#shared/kernel/drawing/build-drawing.ts';
import { DrawingRefused } from '#shared/kernel/drawing/drawing-refused.ts';
import type { Particulars } from '#shared/kernel/particulars/particulars.ts';
import type { FileProfile } from '#shared/kernel/profiles/file-profile.ts';
import type { Proof, ProofCheck } from '#shared/kernel/sheet/proof.ts';
import { workFrame } from '#shared/kernel/work-frame.ts';
import { proveLayerSet } from '../dxf/prove-layer-set.ts';
import { writeDxf } from '../dxf/write-dxf.ts';

/** Writes both DXF files of a frame in each profile and proves them; each check says in its name which flavour it is of. */
export function proveFrame(particulars: Particulars, profiles: readonly FileProfile[]): Proof {
  const worked = workFrame(particulars);
  const checks = profiles.flatMap((profile): ProofCheck[] => {
    const named = (check: ProofCheck): ProofCheck => ({ ...check, name: `${profile.flavour}, ${check.name}` });
    try {
      const write = (face: 'back' | 'front') => writeDxf(buildDrawing(worked, face, profile), profile.flavour);
      return proveLayerSet(worked, profile, { back: write('back'), front: write('front') }).checks.map(named);
    } catch (error) {
      if (!(error instanceof DrawingRefused)) throw error;
      return [
        named({
          name: 'frame: drawn as the file profile asks',
          ok: false,
          got: error.message,
          wanted: 'lines, each set on its own layer',
        }),
      ];
    }
  });
  return { ok: checks.every((check) => check.ok), checks };
}
