import type { Contour, Point } from '../contour/contour.ts';
import { svgPath } from '../contour/svg-path.ts';
import type { PaperShape } from './paper-picture.ts';
import type { SheetColour } from './sheet-colours.ts';
import type { LineLook } from './sheet-drawing.ts';

/** Takes a place on the board to a place on paper: x = left + x·scale, y = bottom − y·scale (paper's Y runs down). */
export interface OnPaper {
  readonly left: number;
  readonly bottom: number;
  readonly scale: number;
}

export const pointOnPaper = (to: OnPaper, p: Point): Point => ({ x: to.left + p.x * to.scale, y: to.bottom - p.y * to.scale });

/** SVG path data of a contour on paper; Y is turned over, so bulges change their sign and arcs stay arcs. */
export function contourOnPaper(to: OnPaper, contour: Contour): string {
  const vertices = contour.vertices.map((v) => ({ ...pointOnPaper(to, v), bulge: v.bulge === 0 ? 0 : -v.bulge }));
  return svgPath({ closed: contour.closed, vertices });
}

/** A straight stroke through points, in millimetres on paper. */
export const stroke = (points: readonly Point[], line: LineLook): PaperShape => ({
  kind: 'path',
  d: points.map((p, i) => `${i === 0 ? 'M' : 'L'}${p.x} ${p.y}`).join(''),
  line,
});

export const box = (x: number, y: number, width: number, height: number, look: { line?: LineLook; fill?: SheetColour }): PaperShape => ({
  kind: 'path',
  d: `M${x} ${y}L${x + width} ${y}L${x + width} ${y + height}L${x} ${y + height}Z`,
  ...look,
});

export const disc = (centre: Point, radius: number, look: { line?: LineLook; fill?: SheetColour }): PaperShape => ({
  kind: 'path',
  d: `M${centre.x - radius} ${centre.y}A${radius} ${radius} 0 0 1 ${centre.x + radius} ${centre.y}A${radius} ${radius} 0 0 1 ${centre.x - radius} ${centre.y}Z`,
  ...look,
});

/** A filled arrow head whose tip is at `tip`, pointing along `angle` (radians on paper, Y down). */
export function arrowHead(tip: Point, angle: number, length: number, fill: SheetColour): PaperShape {
  const back = (turn: number) => ({ x: tip.x - length * Math.cos(angle + turn), y: tip.y - length * Math.sin(angle + turn) });
  const a = back(0.38);
  const b = back(-0.38);
  return { kind: 'path', d: `M${tip.x} ${tip.y}L${a.x} ${a.y}L${b.x} ${b.y}Z`, fill };
}
