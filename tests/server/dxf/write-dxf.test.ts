import { describe, expect, test } from 'vitest';
import { buildDrawing } from '#shared/kernel/drawing/build-drawing.ts';
import type { Drawing, DrawingEntity } from '#shared/kernel/drawing/drawing.ts';
import { workFrame } from '#shared/kernel/work-frame.ts';
import { writeDxf } from '../../../server/dxf/write-dxf.ts';
import { SITUATIONS } from './situations.ts';
import { R2007 } from './written-files.ts';

const FLAVOURS = ['R2007', 'R12'] as const;

type Tag = readonly [code: number, value: string];

/** A DXF is pairs of lines: a group code and a value (DXF Reference, "Group Codes in General"). */
function tagsOf(text: string): Tag[] {
  const lines = text.split('\n');
  expect(lines.pop()).toBe('');
  expect(lines.length % 2).toBe(0);
  return Array.from({ length: lines.length / 2 }, (_, i) => [Number(lines[2 * i]), lines[2 * i + 1]!] as const);
}

/** Tags between a section's name and its end. */
function section(tags: readonly Tag[], name: string): Tag[] {
  const from = tags.findIndex(([code, value], i) => code === 2 && value === name && tags[i - 1]?.[1] === 'SECTION');
  expect(from).toBeGreaterThan(0);
  return tags.slice(
    from + 1,
    tags.findIndex(([code, value], i) => i > from && code === 0 && value === 'ENDSEC'),
  );
}

const square = (changes: Partial<Drawing> = {}): Drawing => ({
  unit: 'in',
  decimals: 6,
  layers: [
    { name: 'FRONT_OPENING', colour: 5 },
    { name: 'FRONT_CORNER_LIFT', colour: 190 },
  ],
  entities: [
    {
      kind: 'polyline',
      layer: 'FRONT_OPENING',
      closed: true,
      vertices: [
        { x: -0, y: 0, bulge: 0 },
        { x: 2, y: -4e-9, bulge: 0.5 },
        { x: 2, y: 1.0000004, bulge: 0 },
      ],
    },
    {
      kind: 'polyline3d',
      layer: 'FRONT_CORNER_LIFT',
      points: [
        { x: 1e-7, y: 23.5, z: -0.8125 },
        { x: 1, y: 1, z: 0 },
      ],
    },
  ],
  extents: { minX: 0, minY: 0, maxX: 2.25, maxY: 23.5 },
  ...changes,
});

describe.each(FLAVOURS)('When a drawing is written as %s', (flavour) => {
  test('then the same drawing gives the same text, whatever was written before', () => {
    const first = writeDxf(square(), flavour);
    writeDxf(square({ unit: 'mm' }), 'R2007');
    expect(writeDxf(square(), flavour)).toBe(first);
  });

  test('then the file ends with EOF and a line end', () => {
    expect(writeDxf(square(), flavour).endsWith('\nEOF\n')).toBe(true);
  });

  test('then numbers have fixed decimals, no exponent and no minus before 0', () => {
    const tags = tagsOf(writeDxf(square(), flavour));
    const reals = [...section(tags, 'HEADER'), ...section(tags, 'ENTITIES')].filter(
      ([code]) => code >= 10 && code <= 59,
    );
    expect(reals.length).toBeGreaterThan(20);
    for (const [code, value] of reals) expect(value, `group ${code}`).toMatch(/^(?!-0\.0+$)-?\d+\.\d{6}$/);
    expect(reals.map(([, value]) => value)).toContain('23.500000');
  });

  test.each([4, 5])('then a profile with %i decimals is followed, and a bulge keeps its six', (decimals) => {
    const entities = section(tagsOf(writeDxf(square({ decimals }), flavour)), 'ENTITIES');
    const places = entities
      .filter(([code]) => code === 10 || code === 20)
      .map(([, value]) => value.split('.')[1]!.length);
    expect(new Set(places)).toEqual(new Set([decimals]));
    expect(entities).toContainEqual([42, '0.500000']);
  });

  test('then a climbing line says so: POLYLINE 70 = 8, VERTEX 70 = 32 (DXF Reference)', () => {
    const entities = section(tagsOf(writeDxf(square(), flavour)), 'ENTITIES');
    const flagsOf = (type: string) =>
      entities.flatMap(([code, value], i) => {
        if (code !== 0 || value !== type) return [];
        const ends = entities.findIndex(([c], j) => j > i && c === 0);
        const own = entities.slice(i, ends === -1 ? undefined : ends);
        const on = own.find(([c]) => c === 8)?.[1];
        return on === 'FRONT_CORNER_LIFT' ? own.filter(([c]) => c === 70).map(([, v]) => v) : [];
      });
    expect(flagsOf('POLYLINE')).toEqual(['8']);
    expect(flagsOf('VERTEX')).toEqual(['32', '32']);
  });

  test.each<[string, Partial<Drawing>, RegExp]>([
    ['an unknown unit', { unit: 'ft' as 'in' }, /unit is "ft", takes "in" or "mm"/],
    ['decimals outside 4 to 6', { decimals: 3 }, /decimals is 3, takes 4, 5 or 6/],
    [
      'a layer that is not declared',
      { layers: [{ name: 'FRONT_OPENING', colour: 5 }] },
      /"FRONT_CORNER_LIFT" is used but not declared/,
    ],
    [
      'a layer name in small letters',
      { layers: [{ name: 'front_opening', colour: 5 }] },
      /layer "front_opening", takes/,
    ],
    ['a layer name of 32 characters', { layers: [{ name: 'A'.repeat(32), colour: 5 }] }, /takes 1 to 31/],
    ['layer 0', { layers: [{ name: '0', colour: 5 }] }, /layer "0", takes/],
    ['a layer declared twice', { layers: [...square().layers, ...square().layers] }, /"FRONT_OPENING" is there twice/],
    [
      'a colour that is none',
      { layers: [{ name: 'FRONT_OPENING', colour: 256 }] },
      /colour of layer "FRONT_OPENING" is 256, takes 1 to 255/,
    ],
    ['extents that are not numbers', { extents: { ...square().extents, maxX: NaN } }, /maxX of the extents is NaN/],
    ['no lines', { entities: [] }, /no lines/],
  ])('then %s is refused before anything is written', (_, changes, message) => {
    expect(() => writeDxf(square(changes), flavour)).toThrow(message);
  });

  const on = 'FRONT_OPENING';
  test.each<[string, DrawingEntity, RegExp]>([
    [
      'x that is NaN',
      {
        kind: 'polyline',
        layer: on,
        closed: false,
        vertices: [
          { x: NaN, y: 0, bulge: 0 },
          { x: 1, y: 0, bulge: 0 },
        ],
      },
      /x of a vertex on layer "FRONT_OPENING" is NaN/,
    ],
    [
      'an endless y',
      {
        kind: 'polyline',
        layer: on,
        closed: false,
        vertices: [
          { x: 0, y: 0, bulge: 0 },
          { x: 1, y: Infinity, bulge: 0 },
        ],
      },
      /y of a vertex .* is Infinity/,
    ],
    [
      'a bulge that is NaN',
      {
        kind: 'polyline',
        layer: on,
        closed: false,
        vertices: [
          { x: 0, y: 0, bulge: NaN },
          { x: 1, y: 1, bulge: 0 },
        ],
      },
      /bulge of a vertex .* is NaN/,
    ],
    [
      'a missing z',
      {
        kind: 'polyline3d',
        layer: on,
        points: [
          { x: 0, y: 0, z: undefined as unknown as number },
          { x: 1, y: 1, z: 0 },
        ],
      },
      /z of a vertex .* is undefined/,
    ],
    [
      'a number that would need an exponent',
      {
        kind: 'polyline',
        layer: on,
        closed: false,
        vertices: [
          { x: 1e21, y: 0, bulge: 0 },
          { x: 1, y: 1, bulge: 0 },
        ],
      },
      /1e\+21, takes one below/,
    ],
    [
      'a single vertex',
      { kind: 'polyline', layer: on, closed: true, vertices: [{ x: 0, y: 0, bulge: 0 }] },
      /has 1 vertices, takes at least 2/,
    ],
    [
      'text of two lines',
      { kind: 'text', layer: on, at: { x: 0, y: 0 }, height: 1, text: 'A\n  0\nLINE' },
      /takes one line of text/,
    ],
  ])('then %s is refused before anything is written', (_, entity, message) => {
    expect(() => writeDxf(square({ entities: [entity] }), flavour)).toThrow(message);
  });
});

test('When the flavour is unknown, then it is refused by name', () => {
  expect(() => writeDxf(square(), 'R14' as 'R12')).toThrow(/got "R14", takes "R2007" or "R12"/);
});

test.each(SITUATIONS)(
  'When both faces are written as R12 ($name), then there is nothing that R12 does not know',
  ({ particulars }) => {
    const worked = workFrame(particulars);
    for (const face of ['back', 'front'] as const) {
      const tags = tagsOf(writeDxf(buildDrawing(worked, face, { ...R2007, labels: true }), 'R12'));
      expect(tags.flatMap(([code], i) => (tags[i - 1]?.[1] === 'SECTION' && code === 2 ? [tags[i]![1]] : []))).toEqual([
        'HEADER',
        'TABLES',
        'ENTITIES',
      ]);
      const types = new Set(section(tags, 'ENTITIES').flatMap(([code, value]) => (code === 0 ? [value] : [])));
      for (const type of types) expect(['POLYLINE', 'VERTEX', 'SEQEND', 'TEXT']).toContain(type);
      // No handles, subclass markers, owners (DXF Reference, release 12).
      expect(tags.filter(([code]) => [5, 100, 102, 330].includes(code))).toEqual([]);
      expect(tags.every(([, value]) => /^[\x20-\x7e]*$/.test(value))).toBe(true);
    }
  },
);

test('When a small drawing is written as R12, then it reads line by line as release 12 has it', () => {
  const drawing: Drawing = {
    unit: 'mm',
    decimals: 4,
    layers: [{ name: 'BACK_DADO', colour: 1 }],
    entities: [
      {
        kind: 'polyline',
        layer: 'BACK_DADO',
        closed: true,
        vertices: [
          { x: 0, y: 0, bulge: 1 },
          { x: 10, y: 0, bulge: 0 },
        ],
      },
    ],
    extents: { minX: 0, minY: -5, maxX: 10, maxY: 0 },
  };
  const entities =
    '0 SECTION 2 ENTITIES 0 POLYLINE 8 BACK_DADO 66 1 10 0.0000 20 0.0000 30 0.0000 70 1 ' +
    '0 VERTEX 8 BACK_DADO 10 0.0000 20 0.0000 30 0.0000 42 1.000000 0 VERTEX 8 BACK_DADO 10 10.0000 20 0.0000 30 0.0000 ' +
    '0 SEQEND 8 BACK_DADO 0 ENDSEC 0 EOF ';
  const header =
    '0 SECTION 2 HEADER 9 $ACADVER 1 AC1009 9 $INSUNITS 70 4 9 $MEASUREMENT 70 1 ' +
    '9 $EXTMIN 10 0.0000 20 -5.0000 30 0.0000 9 $EXTMAX 10 10.0000 20 0.0000 30 0.0000 ' +
    '9 $LIMMIN 10 0.0000 20 -5.0000 9 $LIMMAX 10 10.0000 20 0.0000 0 ENDSEC ';
  const text = writeDxf(drawing, 'R12').replaceAll('\n', ' ');
  expect(text.startsWith(header)).toBe(true);
  expect(text.endsWith(entities)).toBe(true);
});
