import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { GONE } from '#shared/kernel/height-field/cut-part.ts';
import { faceMesh, type FaceMesh } from '../../../../src/features/cut-part/mesh/face-mesh.ts';
import { rightTriangles } from '../../../../src/features/cut-part/mesh/right-triangles.ts';
import { beadedExample } from '../../../builders/beaded-example.ts';
import { cutWhole, smallFrame } from './parts.ts';

const side = 17;
const raster = (height: (x: number, y: number) => number, kind: (x: number, y: number) => number = () => 256) => ({
  side,
  height: Float32Array.from({ length: side * side }, (_, at) => height(at % side, Math.floor(at / side))),
  kind: Uint16Array.from({ length: side * side }, (_, at) => kind(at % side, Math.floor(at / side))),
});

function trianglesOf(of: ReturnType<typeof raster>, tolerance: number): [number, number, number][] {
  const found: [number, number, number][] = [];
  rightTriangles(of, tolerance)((a, b, c) => found.push([a, b, c]));
  return found;
}

/** How often each edge is run in each direction. */
function edgesOf(triangles: readonly (readonly (number | string)[])[]): Map<string, number> {
  const edges = new Map<string, number>();
  for (const [a, b, c] of triangles)
    for (const [p, q] of [
      [a, b],
      [b, c],
      [c, a],
    ])
      edges.set(`${p} ${q}`, (edges.get(`${p} ${q}`) ?? 0) + 1);
  return edges;
}

describe('When a raster is covered with right triangles', () => {
  const heights = fc.array(fc.double({ min: 0, max: 1, noNaN: true }), {
    minLength: side * side,
    maxLength: side * side,
  });

  test('then every inner edge is shared by two, once each way, whatever the heights: no cracks, nothing covered twice', () => {
    fc.assert(
      fc.property(heights, fc.double({ min: 0, max: 0.9, noNaN: true }), (values, tolerance) => {
        const triangles = trianglesOf(
          raster((x, y) => values[y * side + x]!),
          tolerance,
        );
        const edges = edgesOf(triangles);
        for (const [edge, count] of edges) {
          const [p, q] = edge.split(' ').map(Number) as [number, number];
          expect(count).toBe(1);
          const onBorder = [0, side - 1].some(
            (line) =>
              (p % side === line && q % side === line) ||
              (Math.floor(p / side) === line && Math.floor(q / side) === line),
          );
          expect(edges.has(`${q} ${p}`)).toBe(!onBorder);
        }
        const area = triangles.reduce((sum, t) => sum + areaOf(t), 0);
        expect(area).toBeCloseTo((side - 1) ** 2, 9);
      }),
      { numRuns: 30 },
    );
  });

  const areaOf = ([a, b, c]: [number, number, number]) => {
    const [ax, ay, bx, by, cx, cy] = [a, b, c].flatMap((at) => [at % side, Math.floor(at / side)]) as [
      number,
      number,
      number,
      number,
      number,
      number,
    ];
    return ((bx - ax) * (cy - ay) - (cx - ax) * (by - ay)) / 2;
  };

  test('then a plane takes two triangles, and one raised sample few more', () => {
    expect(
      trianglesOf(
        raster((x, y) => 0.5 * x - 0.25 * y),
        1e-6,
      ),
    ).toHaveLength(2);
    const raised = trianglesOf(
      raster((x, y) => (x === 5 && y === 9 ? 1 : 0)),
      0.1,
    );
    expect(raised.some((t) => t.includes(9 * side + 5))).toBe(true);
    expect(raised.length).toBeLessThan(80);
  });

  test('then nothing is not covered, and kinds are told apart to the sample', () => {
    const triangles = trianglesOf(
      raster(
        () => 0,
        (x) => (x < 8 ? 256 : 0),
      ),
      0.1,
    );
    // Each triangle has a sample of something; those across the border reach one sample into nothing.
    expect(Math.max(...triangles.flat().map((at) => at % side))).toBe(8);
    expect(triangles.reduce((sum, t) => sum + areaOf(t), 0)).toBeCloseTo(8 * (side - 1), 9);
  });

  test('then a side that is no power of two and one is refused', () => {
    expect(() => rightTriangles({ ...raster(() => 0), side: 16 }, 0)).toThrow('side: got 16');
  });
});

const cornersOf = ({ positions }: FaceMesh, at: number) =>
  [positions[3 * at]!, positions[3 * at + 1]!, positions[3 * at + 2]!] as const;

/** Volume inside triangles that face outwards: a sum of tetrahedra with the origin. */
function volumeOf(mesh: FaceMesh): number {
  let six = 0;
  for (let i = 0; i < mesh.index.length; i += 3) {
    const [[ax, ay, az], [bx, by, bz], [cx, cy, cz]] = [0, 1, 2].map((k) => cornersOf(mesh, mesh.index[i + k]!)) as [
      readonly [number, number, number],
      readonly [number, number, number],
      readonly [number, number, number],
    ];
    six += ax * (by * cz - bz * cy) + ay * (bz * cx - bx * cz) + az * (bx * cy - by * cx);
  }
  return six / 6;
}

describe.each([
  ['a square frame', cutWhole(smallFrame(), 0.05)],
  ['a beaded frame', cutWhole(beadedExample(), 0.12)],
])('When the surfaces of %s are made', (_, part) => {
  const [front, back] = [faceMesh(part, 'front', 0), faceMesh(part, 'back', 0)];

  test('then front and back close the board between them: each edge is run once each way', () => {
    const name = (mesh: FaceMesh, at: number) => cornersOf(mesh, at).join();
    const triangles = [front, back].flatMap((mesh) =>
      Array.from({ length: mesh.index.length / 3 }, (_, i) => [0, 1, 2].map((k) => name(mesh, mesh.index[3 * i + k]!))),
    );
    // Where nothing is left both surfaces meet, and triangles there may have no height: their edges cancel out.
    const edges = edgesOf(triangles);
    const open = [...edges].filter(
      ([edge, count]) => count !== (edges.get(edge.split(' ').toReversed().join(' ')) ?? 0),
    );
    expect(edges.size).toBeGreaterThan(1000);
    expect(open).toEqual([]);
  });

  test('then what they hold is the board that is left, but for half a cell along its walls', () => {
    const { grid, front: above, back: below, standing, thickness } = part;
    let [left, wall] = [0, 0];
    for (let at = 0; at < standing.length; at++) {
      if (standing[at] === GONE) continue;
      left += (thickness - above.depth[at]! - below.depth[at]!) * grid.cell ** 2;
      for (const to of [at + 1, at - 1, at + grid.columns, at - grid.columns])
        if ((standing[to] ?? GONE) === GONE) wall += thickness * grid.cell;
    }
    const held = volumeOf(front) + volumeOf(back);
    expect(Math.abs(held - left)).toBeLessThan((wall * grid.cell) / 2 + 1e-6);
    expect(left).toBeGreaterThan(10);
  });

  test('then triangles of loose pieces come last, and a triangle has one layer', () => {
    const loose = (mesh: FaceMesh) => mesh.index.length - mesh.looseFrom;
    expect(loose(front)).toBeGreaterThan(0);
    for (let i = 0; i < front.index.length; i += 3) {
      const layers = new Set([0, 1, 2].map((k) => front.by[front.index[i + k]!]));
      if (layers.size !== 1) throw new Error(`triangle ${i / 3} has layers ${[...layers].join()}`);
    }
  });

  test('then merging leaves far fewer, none off by more than it may', () => {
    const merged = faceMesh(part, 'front', 0.001);
    expect(merged.index.length).toBeLessThan(0.5 * part.standing.length * 6);
    expect(Math.abs(volumeOf(merged) - volumeOf(front))).toBeLessThan(0.002 * 33 * 30);
  });
});
