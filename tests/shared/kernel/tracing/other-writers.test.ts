import { spawnSync } from 'node:child_process';
import { mkdtempSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterAll, beforeAll, describe, expect, test } from 'vitest';
import { applyRoles } from '#shared/kernel/tracing/frames/apply-roles.ts';
import { contourOfVertices } from '#shared/kernel/tracing/contour-of-vertices.ts';
import { traceDrawing } from '#shared/kernel/tracing/trace-drawing.ts';
import { PLAIN_TRACE } from '#shared/kernel/tracing/traced-drawing.ts';
import { PYTHON } from '../../../setup/readers.ts';
import { runReader } from '../../../readers/run-reader.ts';

/** One frame, drawn by programs that are not ours: 600 × 700 with two openings, lower left, width and height. */
const OPENINGS = [
  [45, 45, 510, 300],
  [45, 390, 510, 265],
] as const;

let folder: string;
beforeAll(() => (folder = mkdtempSync(join(tmpdir(), 'stilepost-writers-'))));
afterAll(() => rmSync(folder, { recursive: true, force: true }));

function save(name: string, text: string): string {
  writeFileSync(join(folder, name), text);
  return join(folder, name);
}

/** Frames in a file: width, height, and each opening's place and size, in reading order. */
function framesIn(path: string) {
  const { loops } = traceDrawing(readFileSync(path), { ...PLAIN_TRACE, unit: 'mm' });
  const contours = loops.map(({ vertices }) => ({ contour: contourOfVertices(vertices) }));
  return applyRoles(
    contours,
    loops.map(({ role }) => role),
    'mm',
  ).frames.map(({ width, height, outline }) => ({
    width,
    height,
    openings: outline.openings.map((opening) => {
      const [xs, ys] = [opening.map(([x]) => x), opening.map(([, y]) => y)];
      const [x, y] = [Math.min(...xs), Math.min(...ys)];
      return [x, y, Math.max(...xs) - x, Math.max(...ys) - y];
    }),
  }));
}

const THE_FRAME = [{ width: 600, height: 700, openings: OPENINGS.toReversed() }];
const corners = (x: number, y: number, width: number, height: number): [number, number][] => [
  [x, y],
  [x + width, y],
  [x + width, y + height],
  [x, y + height],
  [x, y],
];
const OUTLINES = [corners(0, 0, 600, 700), ...OPENINGS.map(([x, y, width, height]) => corners(x, y, width, height))];

describe('Drawings that other programs wrote', () => {
  test('When ogr2ogr (GDAL) wrote lines, then the frame is that which was drawn', () => {
    const features = OUTLINES.map((coordinates) => ({
      type: 'Feature',
      properties: { Layer: 'FRAME' },
      geometry: { type: 'LineString', coordinates },
    }));
    const source = save('frame.geojson', JSON.stringify({ type: 'FeatureCollection', features }));
    const path = join(folder, 'gdal.dxf');
    runReader('ogr2ogr', ['-f', 'DXF', path, source]);
    expect(framesIn(path)).toEqual(THE_FRAME);
  });

  test('When ezdxf wrote polylines and loose lines, in R12 and in R2018, then the frame is that which was drawn', () => {
    const script = `
import ezdxf, sys
outlines = ${JSON.stringify(OUTLINES)}
for version in ("R12", "R2018"):
    doc = ezdxf.new(version)
    space = doc.modelspace()
    add = space.add_polyline2d if version == "R12" else space.add_lwpolyline
    add(outlines[0][:-1], close=True)
    for outline in outlines[1:]:
        for a, b in zip(outline, outline[1:]):
            space.add_line(b, a)
    doc.saveas(sys.argv[1] + "/" + version + ".dxf")
`;
    runReader(PYTHON, ['-c', script, folder]);
    expect(framesIn(join(folder, 'R12.dxf'))).toEqual(THE_FRAME);
    expect(framesIn(join(folder, 'R2018.dxf'))).toEqual(THE_FRAME);
  });

  test('When OpenSCAD wrote it, where that is installed, then the frame is that which was drawn', () => {
    if (spawnSync('openscad', ['--version'], { stdio: 'ignore' }).status !== 0) {
      console.log('OpenSCAD is not installed: its drawing is not held against ours here.');
      return;
    }
    const holes = OPENINGS.map(([x, y, w, h]) => `translate([${x}, ${y}]) square([${w}, ${h}]);`).join(' ');
    const source = save('frame.scad', `difference() { square([600, 700]); ${holes} }`);
    const path = join(folder, 'openscad.dxf');
    runReader('openscad', ['-o', path, source]);
    expect(framesIn(path)).toEqual(THE_FRAME);
  });
});
