import { expect } from 'vitest';
import { makeSegment } from '#shared/kernel/contour/segments.ts';
import type { CensusRow, FoundDrawing } from '#shared/kernel/tracing/found-drawing.ts';
import { readDrawing, type ReadOptions } from '#shared/kernel/tracing/read/read-drawing.ts';
import { bytesOf, dxfText, MILLIMETRES, type DxfPair } from './dxf-text.ts';

/** Start, end and bulge of a segment. */
export type Row = readonly [x0: number, y0: number, x1: number, y1: number, bulge: number];

export const rowsOf = ({ curves }: FoundDrawing): Row[] =>
  Array.from({ length: curves.count }, (_, i) => [...curves.segments.subarray(5 * i, 5 * i + 5)] as unknown as Row);

export const readText = (text: string, options?: ReadOptions): FoundDrawing => readDrawing(bytesOf(text), options);

/** The drawing that holds these entities and nothing else. */
export const readEntities = (
  entities: string,
  options?: ReadOptions,
  header: readonly DxfPair[] = MILLIMETRES,
): FoundDrawing => readText(dxfText({ header, entities }), options);

export const codesOf = (drawing: FoundDrawing): string[] => drawing.problems.map((problem) => problem.code);

export const countOf = (rows: readonly CensusRow[]): number => rows.reduce((sum, row) => sum + row.count, 0);

/** Expects rows of segments, each number near the wanted one. */
export function expectRows(drawing: FoundDrawing, wanted: readonly Row[]): void {
  const got = rowsOf(drawing);
  expect(got.map((row) => row.length)).toEqual(wanted.map((row) => row.length));
  got.forEach((row, i) =>
    row.forEach((value, j) => expect(value, `segment ${i}, number ${j}`).toBeCloseTo(wanted[i]![j]!, 9)),
  );
}

const lengthOfRow = ([x0, y0, x1, y1, bulge]: Row): number => {
  const segment = makeSegment({ x: x0, y: y0 }, { x: x1, y: y1 }, bulge);
  return segment.kind === 'line' ? Math.hypot(x1 - x0, y1 - y0) : segment.radius * Math.abs(segment.sweep);
};

export const lengthOf = (rows: readonly Row[]): number => rows.reduce((sum, row) => sum + lengthOfRow(row), 0);

/** Twice the area that a closed chain of segments runs round, halved: chords by the shoelace, arcs by their caps. */
export const areaOf = (rows: readonly Row[]): number =>
  rows.reduce((sum, [x0, y0, x1, y1, bulge]) => {
    const sweep = 4 * Math.atan(bulge);
    const chord = Math.hypot(x1 - x0, y1 - y0);
    const radius = bulge === 0 ? 0 : (chord * (1 + bulge * bulge)) / (4 * bulge);
    return sum + (x0 * y1 - x1 * y0) / 2 + ((sweep - Math.sin(sweep)) * radius * radius) / 2;
  }, 0);

/** How far a place lies from a segment, an arc or a line. */
export function distanceTo([x0, y0, x1, y1, bulge]: Row, x: number, y: number): number {
  const ends = Math.min(Math.hypot(x - x0, y - y0), Math.hypot(x - x1, y - y1));
  const segment = makeSegment({ x: x0, y: y0 }, { x: x1, y: y1 }, bulge);
  if (segment.kind === 'line') {
    const [dx, dy] = [x1 - x0, y1 - y0];
    const t = ((x - x0) * dx + (y - y0) * dy) / (dx * dx + dy * dy);
    return t <= 0 || t >= 1 ? ends : Math.hypot(x - x0 - t * dx, y - y0 - t * dy);
  }
  const { centre, radius, start, sweep } = segment;
  const turn = 2 * Math.PI;
  const along = (Math.atan2(y - centre.y, x - centre.x) - start) * Math.sign(sweep);
  const gone = ((along % turn) + turn) % turn;
  return gone <= Math.abs(sweep) ? Math.abs(Math.hypot(x - centre.x, y - centre.y) - radius) : ends;
}

/** Places along a segment, its ends among them. */
export function placesAlong([x0, y0, x1, y1, bulge]: Row, steps: number): [number, number][] {
  const segment = makeSegment({ x: x0, y: y0 }, { x: x1, y: y1 }, bulge);
  return Array.from({ length: steps + 1 }, (_, i) => {
    const t = i / steps;
    if (segment.kind === 'line') return [x0 + t * (x1 - x0), y0 + t * (y1 - y0)];
    const angle = segment.start + t * segment.sweep;
    return [segment.centre.x + segment.radius * Math.cos(angle), segment.centre.y + segment.radius * Math.sin(angle)];
  });
}

/**
 * The most that a place lies from the segments; a place within `enough` of one is not looked for nearer. Places in a row
 * mostly lie by the same segment or the next.
 */
export function farthestOf(rows: readonly Row[], places: readonly (readonly [number, number])[], enough = 0): number {
  let near = 0;
  let farthest = 0;
  for (const [x, y] of places) {
    let least = Infinity;
    for (let i = 0; i < rows.length && least > enough; i++) {
      const k = (near + i) % rows.length;
      const distance = distanceTo(rows[k]!, x, y);
      if (distance < least) least = distance;
      if (least <= enough) near = k;
    }
    farthest = Math.max(farthest, least);
  }
  return farthest;
}

/** Rows by the entity that they came of. */
export function rowsByEntity(drawing: FoundDrawing): Row[][] {
  const out: Row[][] = [];
  rowsOf(drawing).forEach((row, i) => (out[drawing.curves.entityOf[i]!] ??= []).push(row));
  return out;
}
