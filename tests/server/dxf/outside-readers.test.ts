import { mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterAll, beforeAll, describe, expect, test } from 'vitest';
import type { DrawingEntity } from '#shared/kernel/drawing/drawing.ts';
import { drawingChord } from '#shared/kernel/tolerances.ts';
import { plotWithLibrecad } from '../../readers/plot-with-librecad.ts';
import { readWithDxf } from '../../readers/read-with-dxf.ts';
import { readWithEzdxf, type EzdxfFile } from '../../readers/read-with-ezdxf.ts';
import { readWithOgrinfo } from '../../readers/read-with-ogrinfo.ts';
import { writeSituations, type WrittenFile } from './written-files.ts';

let folder: string;
let files: WrittenFile[];
let byEzdxf: EzdxfFile[];

beforeAll(() => {
  folder = mkdtempSync(join(tmpdir(), 'stilepost-dxf-'));
  files = writeSituations(folder);
  byEzdxf = readWithEzdxf(files.map((f) => f.path));
}, 120_000);

afterAll(() => rmSync(folder, { recursive: true, force: true }));

/** Half a unit of the last digit, and a little for the binary number that stands for it. */
const rounding = (decimals: number) => 0.5000001 * 10 ** -decimals;

const numbersOf = (e: DrawingEntity): number[][] => {
  if (e.kind === 'text') return [[e.at.x, e.at.y, 0]];
  return e.kind === 'polyline' ? e.vertices.map((v) => [v.x, v.y, v.bulge]) : e.points.map((p) => [p.x, p.y, p.z]);
};

/** Entities in the order of the layer table, which is how they are written. */
const inOrder = ({ drawing }: WrittenFile) =>
  drawing.layers.flatMap(({ name }) => drawing.entities.filter((e) => e.layer === name));

function farthest(got: readonly (readonly number[])[], wanted: readonly (readonly number[])[]): number {
  expect(got.length).toBe(wanted.length);
  return Math.max(...wanted.flatMap((w, i) => w.map((value, j) => Math.abs(value - got[i]![j]!))));
}

/** Runs a check on each file, and says which one it was when it fails. */
function each(check: (file: WrittenFile, seen: EzdxfFile) => void): void {
  expect(files.length).toBe(70);
  files.forEach((file, i) => {
    try {
      check(file, byEzdxf[i]!);
    } catch (error) {
      (error as Error).message = `${file.name}: ${(error as Error).message}`;
      throw error;
    }
  });
}

describe('When ezdxf reads the files', () => {
  test('then its audit finds no error and has nothing to fix', () => {
    each((_, seen) => {
      expect(seen.errors).toEqual([]);
      expect(seen.fixes).toEqual([]);
    });
  });

  test('then version, unit and measurement are those of the profile (DXF Reference: $INSUNITS 1 inches, 4 millimetres)', () => {
    each(({ profile, drawing }, seen) => {
      expect(seen.version).toBe(profile.flavour === 'R2007' ? 'AC1021' : 'AC1009');
      expect(seen.units).toBe(drawing.unit === 'in' ? 1 : 4);
      expect(seen.measurement).toBe(drawing.unit === 'in' ? 0 : 1);
    });
  });

  test('then the layers are those of the drawing, with colour and continuous lines, and nothing lies elsewhere', () => {
    each(({ drawing }, seen) => {
      const layers = seen.layers.filter(({ name }) => name !== '0' && name !== 'Defpoints');
      expect(layers.map(({ name, colour }) => ({ name, colour }))).toEqual(drawing.layers);
      expect(new Set(layers.map((l) => l.lineType.toUpperCase()))).toEqual(new Set(['CONTINUOUS']));
      expect(seen.lineTypes.map((n) => n.toUpperCase())).toContain('CONTINUOUS');
      // 256: the colour of the layer (DXF Reference, group 62).
      expect(new Set(seen.entities.map((e) => e.colour))).toEqual(new Set([256]));
    });
  });

  test('then each line is there, open or closed as drawn, flat or climbing, every vertex and bulge to the last digit', () => {
    each((file, seen) => {
      const wanted = inOrder(file);
      expect(seen.entities.map((e) => e.layer)).toEqual(wanted.map((e) => e.layer));
      wanted.forEach((e, i) => {
        const got = seen.entities[i]!;
        const flat = file.profile.flavour === 'R2007' ? 'LWPOLYLINE' : 'POLYLINE';
        expect(got.type).toBe(e.kind === 'text' ? 'TEXT' : e.kind === 'polyline' ? flat : 'POLYLINE');
        expect(got.closed).toBe(e.kind === 'polyline' && e.closed);
        expect(got.is3d).toBe(e.kind === 'polyline3d');
        expect(farthest(got.points, numbersOf(e))).toBeLessThanOrEqual(rounding(file.drawing.decimals));
      });
    });
  });

  test('then extents and limits are those of the drawing, the depths of climbing lines among them', () => {
    each(({ drawing: { extents: e, decimals, entities } }, seen) => {
      const depths = entities.flatMap((x) => (x.kind === 'polyline3d' ? x.points.map((p) => p.z) : []));
      const [low, high] = [Math.min(0, ...depths), Math.max(0, ...depths)];
      expect(
        farthest(
          [seen.extmin, seen.extmax],
          [
            [e.minX, e.minY, low],
            [e.maxX, e.maxY, high],
          ],
        ),
      ).toBeLessThanOrEqual(rounding(decimals));
      expect(
        farthest(
          [seen.limmin, seen.limmax],
          [
            [e.minX, e.minY],
            [e.maxX, e.maxY],
          ],
        ),
      ).toBeLessThanOrEqual(rounding(decimals));
    });
  });
});

test("When npm's dxf reads the files, then it finds each line on its layer, within the drawing's extents and reaching them", () => {
  each((file) => {
    const { lines } = readWithDxf(file.text);
    const wanted = inOrder(file).filter((e) => e.kind !== 'text');
    const drawn = lines.filter((l) => l.points.length > 0);
    expect(drawn.map((l) => l.layer)).toEqual(wanted.map((e) => e.layer));
    reaches(
      file,
      drawn.flatMap((l) => l.points),
    );
  });
});

test("When GDAL's ogrinfo reads the files, then it finds each line on its layer, within the drawing's extents and reaching them", () => {
  // One process a file: the two plain flavours are enough.
  const plain = files.filter((f) => /, (r2007|r12), /.test(f.name));
  expect(plain.length).toBe(28);
  for (const file of plain) {
    const features = readWithOgrinfo(file.path);
    expect(
      features.map((f) => f.layer),
      file.name,
    ).toEqual(inOrder(file).map((e) => e.layer));
    reaches(
      file,
      features.flatMap((f) => f.points),
    );
  }
}, 120_000);

/** Chords of a reader stay within the extents and miss a crown by no more than a chord does: here 1 % of the drawing. */
function reaches({ drawing: { extents: e, unit } }: WrittenFile, points: readonly (readonly number[])[]): void {
  const xs = points.map((p) => p[0]!);
  const ys = points.map((p) => p[1]!);
  const got = [Math.min(...xs), Math.min(...ys), -Math.max(...xs), -Math.max(...ys)];
  const slack = Math.max(e.maxX - e.minX, e.maxY - e.minY) / 100;
  [e.minX, e.minY, -e.maxX, -e.maxY].forEach((side, i) => {
    expect(got[i]).toBeGreaterThanOrEqual(side - drawingChord(unit));
    expect(got[i]).toBeLessThanOrEqual(side + slack);
  });
}

test('When LibreCAD plots the files, then there is something on the paper', () => {
  const plain = files.filter((f) => /^(worked example, end|an arched|traced).*, (r2007|r12), /.test(f.name));
  expect(plain.length).toBe(12);
  const dark = plotWithLibrecad(
    plain.map((f) => f.path),
    folder,
  );
  // An empty drawing plots none; the outline of a board alone is more than a hundred dots long.
  dark.forEach((dots, i) => expect(dots, plain[i]!.name).toBeGreaterThan(500));
}, 120_000);
