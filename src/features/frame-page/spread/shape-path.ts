import type { Extents } from '#shared/kernel/contour/contour.ts';
import { svgPath } from '#shared/kernel/contour/svg-path.ts';
import type { LineSet, Shape } from '#shared/kernel/line-sets/line-set.ts';

const shapePath = (shape: Shape): string =>
  shape.kind === 'contour'
    ? svgPath(shape.contour)
    : shape.points.map(({ x, y }, i) => `${i === 0 ? 'M' : 'L'}${x} ${y}`).join('');

/** All lines of a line set as one SVG path, Y up: one element a set keeps repainting cheap. */
export const lineSetPath = (lineSet: LineSet): string => lineSet.shapes.map(shapePath).join('');

export const extentsPath = ({ minX, minY, maxX, maxY }: Extents): string => `M${minX} ${minY}H${maxX}V${maxY}H${minX}Z`;
