import type { Contour } from '../contour/contour.ts';
import type { TracedVertex } from '../particulars/particulars.ts';

/** A contour out of the frame file's form. */
export const contourOfVertices = (vertices: readonly TracedVertex[], closed = true): Contour => ({
  closed,
  vertices: vertices.map(([x, y, bulge = 0]) => ({ x, y, bulge })),
});
