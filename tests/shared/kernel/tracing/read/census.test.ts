import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { block, bytesOf, circle, dxfText, entity, insert, layer, layerTable, line } from './dxf-text.ts';
import { codesOf, countOf, readText } from './found.ts';
import { readDrawing } from '#shared/kernel/tracing/read/read-drawing.ts';

describe('When entities of any kind are read', () => {
  // Each: what it is in the file, and what becomes of it.
  const kinds = {
    line: [line(0, 0, 1, 0), 'kept'],
    steep: [line(0, 0, 1, 0, [31, 4]), 'refused'],
    circle: [circle(0, 0, 1), 'kept'],
    wrong: [circle(0, 0, 1).replace('\n1\n', '\n1,5\n'), 'refused'],
    polyline: [
      entity('POLYLINE') + entity('VERTEX', [10, 0], [20, 0]) + entity('VERTEX', [10, 1], [20, 0]) + entity('SEQEND'),
      'kept',
    ],
    insert: [insert('P', 0, 0), 'kept'],
    missing: [insert('GONE', 0, 0), 'refused'],
    text: [entity('TEXT', [1, 'A']), 'aside'],
    hatch: [entity('HATCH', [10, 0], [20, 0]), 'aside'],
    face: [entity('3DFACE', [10, 0], [20, 0]), 'refused'],
    unknown: [entity('SPACESHIP'), 'refused'],
    paper: [line(0, 0, 1, 0, [67, 1]), 'aside'],
    unseen: [line(0, 0, 1, 0, [60, 1]), 'aside'],
    stray: [entity('VERTEX', [10, 0], [20, 0]), 'refused'],
  } as const;

  test('then kept, set aside and refused are every entity in the file, and so for each fate', () => {
    const some = fc.array(fc.constantFrom(...Object.keys(kinds)) as fc.Arbitrary<keyof typeof kinds>, {
      maxLength: 60,
    });
    fc.assert(
      fc.property(some, (names) => {
        const entities = names.map((name) => kinds[name][0]).join('');
        const found = readText(dxfText({ blocks: block('P', line(0, 0, 1, 0) + line(0, 1, 1, 1)), entities }));
        expect(countOf(found.census)).toBe(names.length);
        for (const fate of ['kept', 'aside', 'refused'])
          expect(countOf(found.census.filter((row) => row.fate === fate)), fate).toBe(
            names.filter((name) => kinds[name][1] === fate).length,
          );
        expect(countOf(found.placed)).toBe(2 * names.filter((name) => name === 'insert').length);
        const leaves = [...found.census, ...found.placed].filter((row) => row.fate === 'kept' && row.type !== 'INSERT');
        expect(new Set(found.curves.entityOf).size).toBe(countOf(leaves));
        for (const row of found.census) expect(row.reason === null).toBe(row.fate === 'kept');
      }),
      { numRuns: 100 },
    );
  });

  test('then rows tell type, layer and reason apart, with the lines of the first ten', () => {
    const twelve = Array.from({ length: 12 }, () => line(0, 0, 1, 0, [8, 'A'])).join('');
    const text = dxfText({ entities: twelve + line(0, 0, 1, 0, [8, 'B']) });
    const lines = text.split('\n').flatMap((value, i) => (value === 'LINE' ? [i + 1] : []));
    expect(readText(text).census).toEqual([
      { type: 'LINE', layer: 'A', fate: 'kept', reason: null, count: 12, lines: lines.slice(0, 10) },
      { type: 'LINE', layer: 'B', fate: 'kept', reason: null, count: 1, lines: lines.slice(12) },
    ]);
  });

  test('then the same bytes give the same drawing', () => {
    const bytes = bytesOf(
      dxfText({
        blocks: block('P', circle(0, 0, 1)),
        entities: Object.values(kinds)
          .map(([text]) => text)
          .join(''),
      }),
    );
    expect(readDrawing(bytes)).toEqual(readDrawing(bytes));
  });
});

describe('When something is not to be seen', () => {
  const tables = layerTable(layer('OFF', 0, -7), layer('ICE', 1, 7), layer('BOTH', 5, -7), layer('LOCKED', 4, 7));
  const read = (text: string, include = {}) => readText(dxfText({ tables, entities: text }), { include });

  test.each([
    ['paper space', line(0, 0, 1, 0, [67, 1]), 'paper-space', 'paperSpace'],
    ['an invisible one', line(0, 0, 1, 0, [60, 1]), 'invisible', 'invisible'],
    ['a layer that is off', line(0, 0, 1, 0, [8, 'off']), 'layer-off', 'offLayers'],
    ['a frozen layer', line(0, 0, 1, 0, [8, 'ICE']), 'layer-frozen', 'frozenLayers'],
  ])('then %s is set aside, and comes in when it is asked for', (_, text, reason, include) => {
    expect(read(text).census).toMatchObject([{ fate: 'aside', reason, count: 1 }]);
    expect(read(text, { [include]: true }).census).toMatchObject([{ fate: 'kept', reason: null, count: 1 }]);
    const others = { paperSpace: true, invisible: true, offLayers: true, frozenLayers: true, [include]: false };
    expect(read(text, others).curves.count).toBe(0);
  });

  test('then a layer both off and frozen takes both, and a locked one is seen', () => {
    const both = line(0, 0, 1, 0, [8, 'BOTH']);
    expect(read(both, { offLayers: true }).curves.count).toBe(0);
    expect(read(both, { offLayers: true, frozenLayers: true }).curves.count).toBe(1);
    expect(read(line(0, 0, 1, 0, [8, 'LOCKED'])).curves.count).toBe(1);
  });

  test.each([
    ['TEXT', 'text'],
    ['MTEXT', 'text'],
    ['ATTDEF', 'text'],
    ['DIMENSION', 'dimension'],
    ['LEADER', 'dimension'],
    ['MULTILEADER', 'dimension'],
    ['HATCH', 'hatch'],
    ['SOLID', 'hatch'],
    ['POINT', 'point'],
    ['IMAGE', 'picture'],
    ['XLINE', 'construction-line'],
    ['VIEWPORT', 'viewport'],
  ])('then %s is set aside as %s', (type, reason) => {
    const found = read(entity(type, [10, 0], [20, 0]));
    expect(found.census).toMatchObject([{ type, fate: 'aside', reason, count: 1 }]);
    expect(found.problems).toEqual([]);
  });

  test.each(['3DFACE', '3DSOLID', 'MESH', 'BODY', 'REGION', 'SURFACE'])(
    'then %s is refused with what to export instead',
    (type) => {
      const found = read(entity(type, [10, 0], [20, 0]));
      expect(found.census).toMatchObject([{ type, fate: 'refused', reason: 'three-dimensional', count: 1 }]);
      expect(found.problems).toMatchObject([{ code: 'three-dimensional', message: expect.stringContaining('2D') }]);
    },
  );

  test.each(['MLINE', 'ACAD_PROXY_ENTITY', 'NEWTYPE'])('then %s, which is not read, is refused and says so', (type) => {
    expect(codesOf(read(entity(type)))).toEqual(['unknown-entity']);
  });
});
