import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { frameFromBox } from '#shared/kernel/box/frame-from-box.ts';
import { newBox } from '#shared/kernel/box/new-box.ts';
import { frameOfTable } from '#shared/kernel/frame-table/frame-of-table.ts';
import { readFrameTable } from '#shared/kernel/frame-table/read-frame-table.ts';
import type { MembersOutline, Particulars } from '#shared/kernel/particulars/particulars.ts';
import { workedExample } from '../../../builders/worked-example.ts';

const HEADINGS =
  'name,unit,width,height,left stile,right stile,top rail,bottom rail,mid-stile,mid-rail,columns,rows,edge,box thickness,feet,arch';
const GOOD: Readonly<Record<string, string>> = {
  name: 'B33',
  unit: 'in',
  width: '33',
  height: '30.5',
  'left stile': '1.75',
  'right stile': '1.75',
  'top rail': '1.75',
  'bottom rail': '1.25',
  'mid-stile': '1.5',
  'mid-rail': '',
  columns: '2',
  rows: '1',
  edge: 'square',
  'box thickness': '0.75',
  feet: '',
  arch: '',
};
const line = (change: Readonly<Record<string, string>>): string =>
  Object.values({ ...GOOD, ...change })
    .map((cell) => (/[",]/.test(cell) ? `"${cell.replaceAll('"', '""')}"` : cell))
    .join(',');
const table = (...changes: Readonly<Record<string, string>>[]): string => [HEADINGS, ...changes.map(line)].join('\r\n');
const read = (text: string) => readFrameTable(text, 200);
const problemsOf = (text: string) => {
  const { rows, problems } = read(text);
  return [...problems, ...rows.flatMap((row) => row.problems)];
};
const frameOf = (change: Readonly<Record<string, string>> = {}): Particulars => {
  const [row] = read(table(change)).rows;
  if (!row?.frame) throw new Error(JSON.stringify(row?.problems));
  return frameOfTable(row.frame);
};
const layoutOf = (change: Readonly<Record<string, string>>) => (frameOf(change).outline as MembersOutline).layout;

describe('When a row of the table is read', () => {
  test('then the worked example’s row gives its outline, and its dados but for the partition', () => {
    const example = workedExample();
    const frame = frameOf();
    expect(frame.outline).toEqual(example.outline);
    // Left end 0.25, right end 32, bottom 0.5 from 1 to 32: the worked example of the specification.
    expect(frame.dados).toEqual(example.dados.filter(({ part }) => part !== 'Partition'));
  });

  test('then a box thickness of 0 gives no dados, and feet lift the bottom above them', () => {
    expect(frameOf({ 'box thickness': '0' }).dados).toEqual([]);
    const raised = frameOf({ feet: '4' });
    expect(raised.outline).toMatchObject({ feet: 4 });
    expect(raised.dados.find(({ part }) => part === 'Bottom')).toMatchObject({ at: 4.5 });
  });

  test.each(['in', 'mm'] as const)('then its dados are those that the box helper gives the same box, in %s', (unit) => {
    const box = { ...newBox(unit, 'B33'), partitions: undefined };
    for (const feet of [0, box.bottom.thickness * 4]) {
      const made = frameFromBox({ ...box, feet, bottom: { ...box.bottom, up: feet } });
      if (!made.ok) throw new Error(JSON.stringify(made.problems));
      const { width, height } = made.particulars.outline as MembersOutline;
      const say = (inch: number) => `${inch}in`;
      const frame = frameOf({
        unit,
        width: String(width),
        height: String(height),
        feet: String(feet),
        'box thickness': String(box.ends.thickness),
        // The members do not matter to the dados.
        ...{
          'left stile': say(2),
          'right stile': say(2),
          'top rail': say(2),
          'bottom rail': say(2),
          'mid-stile': say(2),
        },
      });
      expect(frame.dados).toEqual(made.particulars.dados);
    }
  });

  test.each([
    ['30 1/2', 30.5],
    ['30-1/2', 30.5],
    ['30 1/2"', 30.5],
    ['774.7mm', 30.5],
    [' 30.5 in ', 30.5],
  ])('then a height of %s is read as people write it', (height, value) => {
    expect(frameOf({ height }).outline).toMatchObject({ height: value });
  });

  test('then lengths are in the row’s own unit', () => {
    const { rows } = read(table({}, { unit: 'mm', width: '840', height: '30 1/2"' }));
    expect(rows.map(({ frame }) => frame!.unit)).toEqual(['in', 'mm']);
    expect(rows[1]!.frame).toMatchObject({ width: 840, height: 774.7 });
  });

  test('then columns and rows are numbers of openings, or their sizes with * for what is left', () => {
    expect(layoutOf({ columns: '1', rows: '1' })).toEqual({ opening: { label: 'A' } });
    expect(layoutOf({ columns: '6 1/2 + * + 165.1mm', 'mid-stile': '1.5' })).toEqual({
      columns: [
        { opening: { label: 'A' }, size: 6.5 },
        { opening: { label: 'B' } },
        { opening: { label: 'C' }, size: 6.5 },
      ],
      between: 1.5,
    });
    expect(layoutOf({ columns: '2', rows: '5+*', 'mid-rail': '2', arch: '1' })).toEqual({
      rows: [
        {
          columns: [{ opening: { label: 'A', arch: 1 } }, { opening: { label: 'B', arch: 1 } }],
          between: 1.5,
          size: 5,
        },
        { columns: [{ opening: { label: 'C' } }, { opening: { label: 'D' } }], between: 1.5 },
      ],
      between: 2,
    });
  });

  test('then a beaded edge without numbers has the usual bead, and with numbers cutters that fit it', () => {
    // R 3/32, drop 0.010, quirk 1/8: the worked example of the specification.
    expect(frameOf({ edge: 'Beaded' }).edge).toEqual({
      style: 'beaded',
      sizeHeldAt: 'bead base',
      bead: { radius: 0.09375, drop: 0.01, quirk: 0.125 },
    });
    const text = `${HEADINGS},bead radius,quirk\r\n${line({ edge: 'beaded' })},1/8,0.1`;
    const frame = frameOfTable(read(text).rows[0]!.frame!);
    expect(frame.edge).toMatchObject({ bead: { radius: 0.125, drop: 0.01, quirk: 0.1 } });
    expect(frame.cutters.bead).toMatchObject({ kind: 'beading', profileRadius: 0.125 });
    expect(frame.cutters.quirk).toMatchObject({ kind: 'straight', diameter: 0.1 });
  });
});

describe('When a table is written in another way', () => {
  const order = (text: string, separator = ',') =>
    text
      .split('\r\n')
      .map((row) => row.split(',').reverse().join(separator))
      .join('\n');

  test('then columns in another order, other capitals, any separator and a byte order mark are taken', () => {
    const wanted = read(table({})).rows[0]!.frame;
    for (const separator of [',', ';', '\t']) {
      const text = `\uFEFF${order(table({}), separator).replace('left stile', ' Left STILE ')}`;
      expect(read(text).rows.map(({ frame }) => frame)).toEqual([wanted]);
    }
  });

  test('then empty columns behind the last one, and lines without text, are passed over', () => {
    const text = table({}, {}).replaceAll('\r\n', ',,,\r\n') + ',,,\r\n,,,\r\n\r\n';
    expect(problemsOf(text)).toEqual([]);
    expect(read(text).rows.map((row) => row.line)).toEqual([2, 3]);
  });

  test('then quoted cells may hold separators and line ends, and lines are counted through them', () => {
    const text = table({ name: 'B33,\r\nleft' }, { width: 'wide' });
    expect(read(text).rows[0]!.name).toBe('B33,\r\nleft');
    expect(problemsOf(text)).toMatchObject([{ line: 4, column: 'width' }]);
  });
});

describe('When cells are wrong', () => {
  test.each([
    ['name', '', 'nothing', 'some text'],
    ['unit', 'cm', '"cm"', 'in or mm'],
    ['width', '', 'nothing', 'a length such as 30 1/2, 30.5 or 775mm'],
    ['width', '33,5', '"33,5"', 'a length such as 30 1/2, 30.5 or 775mm, with a decimal point where it has one'],
    ['width', '0', '"0"', 'a length above 0'],
    ['width', '-33', '"-33"', 'a length above 0'],
    ['height', 'nan', '"nan"', 'a length such as 30 1/2, 30.5 or 775mm'],
    ['height', '1e400', '"1e400"', 'a length such as 30 1/2, 30.5 or 775mm'],
    ['mid-stile', '', 'nothing', 'its width, since there are 2 columns'],
    ['mid-stile', '0', '"0"', 'a length above 0'],
    ['mid-rail', 'wide', '"wide"', 'a length such as 30 1/2, 30.5 or 775mm'],
    ['columns', '0', '"0"', 'a whole number from 1 to 100'],
    ['columns', '101', '"101"', 'a whole number from 1 to 100'],
    ['rows', '', 'nothing', 'a whole number such as 3, or sizes with +'],
    ['rows', '1.5', '"1.5"', 'a whole number such as 3, or sizes with +'],
    ['rows', '5 + + 5', '"5 + + 5"', 'a whole number such as 3, or sizes with +'],
    ['rows', '5 + 0', '"5 + 0"', 'a whole number such as 3, or sizes with +'],
    ['edge', 'round', '"round"', 'square or beaded'],
    ['box thickness', '', 'nothing', 'a length such as'],
    ['box thickness', '-1', '"-1"', 'a length 0 or more'],
    ['feet', '-1', '"-1"', 'a length 0 or more'],
  ])('then %s with “%s” is named with its line, what it got and what it takes', (column, text, got, takes) => {
    const found = problemsOf(table({}, { [column]: text }));
    expect(found).toMatchObject([{ line: 3, column, got }]);
    expect(found[0]!.takes).toContain(takes);
  });

  test('then every wrong cell of a row is told, and the other rows are read', () => {
    const { rows } = read(table({ width: 'x', edge: 'y', rows: 'z' }, {}));
    expect(rows[0]!.problems.map(({ column }) => column).sort()).toEqual(['edge', 'rows', 'width']);
    expect(rows[0]!.frame).toBeUndefined();
    expect(rows[1]!.frame).toBeDefined();
  });

  test('then a decimal comma between commas is told as a cell too many, wherever it stands', () => {
    for (const [heading, cell] of Object.entries({ height: '30,5', 'box thickness': '0,75' })) {
      const text = `${HEADINGS}\r\n${line({ [heading]: cell }).replaceAll('"', '')}`;
      expect(problemsOf(text)).toEqual([
        {
          line: 2,
          column: 'whole row',
          got: '17 cells',
          takes: '16, as the header row has; a length has a decimal point, not a comma',
        },
      ]);
    }
  });

  test('then text behind the last heading is told', () => {
    expect(problemsOf(`${HEADINGS},\r\n${line({})},x`)).toMatchObject([{ line: 2, column: 'number 17', got: '"x"' }]);
  });

  test('then an open quote is told where it begins', () => {
    expect(problemsOf(`${table({})}\r\n"B18,in,18`)).toMatchObject([{ line: 3, column: 'name' }]);
  });
});

describe('When the header row is wrong', () => {
  test.each([
    [HEADINGS.replace('mid-stile', 'middle'), 'middle', 'a column that is not known'],
    [HEADINGS.replace('mid-stile', 'width'), 'width', 'this column twice'],
    [HEADINGS.replace(',edge', ''), 'edge', 'no such column'],
    ['a letter to somebody', 'the header row', '"a letter to somebody"'],
    ['', 'the header row', 'nothing'],
  ])('then “%s” is told, and no row is read', (header, column, got) => {
    const { rows, problems } = read(`${header}\r\n`);
    expect(rows).toEqual([]);
    expect(problems).toMatchObject([{ line: 1, column, got }]);
  });
});

describe('When a table is longer than is taken', () => {
  test('then the first rows are read and the line is told from which on none is', () => {
    const { rows, problems } = readFrameTable(table({}, {}, {}), 2);
    expect(rows).toHaveLength(2);
    expect(problems).toMatchObject([{ line: 4, got: '3 rows' }]);
  });
});

test('When a file holds whatever text, then reading never throws', () => {
  fc.assert(
    fc.property(
      fc.oneof(
        fc.string(),
        fc.string().map((text) => `${HEADINGS}\r\n${text}`),
      ),
      (text) => {
        const { rows, problems } = read(text);
        for (const { line: at } of problems) expect(at).toBeGreaterThan(0);
        for (const row of rows) expect(row.frame === undefined).toBe(row.problems.length > 0);
      },
    ),
  );
});
