import type { Contour } from '../../contour/contour.ts';
import type { TracedVertex } from '../../particulars/particulars.ts';
import { tidyCoordinate } from './tidy-coordinate.ts';

/** A contour in the frame file's form, coordinates tidied. */
export const tracedVertices = ({ vertices }: Contour): TracedVertex[] =>
  vertices.map(({ x, y, bulge }) =>
    bulge === 0 ? [tidyCoordinate(x), tidyCoordinate(y)] : [tidyCoordinate(x), tidyCoordinate(y), bulge],
  );
