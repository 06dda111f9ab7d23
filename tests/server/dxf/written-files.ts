import { writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { buildDrawing } from '#shared/kernel/drawing/build-drawing.ts';
import type { Drawing } from '#shared/kernel/drawing/drawing.ts';
import { BUILTIN_PROFILES } from '#shared/kernel/profiles/builtin-profiles.ts';
import type { FileProfile } from '#shared/kernel/profiles/file-profile.ts';
import { workFrame } from '#shared/kernel/work-frame.ts';
import { writeDxf } from '../../../server/dxf/write-dxf.ts';
import { SITUATIONS, type Situation } from './situations.ts';

export const R2007 = BUILTIN_PROFILES.find((p) => p.id === 'r2007')!.profile;
export const R12 = BUILTIN_PROFILES.find((p) => p.id === 'r12')!.profile;
export const AXIS_ONLY = BUILTIN_PROFILES.find((p) => p.id === 'axis-only')!.profile;

/** Everything that a profile can change, at once. */
const OTHERWISE: Partial<FileProfile> = {
  decimals: 4,
  origin: 'frame',
  labels: true,
  openingLines: 'entered',
  layerTemplate: '{depth}-{set}-{face}',
};

/** The built-in profiles, and each flavour with everything changed, in the other unit than the frame's. */
const profilesFor = ({ particulars }: Situation): Record<string, FileProfile> => {
  const unit = particulars.unit === 'in' ? 'mm' : 'in';
  return {
    r2007: R2007,
    r12: R12,
    'axis only': AXIS_ONLY,
    'r2007 otherwise': { ...R2007, ...OTHERWISE, unit },
    'r12 otherwise': { ...R12, ...OTHERWISE, unit },
  };
};

export interface WrittenFile {
  readonly name: string;
  readonly profile: FileProfile;
  readonly drawing: Drawing;
  readonly text: string;
  readonly path: string;
}

/** Both faces of each situation in each profile, written into a folder. */
export function writeSituations(folder: string): WrittenFile[] {
  return SITUATIONS.flatMap((situation, s) => {
    const worked = workFrame(situation.particulars);
    return Object.entries(profilesFor(situation)).flatMap(([id, profile], p) =>
      (['back', 'front'] as const).map((face) => {
        const drawing = buildDrawing(worked, face, profile);
        const text = writeDxf(drawing, profile.flavour);
        const path = join(folder, `${s}-${p}-${face}.dxf`);
        writeFileSync(path, text);
        return { name: `${situation.name}, ${id}, ${face}`, profile, drawing, text, path };
      }),
    );
  });
}
