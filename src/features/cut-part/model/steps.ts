import { describeCutter } from '#shared/kernel/cutters/describe-cutter.ts';
import { DrawingRefused } from '#shared/kernel/drawing/drawing-refused.ts';
import type { LayerCut } from '#shared/kernel/height-field/face-cut.ts';
import { layerCuts } from '#shared/kernel/height-field/layer-cuts.ts';
import type { Face, SetName } from '#shared/kernel/line-sets/line-set.ts';
import type { FileProfile } from '#shared/kernel/profiles/file-profile.ts';
import { formatWithUnit } from '#shared/kernel/units/format-length.ts';
import type { Unit } from '#shared/kernel/units/unit.ts';
import type { DrawnFrame } from '#shared/kernel/worked-frame.ts';

/** One line set's cut, as a step on the way from the board to the part. */
export interface Step {
  readonly key: string;
  readonly face: Face;
  /** Place in the cutting order of its face, from 0. */
  readonly order: number;
  readonly set: SetName;
  readonly words: string;
  /** Which cutter, and how deep. */
  readonly detail: string;
}

const WORDS: Record<SetName, string> = {
  DADO: 'Dados',
  SQUARING: 'Squaring edge',
  BLANK: 'Blank',
  BEAD_INNER: 'Bead, opening side',
  BEAD_OUTER: 'Bead, frame side',
  QUIRK: 'Quirk',
  QUIRK_CORNER: 'Quirk corners',
  OPENING: 'Openings',
  OPENING_AXIS: 'Openings',
  CORNER_LIFT: 'Corner lift',
  CORNER_VEE: 'Corner V',
  PERIMETER: 'Perimeter',
};

const CLIMBS: ReadonlySet<SetName> = new Set(['QUIRK_CORNER', 'CORNER_LIFT', 'CORNER_VEE']);

function stepOf(face: Face, cut: LayerCut, several: boolean, unit: Unit): Step {
  const depth = formatWithUnit(cut.depth, unit);
  return {
    key: cut.key,
    face,
    order: cut.order,
    set: cut.set,
    words: several ? `${WORDS[cut.set]}, ${depth} deep` : WORDS[cut.set],
    detail: `${describeCutter(cut.cutter, unit)}; ${CLIMBS.has(cut.set) ? `climbs from ${depth} below the face` : `tip ${depth} below the face`}`,
  };
}

/** Steps in cutting order, those of the back first; none for a frame that cannot be drawn, which the worker says in words. */
export function listSteps(worked: DrawnFrame, profile: FileProfile): Step[] {
  const { unit } = worked.particulars;
  try {
    return (['back', 'front'] as const).flatMap((face) => {
      const cuts = layerCuts(worked, face, profile);
      return cuts.map((cut) => stepOf(face, cut, cuts.filter((other) => other.set === cut.set).length > 1, unit));
    });
  } catch (error) {
    if (error instanceof DrawingRefused) return [];
    throw error;
  }
}
