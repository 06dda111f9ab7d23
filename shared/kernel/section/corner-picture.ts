import type { Point } from '../contour/contour.ts';
import { veeFloor } from '../line-sets/corner-vee-line-set.ts';
import { beadBase, edgeOfOpening } from '../line-sets/held-depth.ts';
import { openingCut } from '../line-sets/opening-cut.ts';
import type { CornerMethod, Edge, Particulars } from '../particulars/particulars.ts';
import type { PaperPicture, PaperShape } from '../sheet/paper-picture.ts';
import { linePath, stroke } from '../sheet/paper-shapes.ts';
import { NOTHING_LEFT } from '../tolerances.ts';
import { formatLength, formatWithUnit } from '../units/format-length.ts';
import { cornerSlices, type CornerSituation, type CornerSlice } from './corner-view.ts';
import { chooseEnlargement } from './enlarge.ts';

const PANEL = 42;
const GAP = 4;
const TEXT = 2.6;

export const METHOD_WORDS: Record<CornerMethod, string> = {
  round: 'left round',
  lift: 'climbing into the corner',
  vee: 'V-cutter after it',
};

/** The corner of an opening with this edge and inside angle, when it is worked by a method. */
export function cornerSituation(
  p: Particulars,
  method: CornerMethod,
  angle: number,
  edge: Edge = edgeOfOpening(p.edge, { square: false }),
): CornerSituation {
  const vee = p.cutters.corner;
  return {
    cutter: p.cutters.opening,
    cut: openingCut(p, { ...edge, corners: method }),
    method,
    angle,
    ...(vee ? { vee: { cutter: vee, floor: veeFloor(vee, p.thickness) } } : {}),
  };
}

/**
 * What is left in an inside corner, seen from the front, at the face and three depths below it: the walls of the opening at
 * that depth, and the board that no cutter reaches between them, all to one scale.
 */
export function cornerPicture(p: Particulars, method: CornerMethod, angle: number, edge?: Edge): PaperPicture {
  const slices = cornerSlices(cornerSituation(p, method, angle, edge), p.thickness);
  const reach = Math.max(...slices.flatMap((s) => s.left.map((q) => Math.hypot(q.x, q.y))), NOTHING_LEFT);
  const { text, scale } = chooseEnlargement(reach * 1.5, reach * 1.5, p.unit, { width: PANEL, height: PANEL });
  const say = slices.map((s) => `${depthWords(s.depth, p)}: ${leftWords(s, p)}`);
  return {
    width: 4 * PANEL + 3 * GAP,
    height: PANEL + 16,
    description: `What is left in an inside corner, ${METHOD_WORDS[method]}: ${say.join('; ')}.`,
    shapes: [
      ...slices.flatMap((slice, i) => panel(slice, i * (PANEL + GAP), angle, scale, p)),
      {
        kind: 'text',
        text: `Scale ${text}, ${METHOD_WORDS[method]}`,
        x: 0,
        y: PANEL + 15,
        size: TEXT,
        anchor: 'start',
        bold: true,
        colour: 'ink',
      },
    ],
  };
}

const depthWords = (depth: number, p: Particulars) =>
  depth === 0
    ? 'at the face'
    : p.edge.style === 'beaded' && depth === beadBase(p.edge)
      ? 'at the bead’s base'
      : depth === p.thickness
        ? 'at the back'
        : `${formatWithUnit(depth, p.unit)} below the face`;
const leftWords = ({ diagonal }: CornerSlice, p: Particulars) =>
  diagonal < 10 * NOTHING_LEFT ? 'nothing left' : `${formatLength(diagonal, p.unit)} left`;

/** One depth: the corner at the lower left of its panel, one wall along the bottom. */
function panel(slice: CornerSlice, left: number, angle: number, scale: number, p: Particulars): PaperShape[] {
  // An obtuse corner needs room at its left.
  const origin = { x: left + 3 + Math.max(0, -Math.cos(angle)) * (PANEL / 2), y: PANEL - 3 };
  // The bisector is turned so that one wall runs along the panel's lower edge.
  const turn = angle / 2;
  const at = (q: Point): Point => ({
    x: origin.x + (q.x * Math.cos(turn) - q.y * Math.sin(turn)) * scale,
    y: origin.y - (q.x * Math.sin(turn) + q.y * Math.cos(turn)) * scale,
  });
  const wall = (direction: number): PaperShape => {
    const dx = Math.cos(direction);
    const dy = Math.sin(direction);
    const most = Math.min(
      ...[(PANEL - 4) / dx, (PANEL - 4) / dy, (origin.x - left) / -dx].filter((length) => length > 0),
    );
    return stroke([origin, { x: origin.x + dx * most, y: origin.y - dy * most }], { colour: 'ink', weight: 'thick' });
  };
  return [
    ...(slice.diagonal < 10 * NOTHING_LEFT
      ? []
      : [
          {
            kind: 'path',
            d: linePath(slice.left.map(at), true),
            fill: 'board',
            line: { colour: 'front', weight: 'thin' },
          } as const,
        ]),
    wall(0),
    wall(angle),
    {
      kind: 'text',
      text: depthWords(slice.depth, p),
      x: left,
      y: PANEL + 4,
      size: TEXT,
      anchor: 'start',
      colour: 'ink',
    },
    {
      kind: 'text',
      text: leftWords(slice, p),
      x: left,
      y: PANEL + 8,
      size: TEXT,
      anchor: 'start',
      bold: true,
      colour: 'ink',
    },
  ];
}
