import { describe, expect, test } from 'vitest';
import { block, circle, dxfText, entity, FROM_BELOW, insert, layer, layerTable, line } from './dxf-text.ts';
import { codesOf, countOf, expectRows, farthestOf, readText, rowsByEntity, rowsOf } from './found.ts';

// INSERT and BLOCK: DXF Reference. The contents are moved by the base point, scaled, turned, and moved to the insertion
// point; rows and columns step along the turned axes.

const QUARTER = Math.tan(Math.PI / 8);
/** A line along X and a quarter arc about 0, 0. */
const PARTS = line(0, 0, 4, 0) + entity('ARC', [10, 0], [20, 0], [40, 2], [50, 0], [51, 90]);

const read = (entities: string, blocks = block('P', PARTS)) => readText(dxfText({ blocks, entities }));

describe('When a block is put somewhere', () => {
  test('then its contents come there, once for each time', () => {
    const found = read(insert('P', 10, 20) + insert('p', -1, 0));
    expectRows(found, [
      [10, 20, 14, 20, 0],
      [12, 20, 10, 22, QUARTER],
      [-1, 0, 3, 0, 0],
      [1, 0, -1, 2, QUARTER],
    ]);
    expect([...found.curves.entityOf]).toEqual([0, 1, 2, 3]);
    expect(found.problems).toEqual([]);
  });

  test('then the base point comes to the insertion point', () => {
    expectRows(read(insert('P', 10, 20), block('P', line(0, 0, 4, 0), 4, 1)), [[6, 19, 10, 19, 0]]);
  });

  test('then it is scaled before it is turned', () => {
    const found = read(insert('P', 0, 0, [41, 2], [42, 2], [50, 90]));
    expectRows(found, [
      [0, 0, 0, 8, 0],
      [0, 4, -4, 0, QUARTER],
    ]);
  });

  test('then a negative scale mirrors and turns bulges', () => {
    expectRows(read(insert('P', 0, 0, [41, -1], [42, 1])), [
      [0, 0, -4, 0, 0],
      [-2, 0, 0, 2, -QUARTER],
    ]);
    // Both negative: half a turn, no mirror.
    expectRows(read(insert('P', 0, 0, [41, -1], [42, -1])), [
      [0, 0, -4, 0, 0],
      [-2, 0, 0, -2, QUARTER],
    ]);
  });

  test('then from below X runs backwards', () => {
    expectRows(read(insert('P', 10, 20, ...FROM_BELOW)), [
      [-10, 20, -14, 20, 0],
      [-12, 20, -10, 22, -QUARTER],
    ]);
  });

  test('then uneven scales make ellipses of arcs, as arcs along them, with a notice', () => {
    const found = read(insert('P', 0, 0, [41, 3], [42, 1]), block('P', circle(0, 0, 10)));
    expect(codesOf(found)).toEqual(['ellipse-fitted']);
    const places = Array.from({ length: 100 }, (_, i) => [30 * Math.cos(i), 10 * Math.sin(i)] as const);
    expect(farthestOf(rowsOf(found), places)).toBeLessThan(0.01);
  });

  test('then a bulge in uneven scales keeps its ends to the bit', () => {
    const polyline = entity(
      'LWPOLYLINE',
      [70, 0],
      [10, 0.1],
      [20, 0.7],
      [42, 0.6],
      [10, 9.3],
      [20, 3.1],
      [10, 20],
      [20, 3.1],
    );
    const rows = rowsOf(read(insert('P', 0, 0, [41, 3], [42, 1]), block('P', polyline)));
    expect(rows[0]!.slice(0, 2)).toEqual([3 * 0.1, 0.7]);
    expect(rows.at(-2)!.slice(2, 4)).toEqual(rows.at(-1)!.slice(0, 2));
  });

  test('then rows and columns step along the turned axes, unscaled', () => {
    const found = read(
      insert('P', 0, 0, [41, 2], [42, 2], [50, 90], [70, 2], [71, 2], [44, 10], [45, 7]),
      block('P', line(0, 0, 1, 0)),
    );
    expectRows(found, [
      [0, 0, 0, 2, 0],
      [0, 10, 0, 12, 0],
      [-7, 0, -7, 2, 0],
      [-7, 10, -7, 12, 0],
    ]);
    expect(found.placed).toMatchObject([{ type: 'LINE', count: 4 }]);
  });

  test('then from below columns step backwards, rows do not', () => {
    const steps = [[70, 2], [71, 2], [44, 10], [45, 7], ...FROM_BELOW] as const;
    expectRows(read(insert('P', 0, 0, ...steps), block('P', line(0, 0, 1, 0))), [
      [0, 0, -1, 0, 0],
      [-10, 0, -11, 0, 0],
      [0, 7, -1, 7, 0],
      [-10, 7, -11, 7, 0],
    ]);
    // Turned by 90° the columns run up and the rows, backwards of backwards, to the right.
    expectRows(read(insert('P', 0, 0, [50, 90], ...steps), block('P', line(0, 0, 1, 0))), [
      [0, 0, 0, 1, 0],
      [0, 10, 0, 11, 0],
      [7, 0, 7, 1, 0],
      [7, 10, 7, 11, 0],
    ]);
  });

  test.each([0, -3])('then a count of %d stands for one', (count) => {
    expect(read(insert('P', 0, 0, [70, count], [71, count]), block('P', line(0, 0, 1, 0))).curves.count).toBe(1);
  });

  test('then blocks within blocks are put together', () => {
    const blocks = block('P', line(0, 0, 1, 0)) + block('Q', insert('P', 5, 0, [50, 90]) + line(0, 0, 0, 9));
    const found = read(insert('Q', 100, 0, [41, -2], [42, 2]), blocks);
    expectRows(found, [
      [90, 0, 90, 2, 0],
      [100, 0, 100, 18, 0],
    ]);
  });

  test('then attributes belong to it and are not counted', () => {
    const attribute = entity('ATTRIB', [8, '0'], [1, 'A1'], [10, 0], [20, 0]);
    const found = read(insert('P', 0, 0, [66, 1]) + attribute + attribute + entity('SEQEND') + line(0, 0, 1, 0));
    expect(found.census).toMatchObject([
      { type: 'INSERT', count: 1 },
      { type: 'LINE', count: 1 },
    ]);
  });

  test('then a height is told', () => {
    expect(codesOf(read(insert('P', 0, 0, [30, 5])))).toEqual(['flattened']);
  });
});

describe('When entities of a block lie on layer 0', () => {
  const tables = layerTable(layer('HIDDEN', 0, -3), layer('ICE', 1, 3), layer('SEEN', 0, 3));
  const read0 = (onLayer: string, options = {}) => {
    const blocks =
      block('P', line(0, 0, 1, 0, [8, '0']) + line(0, 1, 1, 1, [8, 'OWN'])) + block('Q', insert('P', 0, 0));
    const entities = insert('Q', 0, 0).replace('8\n0\n', `8\n${onLayer}\n`);
    return readText(dxfText({ tables, blocks, entities }), options);
  };

  test('then they take over the layer of the INSERT, through several blocks', () => {
    expect(read0('SEEN').placed).toMatchObject([
      { type: 'LINE', layer: 'SEEN', count: 1 },
      { type: 'LINE', layer: 'OWN', count: 1 },
      { type: 'INSERT', layer: 'SEEN', count: 1 },
    ]);
  });

  test('then a layer that is off hides them and leaves the others', () => {
    const found = read0('HIDDEN');
    expectRows(found, [[0, 1, 1, 1, 0]]);
    expect(found.placed).toContainEqual(
      expect.objectContaining({ layer: 'HIDDEN', fate: 'aside', reason: 'layer-off' }),
    );
    expect(read0('HIDDEN', { include: { offLayers: true } }).curves.count).toBe(2);
  });

  test('then a frozen layer hides the whole block', () => {
    const found = read0('ICE');
    expect(found.curves.count).toBe(0);
    expect(found.census).toMatchObject([{ type: 'INSERT', fate: 'aside', reason: 'layer-frozen', count: 1 }]);
    expect(read0('ICE', { include: { frozenLayers: true } }).curves.count).toBe(2);
  });
});

describe('When a block cannot be put there', () => {
  test('then one that holds itself is refused, and the way round is named', () => {
    const found = read(
      insert('A', 0, 0) + line(0, 0, 1, 0),
      block('A', insert('B', 0, 0)) + block('B', insert('C', 0, 0)) + block('C', insert('A', 0, 0)),
    );
    expect(found.census).toMatchObject([
      { type: 'INSERT', fate: 'refused', reason: 'block-cycle', count: 1 },
      { type: 'LINE', fate: 'kept' },
    ]);
    expect(found.problems[0]).toMatchObject({ code: 'block-cycle', message: expect.stringContaining('A → B → C → A') });
  });

  test('then one that leads to a cycle further in is refused as well', () => {
    const found = read(
      insert('OUT', 0, 0),
      block('OUT', insert('A', 0, 0)) + block('A', insert('A', 0, 0) + line(0, 0, 1, 0)),
    );
    expect(codesOf(found)).toEqual(['block-cycle']);
    expect(found.curves.count).toBe(0);
  });

  test('then one that would unfold into too much is refused at once, and the rest is read', () => {
    // Ten to the ninth lines.
    const tens = (name: string, of: string) => block(name, Array.from({ length: 10 }, () => insert(of, 0, 0)).join(''));
    let blocks = block('B0', line(0, 0, 1, 0));
    for (let i = 1; i <= 9; i++) blocks += tens(`B${i}`, `B${i - 1}`);
    const from = performance.now();
    const found = read(insert('B9', 0, 0) + line(0, 0, 1, 0), blocks);
    expect(performance.now() - from).toBeLessThan(2000);
    expect(codesOf(found)).toEqual(['block-bomb']);
    expect(found.curves.count).toBe(1);
  });

  test.each([
    ['of lines', line(0, 0, 1, 0)],
    ['of nothing', ''],
    ['of text', entity('TEXT', [1, 'A'])],
  ])('then rows and columns without end %s are no endless work', (_, contents) => {
    const from = performance.now();
    const found = read(insert('P', 0, 0, [70, 2_000_000_000], [71, 2_000_000_000]), block('P', contents));
    expect(performance.now() - from).toBeLessThan(2000);
    expect(found.curves.count).toBe(0);
    expect(found.census[0]!.reason).toBe(contents === '' ? 'empty-block' : 'block-bomb');
  });

  test('then nesting beyond the limit is refused', () => {
    let blocks = block('B0', line(0, 0, 1, 0));
    for (let i = 1; i < 40; i++) blocks += block(`B${i}`, insert(`B${i - 1}`, 1, 0));
    expect(codesOf(read(insert('B39', 0, 0), blocks))).toEqual(['block-too-deep']);
    expectRows(read(insert('B31', 0, 0), blocks), [[31, 0, 32, 0, 0]]);
  });

  test('then a hundred thousand blocks within each other are weighed without a stack', () => {
    let blocks = block('B0', insert('B99999', 0, 0));
    for (let i = 1; i < 100_000; i++) blocks += block(`B${i}`, insert(`B${i - 1}`, 1, 0));
    expect(codesOf(read(insert('B5', 0, 0), blocks))).toEqual(['block-cycle']);
  });

  test('then a missing block, one of another file and one without a base point are named', () => {
    const blocks = block('X', line(0, 0, 1, 0), 0, 0, 4) + block('N', line(0, 0, 1, 0)).replace('10\n0\n', '10\nnan\n');
    const found = read(insert('GONE', 0, 0) + insert('X', 0, 0) + insert('N', 0, 0), blocks);
    expect(found.problems).toMatchObject([
      { code: 'block-missing', message: expect.stringContaining('GONE') },
      { code: 'block-external', message: expect.stringContaining('X') },
      { code: 'not-a-number', message: expect.stringContaining('N') },
    ]);
    expect(countOf(found.census)).toBe(3);
    expect(found.curves.count).toBe(0);
  });

  test('then a scale of 0 and a leaning plane are refused', () => {
    expect(codesOf(read(insert('P', 0, 0, [41, 0])))).toEqual(['bad-size']);
    expect(codesOf(read(insert('P', 0, 0, [210, 1], [220, 0], [230, 0])))).toEqual(['tilted']);
  });

  test('then of two blocks with one name the first counts, and it is told', () => {
    const found = read(insert('P', 0, 0), block('P', line(0, 0, 1, 0)) + block('P', line(0, 0, 2, 0)));
    expectRows(found, [[0, 0, 1, 0, 0]]);
    expect(codesOf(found)).toEqual(['block-twice']);
  });

  test('then what is refused within a block is counted there, and the rest of it is kept', () => {
    const found = read(insert('P', 0, 0), block('P', line(0, 0, 1, 0) + circle(0, 0, -1)));
    expect(found.census).toMatchObject([{ type: 'INSERT', fate: 'kept' }]);
    expect(found.placed).toMatchObject([
      { type: 'LINE', fate: 'kept' },
      { type: 'CIRCLE', fate: 'refused', reason: 'bad-size' },
    ]);
    expect(rowsByEntity(found).length).toBe(1);
  });
});
