import { describe, expect, test } from 'vitest';
import { block, circle, dxfText, entity, insert, layer, line } from './dxf-text.ts';
import { codesOf, countOf, expectRows, readEntities, readText, rowsOf } from './found.ts';

const GOOD = line(0, 0, 1, 0);

/** Where in a file a value stands on a line of its own, counted from 1. */
const lineOf = (text: string, value: string): number => text.split('\n').indexOf(value) + 1;

describe('When a number is none', () => {
  const types = {
    LINE: line(0, 0, 777, 5),
    ARC: entity('ARC', [10, 0], [20, 0], [40, 777], [50, 0], [51, 90]),
    CIRCLE: circle(0, 0, 777),
    ELLIPSE: entity('ELLIPSE', [10, 0], [20, 0], [11, 777], [21, 0], [40, 0.5]),
    LWPOLYLINE: entity('LWPOLYLINE', [70, 1], [10, 0], [20, 0], [10, 777], [20, 0]),
    POLYLINE:
      entity('POLYLINE') + entity('VERTEX', [10, 0], [20, 0]) + entity('VERTEX', [10, 777], [20, 0]) + entity('SEQEND'),
    SPLINE: entity('SPLINE', [71, 1], [40, 0], [40, 0], [40, 1], [40, 1], [10, 0], [20, 0], [10, 777], [20, 0]),
    INSERT: insert('P', 777, 0),
  };
  const bad = ['nan', '1,5', '1d2', '1e400', '', 'inf', '1.2.3'];

  test.each(Object.keys(types).flatMap((type) => bad.map((value) => [type, value] as const)))(
    'then %s with “%s” is refused with the line, and the rest is read',
    (type, value) => {
      const text = dxfText({ blocks: block('P', GOOD), entities: types[type as keyof typeof types] + GOOD });
      const found = readText(text.replace('\n777\n', `\n${value}\n`));
      const first = lineOf(text, 'ENTITIES') + 2;
      expect(found.census).toMatchObject([
        { type, fate: 'refused', reason: 'not-a-number', count: 1, lines: [first] },
        { type: 'LINE', fate: 'kept', count: 1 },
      ]);
      expect(found.problems).toMatchObject([{ code: 'not-a-number', line: lineOf(text, '777') }]);
      expectRows(found, [[0, 0, 1, 0, 0]]);
    },
  );

  test('then the same file with a number is read whole', () => {
    for (const [type, text] of Object.entries(types)) {
      const found = readText(dxfText({ blocks: block('P', GOOD), entities: text }));
      expect(found.census, type).toMatchObject([{ type, fate: 'kept', count: 1 }]);
    }
  });

  test('then a coordinate that never comes is told with the entity’s line', () => {
    const text = dxfText({ entities: entity('LINE', [10, 0], [20, 0], [11, 5]) + GOOD });
    const found = readText(text);
    expect(found.problems).toMatchObject([{ code: 'missing-number', line: lineOf(text, 'LINE') }]);
    expect(found.curves.count).toBe(1);
  });

  test('then a coordinate further out than can be reckoned with is refused', () => {
    expect(readEntities(line(0, 0, 1e13, 0)).census).toMatchObject([{ fate: 'refused', reason: 'out-of-range' }]);
    expect(readEntities(circle(0, 0, 1e300)).census).toMatchObject([{ fate: 'refused', reason: 'out-of-range' }]);
  });

  test('then of many only ten are told one by one, and how many more there are', () => {
    const found = readEntities(line(0, 0, 1, 0).replace('\n1\n', '\nnan\n').repeat(1000));
    expect(found.problems.length).toBe(11);
    expect(found.problems.at(-1)).toMatchObject({ code: 'not-a-number', message: expect.stringContaining('990') });
    expect(countOf(found.census)).toBe(1000);
  });
});

describe('When lines of a file are out of step', () => {
  test('then a line that is no group code costs its entity, and reading falls into step', () => {
    const text = dxfText({ entities: line(0, 0, 5, 5).replace('\n11\n', '\nrubbish here\n11\n') + GOOD });
    const found = readText(text);
    expect(found.problems).toMatchObject([{ code: 'not-a-pair', line: lineOf(text, 'rubbish here') }]);
    expectRows(found, [[0, 0, 1, 0, 0]]);
  });

  test('then empty lines between pairs do no harm', () => {
    expectRows(readEntities(line(0, 0, 5, 5).replace('\n11\n', '\n\n\n11\n') + GOOD), [
      [0, 0, 5, 5, 0],
      [0, 0, 1, 0, 0],
    ]);
  });

  test('then an empty line in the place of a value costs its entity and no other', () => {
    const text = dxfText({ entities: line(0, 0, 5.5, 5.5).replace('\n11\n', '\n11\n\n') + GOOD });
    const found = readText(text);
    expect(found.problems).toMatchObject([{ code: 'not-a-pair', line: text.split('\n').indexOf('5.5') + 1 }]);
    expectRows(found, [[0, 0, 1, 0, 0]]);
  });
});

describe('When the file ends too soon', () => {
  const whole = dxfText({
    entities:
      line(0, 0, 1, 0) +
      line(0, 0, 25, 137) +
      entity('LWPOLYLINE', [90, 3], [70, 1], [10, 0], [20, 0], [10, 1], [20, 0], [10, 1], [20, 1]),
  });

  test('then wherever it is cut, what came before is there, unchanged, and it says that it is incomplete', () => {
    const rows = rowsOf(readText(whole));
    expect(rows.length).toBe(5);
    const counts = new Set<number>();
    for (let length = 0; length < whole.length - 4; length++) {
      const found = readText(whole.slice(0, length));
      expect(found.incomplete, `${length} bytes`).toBe(true);
      expect(codesOf(found)).toContain('incomplete');
      expect(rowsOf(found), `${length} bytes`).toEqual(rows.slice(0, found.curves.count));
      counts.add(found.curves.count);
    }
    expect([...counts].sort()).toEqual([0, 1, 2, 5]);
    expect(readText(whole).incomplete).toBe(false);
  });

  test('then a polyline of the old kind that it ends within is refused', () => {
    const cut = dxfText({
      entities: GOOD + entity('POLYLINE') + entity('VERTEX', [10, 0], [20, 0]) + entity('VERTEX', [10, 9], [20, 0]),
      end: '',
    }).replace(/0\nENDSEC\n$/, '');
    const found = readText(cut);
    expect(found.census).toMatchObject([{ fate: 'kept' }, { type: 'POLYLINE', fate: 'refused', reason: 'cut-off' }]);
  });

  test('then a file whose end mark alone is missing is read whole', () => {
    const found = readText(dxfText({ entities: GOOD, end: '' }));
    expectRows(found, [[0, 0, 1, 0, 0]]);
    expect(found.incomplete).toBe(true);
  });

  test('then one cut right behind a block’s INSERT is read, and one cut within its last number is not', () => {
    const text = dxfText({ blocks: block('P', GOOD), entities: GOOD + insert('P', 5, 127) + GOOD, end: '' });
    const cut = text.slice(0, text.indexOf('\n127\n') + '\n127\n'.length);
    expectRows(readText(cut), [
      [0, 0, 1, 0, 0],
      [5, 127, 6, 127, 0],
    ]);
    const within = readText(cut.slice(0, -2));
    expectRows(within, [[0, 0, 1, 0, 0]]);
    expect(within.census).toMatchObject([{ fate: 'kept' }, { type: 'INSERT', fate: 'refused', reason: 'cut-off' }]);
  });
});

describe('When a file has what we do not know', () => {
  test('then unknown records and wrong counts in the tables pass by, and the layers behind them are read', () => {
    const tables =
      '0\nTABLE\n2\nLAYER\n70\n4000000000\n' +
      entity('MYSTERY', [2, 'X'], [1, 'Y']) +
      layer('ICE', 1, 7) +
      layer('BAD', 0, 7).replace('\n7\n', '\nred\n') +
      '0\nENDTAB\n' +
      entity('TABLE', [2, 'ODD'], [70, 99]);
    const found = readText(dxfText({ tables, entities: line(0, 0, 1, 0, [8, 'ICE']) + line(0, 0, 2, 0, [8, 'BAD']) }));
    expectRows(found, [[0, 0, 2, 0, 0]]);
    expect(codesOf(found)).toEqual(['layer-unread']);
  });

  test('then unknown groups, extended data and application groups within an entity pass by', () => {
    const more = [
      [102, '{ACAD_REACTORS'],
      [330, '1F'],
      [102, '}'],
      [1001, 'APP'],
      [1010, 'nan'],
      [1040, 'x'],
      [-5, 'y'],
    ] as const;
    expectRows(readEntities(line(0, 0, 1, 0, ...more)), [[0, 0, 1, 0, 0]]);
  });

  test('then unknown sections pass by, and sections may come in any order', () => {
    const wanted = readText(dxfText({ blocks: block('P', GOOD), entities: insert('P', 3, 0) }));
    const parts = dxfText({ blocks: block('P', GOOD), entities: insert('P', 3, 0), end: '' }).split(/(?<=ENDSEC\n)/);
    const text = `0\nSECTION\n2\nTHUMBNAIL\n310\nFF\n0\nENDSEC\n${parts.toReversed().join('')}0\nEOF\n`;
    expect(rowsOf(readText(text))).toEqual(rowsOf(wanted));
    expect(wanted.curves.count).toBe(1);
  });

  test('then sections without ENDSEC end where the next begins', () => {
    const text = dxfText({ blocks: block('P', GOOD), entities: insert('P', 3, 0) }).replaceAll('0\nENDSEC\n', '');
    expectRows(readText(text), [[3, 0, 4, 0, 0]]);
  });

  test('then records of other sections among the entities do not end them', () => {
    const found = readEntities(
      GOOD + entity('ENDBLK') + entity('BLOCK', [2, 'P']) + entity('LAYER') + line(0, 0, 2, 0),
    );
    expect(found.curves.count).toBe(2);
    expect(found.census).toContainEqual(expect.objectContaining({ type: 'ENDBLK', fate: 'refused', count: 1 }));
    expect(countOf(found.census)).toBe(5);
  });

  test('then what stands behind the end mark does not count', () => {
    const found = readText(dxfText({ entities: GOOD }) + dxfText({ entities: GOOD }));
    expect(found.curves.count).toBe(1);
    expect(found.problems).toEqual([]);
  });

  test('then a file of no sections is an empty drawing that says so', () => {
    for (const text of ['', '0\nEOF\n', 'hello', '0', '0\n', '\0\0\0', '0\nSECTION', '0\nSECTION\n0\nSECTION\n'])
      expect(codesOf(readText(text)), JSON.stringify(text)).toContain('no-entities');
  });
});
