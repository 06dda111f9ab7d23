import type { Piece } from './bezier-piece.ts';
import { turn } from './placement.ts';
import { WHOLE_TURN } from './read-tolerances.ts';

const QUARTER = Math.PI / 2;

/**
 * centre + U cos t + V sin t, for t from `from` over `sweep` radians, as rational quadratic Bézier pieces of at most a
 * quarter turn each, exact: with half angle h the middle control point is where the end tangents meet, its weight cos h
 * (Piegl and Tiller, The NURBS Book, 7.5; ellipses are affine images of circles). `ends` are the ends where known better.
 */
export function ellipsePieces(
  cx: number,
  cy: number,
  ux: number,
  uy: number,
  vx: number,
  vy: number,
  from: number,
  sweep: number,
  ends: readonly number[] | null,
): Piece[] {
  const count = Math.max(1, Math.ceil(Math.abs(sweep) / QUARTER - WHOLE_TURN));
  const half = sweep / count / 2;
  const weight = Math.cos(half);
  const whole = Math.abs(Math.abs(sweep) - 2 * Math.PI) <= WHOLE_TURN;
  const at = (t: number): readonly [number, number] => {
    const [cos, sin] = turn((t * 180) / Math.PI);
    return [cx + ux * cos + vx * sin, cy + uy * cos + vy * sin];
  };
  const first = ends ? ([ends[0]!, ends[1]!] as const) : at(from);
  const pieces: Piece[] = [];
  let start = first;
  for (let i = 0; i < count; i++) {
    const last = i === count - 1;
    const end = last && ends ? ([ends[2]!, ends[3]!] as const) : last && whole ? first : at(from + 2 * half * (i + 1));
    const [cos, sin] = turn(((from + half * (2 * i + 1)) * 180) / Math.PI);
    const middleX = cx * weight + ux * cos + vx * sin;
    const middleY = cy * weight + uy * cos + vy * sin;
    pieces.push(Float64Array.of(start[0], start[1], 1, middleX, middleY, weight, end[0], end[1], 1));
    start = end;
  }
  return pieces;
}
