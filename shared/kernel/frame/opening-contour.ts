import type { Contour, Extents } from '../contour/contour.ts';
import { rectangle } from '../contour/make-contour.ts';

/**
 * The line of an opening with a straight or arched head, counter-clockwise. The arc has rise h over the opening's width c:
 * R = (c²/4 + h²) / 2h (circular segments, Machinery's Handbook), hence bulge = tan(θ/4) = 2h/c. The springing lies h below the top.
 * Throws when the rise is over half the width or not under the height.
 */
export function openingContour(extents: Extents, arch: number): Contour {
  if (arch === 0) return rectangle(extents);
  const { minX, minY, maxX, maxY } = extents;
  const width = maxX - minX;
  if (!(arch > 0 && arch <= width / 2 && arch < maxY - minY))
    throw new RangeError(`arch: got ${arch}, takes up to ${width / 2}, and less than ${maxY - minY}`);
  const springing = maxY - arch;
  return {
    closed: true,
    vertices: [
      { x: minX, y: minY, bulge: 0 },
      { x: maxX, y: minY, bulge: 0 },
      { x: maxX, y: springing, bulge: (2 * arch) / width },
      { x: minX, y: springing, bulge: 0 },
    ],
  };
}
