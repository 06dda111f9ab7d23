import type { Cutter } from '../cutters/cutter.ts';
import { radiusAtHeight } from '../cutters/radius-at-height.ts';
import { formatLength } from '../units/format-length.ts';
import type { Unit } from '../units/unit.ts';
import { chooseScale, millimetresPerUnit, scaleText } from './drawing-scale.ts';
import type { CutterGroup } from './cutter-groups.ts';
import type { PaperPicture, PaperShape } from './paper-picture.ts';
import type { LineLook } from './sheet-drawing.ts';
import { linePath, stroke } from './paper-shapes.ts';

/** Five stand in a row on either paper. */
const WIDTH = 37;
const ROOM = { width: 20, height: 34 };
const TOP = 3;
/** Where the cutter's middle stands. */
const AXIS = 12;
const HAIR = { colour: 'pencil', weight: 'hairline' } as const;
/** Steps up a curved profile. */
const STEPS = 64;

/** Heights to sample: close together at the tip, where noses and beads curve. */
const heights = (flute: number): number[] => Array.from({ length: STEPS + 1 }, (_, i) => flute * (i / STEPS) ** 2);

function profile(cutter: Cutter, axis: number, tip: number, scale: number): string {
  const side = heights(cutter.fluteLength).map((h) => ({ x: radiusAtHeight(cutter, h) * scale, y: tip - h * scale }));
  const points = [
    ...side.map((p) => ({ x: axis - p.x, y: p.y })).reverse(),
    ...side.map((p) => ({ x: axis + p.x, y: p.y })),
  ];
  return linePath(points, true);
}

const level = (y: number, from: number, to: number, line: LineLook): PaperShape =>
  stroke(
    [
      { x: from, y },
      { x: to, y },
    ],
    line,
  );

const words = (text: string, x: number, y: number, size: number, bold: boolean): PaperShape => ({
  kind: 'text',
  text,
  x,
  y,
  size,
  anchor: 'start',
  bold,
  colour: 'ink',
});

/** How far up from the tip the cutter goes into the board: a line across and the length. */
function neededMark(
  { neededFlute, cutter }: CutterGroup,
  unit: Unit,
  tip: number,
  scale: number,
  half: number,
): PaperShape[] {
  if (neededFlute === 0) return [];
  const deep = tip - neededFlute * scale;
  const right = AXIS + half;
  // Between the two lines where there is room, else above.
  const base = tip - deep > 4 ? (deep + tip) / 2 + 0.9 : deep - 0.8;
  return [
    level(deep, AXIS - half - 2, right + 6, { ...HAIR, colour: neededFlute > cutter.fluteLength ? 'stop' : 'front' }),
    level(tip, right + 1, right + 6, HAIR),
    words(formatLength(neededFlute, unit), right + 1.4, base, 2.4, false),
  ];
}

/** A cutter's profile from the tip up to the end of its flute, to a standard scale, with how deep it goes. */
export function cutterPicture(group: CutterGroup, unit: Unit): PaperPicture {
  const { cutter, tag, neededFlute } = group;
  const widest = 2 * Math.max(...heights(cutter.fluteLength).map((h) => radiusAtHeight(cutter, h)));
  const denominator = chooseScale(widest, Math.max(cutter.fluteLength, neededFlute), unit, ROOM);
  const scale = millimetresPerUnit(unit) / denominator;
  const tip = TOP + ROOM.height;
  const highest = tip - Math.max(cutter.fluteLength, neededFlute) * scale;
  const middleLine = [
    { x: AXIS, y: highest - 3 },
    { x: AXIS, y: tip + 2 },
  ];
  return {
    width: WIDTH,
    height: tip + 6,
    description: `Profile of cutter ${tag}, scale ${scaleText(denominator)}`,
    shapes: [
      stroke(middleLine, { ...HAIR, dash: 'chain' }),
      { kind: 'path', d: profile(cutter, AXIS, tip, scale), fill: 'white', line: { colour: 'ink', weight: 'thin' } },
      ...neededMark(group, unit, tip, scale, Math.max((widest / 2) * scale, 1)),
      words(`${tag}, ${scaleText(denominator)}`, 0, tip + 5.4, 2.6, true),
    ],
  };
}
