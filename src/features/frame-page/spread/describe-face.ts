import type { Face } from '#shared/kernel/line-sets/line-set.ts';
import { placeExtents } from '#shared/kernel/placing/place.ts';
import { formatLength, formatWithUnit } from '#shared/kernel/units/format-length.ts';
import type { DrawnFrame } from '#shared/kernel/worked-frame.ts';

const list = (words: readonly string[]): string => (words.length === 0 ? 'none' : words.join('; '));

/** A face in words, for people who do not see the drawing. Places are measured from the pins, in the setup of the face. */
export function describeFace(worked: DrawnFrame, face: Face): string {
  const { particulars, contours, dados, blank } = worked;
  const { unit } = particulars;
  const { board, placement } = worked[face];
  const size = `${formatLength(board.maxX, unit)} by ${formatWithUnit(board.maxY, unit)}`;
  if (face === 'back') {
    const joints = dados.map((dado) => {
      const e = placeExtents(placement, dado.extents);
      return `${dado.part}, ${formatLength(dado.depth, unit)} deep, from ${formatLength(e.minX, unit)} to ${formatLength(e.maxX, unit)} across and ${formatLength(e.minY, unit)} to ${formatLength(e.maxY, unit)} up`;
    });
    return `Back face, cut first, on a board of ${size}. Dados: ${list(joints)}. Squared edges: ${blank.squaredEdges.join(' and ')}.`;
  }
  const openings = contours.openings.map((opening) => {
    const e = placeExtents(placement, opening.extents);
    const arch = opening.arch > 0 ? `, arched by ${formatLength(opening.arch, unit)}` : '';
    return `${opening.label}, ${formatLength(opening.width, unit)} by ${formatLength(opening.height, unit)}${arch}, lower left corner at ${formatLength(e.minX, unit)} across and ${formatLength(e.minY, unit)} up`;
  });
  return `Front face, cut second, on a board of ${size}. Openings: ${list(openings)}. Then the perimeter, ${formatLength(contours.width, unit)} by ${formatWithUnit(contours.height, unit)}.`;
}
