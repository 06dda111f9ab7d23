import type { Contour, Extents } from '#shared/kernel/contour/contour.ts';
import { contourExtents } from '#shared/kernel/contour/contour-extents.ts';
import { contourOfVertices } from '#shared/kernel/tracing/contour-of-vertices.ts';
import type { TracedLoop } from '#shared/kernel/tracing/traced-drawing.ts';

/** A loop ready to be drawn, pointed at and measured; drawing units about the reading's origin. */
export interface DrawnLoop {
  readonly contour: Contour;
  readonly extents: Extents;
  readonly kind: TracedLoop['kind'];
}

export const drawnLoops = (loops: readonly TracedLoop[]): DrawnLoop[] =>
  loops.map(({ vertices, kind }) => {
    const contour = contourOfVertices(vertices);
    return { contour, extents: contourExtents(contour), kind };
  });

export const sizeOf = ({ minX, minY, maxX, maxY }: Extents): { width: number; height: number } => ({
  width: maxX - minX,
  height: maxY - minY,
});
