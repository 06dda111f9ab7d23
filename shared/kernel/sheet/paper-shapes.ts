import type { Contour, Point } from '../contour/contour.ts';
import { svgPath } from '../contour/svg-path.ts';
import type { PaperShape } from './paper-picture.ts';
import type { SheetColour } from './sheet-colours.ts';
import type { LineLook } from './sheet-drawing.ts';

/** Millimetres to a millionth: shorter files, and no exponents, which not every path reader takes. */
const rounded = (value: number): number => Number(value.toFixed(6));

const at = (p: Point): string => `${rounded(p.x)} ${rounded(p.y)}`;

/** Path data of straight lines through points. */
export const linePath = (points: readonly Point[], closed = false): string =>
  `${points.map((p, i) => `${i === 0 ? 'M' : 'L'}${at(p)}`).join('')}${closed ? 'Z' : ''}`;

/** Takes a place on the board to a place on paper: x = left + x·scale, y = bottom − y·scale (paper's Y runs down). */
export interface OnPaper {
  readonly left: number;
  readonly bottom: number;
  readonly scale: number;
}

export const pointOnPaper = (to: OnPaper, p: Point): Point => ({
  x: rounded(to.left + p.x * to.scale),
  y: rounded(to.bottom - p.y * to.scale),
});

/** SVG path data of a contour on paper; Y is turned over, so bulges change their sign and arcs stay arcs. */
export function contourOnPaper(to: OnPaper, contour: Contour): string {
  const vertices = contour.vertices.map((v) => ({ ...pointOnPaper(to, v), bulge: v.bulge === 0 ? 0 : -v.bulge }));
  return svgPath({ closed: contour.closed, vertices });
}

/** A straight stroke through points, in millimetres on paper. */
export const stroke = (points: readonly Point[], line: LineLook): PaperShape => ({
  kind: 'path',
  d: linePath(points),
  line,
});

export const box = (
  x: number,
  y: number,
  width: number,
  height: number,
  look: { line?: LineLook; fill?: SheetColour },
): PaperShape => ({
  kind: 'path',
  d: linePath(
    [
      { x, y },
      { x: x + width, y },
      { x: x + width, y: y + height },
      { x, y: y + height },
    ],
    true,
  ),
  ...look,
});

/** An arc of a circle on paper from one point to another, the shorter way; `sweep` 1 runs clockwise as seen. */
export const arcPath = (from: Point, to: Point, radius: number, sweep: 0 | 1): string =>
  `M${at(from)}A${rounded(radius)} ${rounded(radius)} 0 0 ${sweep} ${at(to)}`;

export function disc(centre: Point, radius: number, look: { line?: LineLook; fill?: SheetColour }): PaperShape {
  const [left, right] = [
    { x: centre.x - radius, y: centre.y },
    { x: centre.x + radius, y: centre.y },
  ];
  return {
    kind: 'path',
    d: `${arcPath(left, right, radius, 1)}${arcPath(right, left, radius, 1).replace(/^M[^A]*/, '')}Z`,
    ...look,
  };
}

/** A filled arrow head whose tip is at `tip`, pointing along `angle` (radians on paper, Y down). */
export function arrowHead(tip: Point, angle: number, length: number, fill: SheetColour): PaperShape {
  const back = (turn: number) => ({
    x: tip.x - length * Math.cos(angle + turn),
    y: tip.y - length * Math.sin(angle + turn),
  });
  return { kind: 'path', d: linePath([tip, back(0.38), back(-0.38)], true), fill };
}
