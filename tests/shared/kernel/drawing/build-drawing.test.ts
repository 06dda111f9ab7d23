import { describe, expect, test } from 'vitest';
import { buildDrawing } from '#shared/kernel/drawing/build-drawing.ts';
import { DrawingRefused } from '#shared/kernel/drawing/drawing-refused.ts';
import type { Drawing } from '#shared/kernel/drawing/drawing.ts';
import { tidyContour, tidyPath } from '#shared/kernel/drawing/tidy-line.ts';
import type { Particulars } from '#shared/kernel/particulars/particulars.ts';
import { BUILTIN_PROFILES } from '#shared/kernel/profiles/builtin-profiles.ts';
import type { FileProfile } from '#shared/kernel/profiles/file-profile.ts';
import type { Face } from '#shared/kernel/line-sets/line-set.ts';
import { workFrame } from '#shared/kernel/work-frame.ts';
import { vertexExtents } from '../../../builders/line-sets.ts';
import { workedExample } from '../../../builders/worked-example.ts';

const standard = BUILTIN_PROFILES[0]!.profile;
const draw = (face: Face, profile: Partial<FileProfile> = {}, particulars: Particulars = workedExample()) =>
  buildDrawing(workFrame(particulars), face, { ...standard, ...profile });

const lineOn = (drawing: Drawing, layer: string, nth = 0) => {
  const found = drawing.entities.filter((e) => e.kind === 'polyline').filter((e) => e.layer === layer);
  if (found[nth] === undefined) throw new Error(`no line ${nth} on ${layer}`);
  return found[nth];
};

describe('When the front of the worked example is drawn', () => {
  test('then its layers come in cutting order, colours on them', () => {
    expect(draw('front').layers).toEqual([
      { name: 'FRONT_OPENING', colour: 5 },
      { name: 'FRONT_OPENING_AXIS', colour: 150 },
      { name: 'FRONT_CORNER_LIFT', colour: 190 },
      { name: 'FRONT_PERIMETER', colour: 7 },
      { name: 'FRONT_BLANK', colour: 8 },
    ]);
  });

  test('then from the pins opening A lies where the spec has it', () => {
    expect(vertexExtents(lineOn(draw('front'), 'FRONT_OPENING').vertices)).toEqual({
      minX: 2.75,
      minY: 2.25,
      maxX: 16.75,
      maxY: 29.75,
    });
  });

  test('then from the frame’s corner it lies as entered', () => {
    expect(vertexExtents(lineOn(draw('front', { origin: 'frame' }), 'FRONT_OPENING').vertices)).toEqual({
      minX: 1.75,
      minY: 1.25,
      maxX: 15.75,
      maxY: 28.75,
    });
  });

  test('then in millimetres each place is 25.4 times that, to fifteen digits, and angles stay', () => {
    const inches = draw('front');
    const millimetres = draw('front', { unit: 'mm' });
    expect(millimetres.unit).toBe('mm');
    const places = (d: Drawing, by: number) =>
      d.entities.flatMap((e) => (e.kind === 'polyline' ? e.vertices.map((v) => [v.x * by, v.y * by, v.bulge]) : []));
    const rounded = (list: number[][]) => list.map((numbers) => numbers.map((n) => Number(n.toPrecision(14))));
    expect(rounded(places(millimetres, 1))).toEqual(rounded(places(inches, 25.4)));
  });

  test('then in its own unit nothing is converted: 23.5 stays 23.5', () => {
    const outline = { ...workedExample().outline, width: 23.5 } as Particulars['outline'];
    const drawing = draw('front', { unit: 'in', origin: 'frame' }, workedExample({ outline, dados: [] }));
    expect(lineOn(drawing, 'FRONT_PERIMETER').vertices.map((v) => v.x)).toEqual(expect.arrayContaining([0, 23.5]));
  });

  test('then a profile carries one opening layer or both', () => {
    const layers = (openingLines: FileProfile['openingLines']) =>
      draw('front', { openingLines }).layers.map((l) => l.name);
    expect(layers('axis')).not.toContain('FRONT_OPENING');
    expect(layers('axis')).toContain('FRONT_OPENING_AXIS');
    expect(layers('entered')).not.toContain('FRONT_OPENING_AXIS');
    expect(layers('entered')).toContain('FRONT_CORNER_LIFT');
  });

  test('then labels lie on their own layer, last, within their openings', () => {
    const drawing = draw('front', { labels: true });
    expect(drawing.layers.at(-1)).toEqual({ name: 'FRONT_LABELS', colour: 251 });
    const texts = drawing.entities.filter((e) => e.kind === 'text');
    expect(texts.map((t) => [t.layer, t.text])).toEqual([
      ['FRONT_LABELS', 'A'],
      ['FRONT_LABELS', 'B'],
    ]);
    texts.forEach((t, i) => {
      const opening = vertexExtents(lineOn(drawing, 'FRONT_OPENING', i).vertices);
      expect(t.at.x > opening.minX && t.at.x < opening.maxX && t.at.y > opening.minY && t.at.y < opening.maxY).toBe(
        true,
      );
    });
    expect(drawing.extents).toEqual(draw('front').extents);
  });
});

describe('When the back is drawn from the frame’s corner', () => {
  // The frame's extents in the back setup start at 0, 0; what is left in the drawing is right in frame view when the fold is vertical.
  test.each<[Particulars['setup']['flip'], { minX: number; minY: number }]>([
    ['side-to-side', { minX: 33 - 1.005, minY: -0.1875 }],
    ['end-over-end', { minX: 0.245, minY: -0.1875 }],
  ])('then the left end lies where it is seen from behind, turned %s', (flip, wanted) => {
    const example = workedExample();
    const particulars = workedExample({ setup: { ...example.setup, flip }, dados: example.dados.slice(0, 1) });
    const extents = vertexExtents(lineOn(draw('back', { origin: 'frame' }, particulars), 'BACK_DADO').vertices);
    expect(extents.minX).toBeCloseTo(wanted.minX, 12);
    expect(extents.minY).toBeCloseTo(wanted.minY, 12);
  });
});

test('When an arc bulges beyond its ends, then the extents reach its crown', () => {
  const half = 1;
  const perimeter = [
    [0, 0],
    [10, 0, half],
    [10, 8],
    [0, 8],
  ] as const;
  const outline: Particulars['outline'] = { kind: 'traced', perimeter, openings: [] };
  const worked = workFrame(workedExample({ outline, dados: [] }));
  // The blank lies around all; without it the arc is what reaches farthest.
  const lineSets = worked.front.lineSets.filter((s) => s.set === 'PERIMETER');
  const drawing = buildDrawing({ ...worked, front: { ...worked.front, lineSets } }, 'front', {
    ...standard,
    origin: 'frame',
  });
  // A half circle of diameter 8 on the side x = 10.
  expect(drawing.extents.maxX).toBeCloseTo(14, 12);
  expect(drawing.extents).toMatchObject({ minX: 0, minY: 0, maxY: 8 });
});

describe('When lines are tidied', () => {
  const v = (x: number, y: number, bulge = 0) => ({ x, y, bulge });

  test('then vertices that are the same in the file are one, with the bulge that leaves the last of them', () => {
    const tidy = tidyContour([v(0, 0), v(5, 0, 0.3), v(5, 0.00000004, 0.7), v(5, 5), v(0, 5), v(0, 1e-9)], true, 6);
    expect(tidy).toEqual([v(0, 0), v(5, 0, 0.7), v(5, 5), v(0, 5)]);
    expect(tidyContour([v(0, 0), v(5, 0.00002), v(5, 0.00004), v(0, 5)], true, 4)).toHaveLength(3);
    expect(tidyContour([v(0, 0), v(5, 0.00002), v(5, 0.00004), v(0, 5)], true, 5)).toHaveLength(4);
  });

  test('then there is no −0', () => {
    const tidy = tidyContour([v(-0, -0, -0), v(1, -0), v(1, 1)], true, 6);
    expect(tidy.flatMap((p) => [p.x, p.y, p.bulge]).some((n) => Object.is(n, -0))).toBe(false);
    const path = tidyPath(
      [
        { x: -0, y: 1, z: -0 },
        { x: 0, y: 1, z: -1 },
      ],
      6,
    );
    expect(path.flatMap((p) => [p.x, p.y, p.z]).some((n) => Object.is(n, -0))).toBe(false);
  });

  test('then a circle of two half circles stays, and a plunge straight down', () => {
    expect(tidyContour([v(0, 0, 1), v(2, 0, 1)], true, 6)).toHaveLength(2);
    expect(
      tidyPath(
        [
          { x: 1, y: 1, z: -1 },
          { x: 1, y: 1, z: 0 },
        ],
        6,
      ),
    ).toHaveLength(2);
  });

  test('then what shrinks to nothing is refused', () => {
    expect(() => tidyContour([v(0, 0), v(0.00001, 0), v(0, 0.00001)], true, 4)).toThrow(DrawingRefused);
    expect(() => tidyContour([v(0, 0), v(1, 0)], true, 6)).toThrow(/shrinks to nothing at 6 decimals/);
    expect(() =>
      tidyPath(
        [
          { x: 0, y: 0, z: 0 },
          { x: 0, y: 0, z: 1e-9 },
        ],
        6,
      ),
    ).toThrow(DrawingRefused);
  });
});
