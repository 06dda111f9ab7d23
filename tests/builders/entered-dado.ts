import type { Extents, Point } from '#shared/kernel/contour/contour.ts';
import type { Dado } from '#shared/kernel/particulars/particulars.ts';

/**
 * The rectangle that a dado cuts, in frame view, worked out here from the rules and not by the product. Across: panel and
 * clearance. Along: an open end runs out by the cutter's radius r, a stopped end is longer by r − √(r² − (r − c/2)²), an end
 * that meets another dado stays where it is.
 */
export function enteredDado(dado: Dado, radius: number): Extents {
  const half = dado.clearance / 2;
  const relief = radius - Math.sqrt(radius ** 2 - (radius - half) ** 2);
  const beyond = { open: radius, stopped: relief, meets: 0 };
  const [low, high] = [dado.at - half, dado.at + dado.panel + half];
  const [from, to] = [dado.from - beyond[dado.ends[0]], dado.to + beyond[dado.ends[1]]];
  return dado.runs === 'vertical'
    ? { minX: low, maxX: high, minY: from, maxY: to }
    : { minX: from, maxX: to, minY: low, maxY: high };
}

export const cornersOf = ({ minX, minY, maxX, maxY }: Extents): Point[] => [
  { x: minX, y: minY },
  { x: maxX, y: minY },
  { x: maxX, y: maxY },
  { x: minX, y: maxY },
];
