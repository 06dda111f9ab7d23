import type { CutterRole } from '../cutters/cutter.ts';
import type { Face, LineSet, SetName } from '../line-sets/line-set.ts';

/** Opening labels and part names lie on a layer of their own, which is no line set. */
export const LABELS = 'LABELS';

interface DefaultLineSet {
  readonly face: Face;
  readonly set: SetName | typeof LABELS;
  readonly cutter: CutterRole | null;
  /** Colour of the layer, AutoCAD Color Index (DXF Reference, group 62). */
  readonly colour: number;
}

/**
 * Every layer that a frame can have, in cutting order, with its colour:
 * back lines red, front lines blue, bead lines green, climbing lines violet, what is not an edge of the face grey.
 */
export const DEFAULT_LINE_SETS: readonly DefaultLineSet[] = [
  { face: 'back', set: 'DADO', cutter: 'dado', colour: 1 },
  { face: 'back', set: 'SQUARING', cutter: 'squaring', colour: 14 },
  { face: 'back', set: 'BLANK', cutter: null, colour: 8 },
  { face: 'back', set: LABELS, cutter: null, colour: 251 },
  { face: 'front', set: 'BEAD_INNER', cutter: 'bead', colour: 3 },
  { face: 'front', set: 'BEAD_OUTER', cutter: 'bead', colour: 94 },
  { face: 'front', set: 'QUIRK', cutter: 'quirk', colour: 122 },
  { face: 'front', set: 'QUIRK_CORNER', cutter: 'corner', colour: 210 },
  { face: 'front', set: 'OPENING', cutter: 'opening', colour: 5 },
  { face: 'front', set: 'OPENING_AXIS', cutter: 'opening', colour: 150 },
  { face: 'front', set: 'CORNER_LIFT', cutter: 'opening', colour: 190 },
  { face: 'front', set: 'CORNER_VEE', cutter: 'corner', colour: 200 },
  { face: 'front', set: 'PERIMETER', cutter: 'perimeter', colour: 7 },
  { face: 'front', set: 'BLANK', cutter: null, colour: 8 },
  { face: 'front', set: LABELS, cutter: null, colour: 251 },
];

/** Colour of a line set's layer, AutoCAD Color Index. Throws for a set that the face does not have. */
export function layerColour(of: { face: Face; set: LineSet['set'] | typeof LABELS }): number {
  const found = DEFAULT_LINE_SETS.find((d) => d.face === of.face && d.set === of.set);
  if (!found) throw new Error(`no layer colour for ${of.face}/${of.set}`);
  return found.colour;
}
