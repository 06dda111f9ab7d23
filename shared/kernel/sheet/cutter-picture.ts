import type { Cutter } from '../cutters/cutter.ts';
import { radiusAtHeight } from '../cutters/radius-at-height.ts';
import { formatLength } from '../units/format-length.ts';
import type { Unit } from '../units/unit.ts';
import { chooseScale, millimetresPerUnit, scaleText } from './drawing-scale.ts';
import type { CutterGroup } from './cutter-groups.ts';
import type { PaperPicture, PaperShape } from './paper-picture.ts';
import { linePath, stroke } from './paper-shapes.ts';

const WIDTH = 40;
const ROOM = { width: 22, height: 34 };
const TOP = 3;
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

/** A cutter's profile from the tip up to the end of its flute, to a standard scale, with how deep it goes. */
export function cutterPicture({ cutter, tag, neededFlute }: CutterGroup, unit: Unit): PaperPicture {
  const widest = 2 * Math.max(...heights(cutter.fluteLength).map((h) => radiusAtHeight(cutter, h)));
  const denominator = chooseScale(widest, Math.max(cutter.fluteLength, neededFlute), unit, ROOM);
  const scale = millimetresPerUnit(unit) / denominator;
  const axis = 14;
  const tip = TOP + ROOM.height;
  const top = tip - cutter.fluteLength * scale;
  const deep = tip - neededFlute * scale;
  const half = Math.max((widest / 2) * scale, 1);
  const hair = { colour: 'pencil', weight: 'hairline' } as const;
  const needed: PaperShape[] =
    neededFlute === 0
      ? []
      : [
          stroke(
            [
              { x: axis - half - 2, y: deep },
              { x: axis + half + 6, y: deep },
            ],
            { ...hair, colour: neededFlute > cutter.fluteLength ? 'stop' : 'front' },
          ),
          stroke(
            [
              { x: axis + half + 1, y: tip },
              { x: axis + half + 6, y: tip },
            ],
            hair,
          ),
          {
            kind: 'text',
            text: formatLength(neededFlute, unit),
            x: axis + half + 4.4,
            y: (deep + tip) / 2 + 0.9,
            size: 2.4,
            anchor: 'start',
            colour: 'ink',
          },
        ];
  return {
    width: WIDTH,
    height: tip + 6,
    description: `Profile of cutter ${tag}, scale ${scaleText(denominator)}`,
    shapes: [
      stroke(
        [
          { x: axis, y: Math.min(top, deep) - 3 },
          { x: axis, y: tip + 2 },
        ],
        { ...hair, dash: 'chain' },
      ),
      { kind: 'path', d: profile(cutter, axis, tip, scale), fill: 'white', line: { colour: 'ink', weight: 'thin' } },
      ...needed,
      {
        kind: 'text',
        text: `${tag}  ${scaleText(denominator)}`,
        x: 0,
        y: tip + 5.4,
        size: 2.6,
        anchor: 'start',
        bold: true,
        colour: 'ink',
      },
    ],
  };
}
