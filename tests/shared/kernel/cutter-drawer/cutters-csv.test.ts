import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { drawerEntry } from '#shared/contracts/cutters.ts';
import { parseCuttersCsv } from '#shared/contracts/parse-cutters-csv.ts';
import type { DrawerEntry } from '#shared/kernel/cutter-drawer/drawer-cutter.ts';
import { plainNumber, readPlainNumber } from '#shared/kernel/csv/plain-number.ts';
import { startingCutters } from '#shared/kernel/cutter-drawer/starting-cutters.ts';
import { guardFormula, unguardFormula } from '#shared/kernel/csv/write-csv-line.ts';
import { writeCuttersCsv } from '#shared/kernel/cutter-drawer/write-cutters-csv.ts';
import { arbitraryEntry } from './arbitrary-cutter.ts';

const HEADER =
  'name,unit,kind,number,diameter,included angle,tip radius,side angle,profile radius,tip flat,flute length,max pass,remarks';
const GOOD = 'Straight 3/8,in,straight,2,0.375,,,,,,1.25,0.5,Sharp';
const straight: DrawerEntry = {
  unit: 'in',
  cutter: { kind: 'straight', name: 'Straight 3/8', number: 2, diameter: 0.375, fluteLength: 1.25, maxPass: 0.5 },
  remarks: 'Sharp',
};
const read = (...rows: string[]) => parseCuttersCsv([HEADER, ...rows].join('\r\n'));
const told = (...rows: string[]) =>
  read(...rows).problems.map(({ line, column, got, takes }) => ({ line, column, got, takes }));

describe('When a drawer is written as CSV', () => {
  test('then there is a header row, a row a cutter, CRLF at each end, and decimal points', () => {
    expect(writeCuttersCsv([straight])).toBe(`${HEADER}\r\n${GOOD}\r\n`);
  });

  test('then what a spreadsheet would run as a formula is text', () => {
    const csv = writeCuttersCsv([{ ...straight, cutter: { ...straight.cutter, name: '=1+1' }, remarks: '@me, "now"' }]);
    expect(csv.split('\r\n')[1]).toBe(`'=1+1,in,straight,2,0.375,,,,,,1.25,0.5,"'@me, ""now"""`);
  });

  test('then very small numbers have no exponent', () => {
    expect([1e-7, 1.5e-9, 0.375, 0, 1e21].map(plainNumber)).toEqual([
      '0.0000001',
      '0.0000000015',
      '0.375',
      '0',
      `1${'0'.repeat(21)}`,
    ]);
    expect(() => plainNumber(-1)).toThrow('number: got -1');
  });
});

describe('When a drawer goes to CSV and back', () => {
  test('then every entry comes back as it was', () => {
    fc.assert(
      fc.property(
        fc.uniqueArray(arbitraryEntry, { maxLength: 6, selector: ({ cutter }) => cutter.name.toLowerCase() }),
        (entries) => {
          for (const entry of entries) expect(drawerEntry.parse(entry)).toEqual(entry);
          const back = parseCuttersCsv(writeCuttersCsv(entries));
          expect(back.problems).toEqual([]);
          expect(back.cutters.map(({ entry }) => entry)).toEqual(entries);
        },
      ),
      { numRuns: 200 },
    );
  });

  test.each(['in', 'mm'] as const)('then the starting set in %s comes back whole', (unit) => {
    const back = parseCuttersCsv(writeCuttersCsv(startingCutters(unit)));
    expect(back).toEqual({ cutters: startingCutters(unit).map((entry, i) => ({ line: i + 2, entry })), problems: [] });
  });

  test('then a guard against formulas is undone to the letter, whatever the text', () => {
    fc.assert(
      fc.property(
        fc.array(fc.constantFrom("'", '=', '+', '-', '@', '\t', 'a', '＝')).map((c) => c.join('')),
        (text) => {
          expect(unguardFormula(guardFormula(text))).toBe(text);
          expect(guardFormula(text)).not.toMatch(/^[=+\-@\t\r\n]/);
        },
      ),
    );
  });

  test('then every number is read as the very number it was', () => {
    fc.assert(
      fc.property(fc.double({ min: 0, max: 1e300, noNaN: true }), (value) => {
        expect(readPlainNumber(plainNumber(value))).toBe(value);
      }),
    );
  });
});

describe('When a file is read', () => {
  test('then columns in another order, other capitals, any line end and a byte order mark are taken', () => {
    const csv = '\uFEFFKind,NAME,Flute Length,Unit,Diameter\nStraight,A,1,IN,0.5\n\rstraight,B,2,mm,6\r,,,,\n';
    expect(parseCuttersCsv(csv)).toEqual({
      cutters: [
        {
          line: 2,
          entry: { unit: 'in', cutter: { kind: 'straight', name: 'A', diameter: 0.5, fluteLength: 1 }, remarks: '' },
        },
        {
          line: 4,
          entry: { unit: 'mm', cutter: { kind: 'straight', name: 'B', diameter: 6, fluteLength: 2 }, remarks: '' },
        },
      ],
      problems: [],
    });
  });

  test('then good rows and bad ones both come back, the bad ones by line and column', () => {
    const { cutters, problems } = read(GOOD, 'V,in,vee,,0.5,30,,,,,0.5,,', 'Long,in,straight,,"0,5",,,,,,1,,');
    expect(cutters).toEqual([{ line: 2, entry: straight }]);
    expect(problems.map((p) => p.message)).toEqual([
      'line 3, diameter: got "0.5", takes nothing: only a straight cutter has it',
      'line 4, diameter: got "0,5", takes a number with a decimal point, such as 9.525',
    ]);
  });

  const NUMBER = 'a number with a decimal point, such as 9.525';
  test.each([
    ['a fraction', 'A,in,straight,,3/8,,,,,,1,,', 'diameter', '"3/8"', NUMBER],
    ['an exponent', 'A,in,straight,,1e-1,,,,,,1,,', 'diameter', '"1e-1"', NUMBER],
    ['a sign', 'A,in,straight,,-1,,,,,,1,,', 'diameter', '"-1"', NUMBER],
    ['a unit', 'A,in,straight,,1in,,,,,,1,,', 'diameter', '"1in"', NUMBER],
    ['no number at all', 'A,in,straight,,nan,,,,,,1,,', 'diameter', '"nan"', NUMBER],
    ['nothing where a number must be', 'A,in,straight,,,,,,,,1,,', 'diameter', 'nothing', 'a length above 0'],
    ['none', 'A,in,straight,,0,,,,,,1,,', 'diameter', '0', 'a length above 0'],
    ['half a place in the machine', 'A,in,straight,1.5,1,,,,,,1,,', 'number', '1.5', 'a whole number from 0 to 9999'],
    [
      'an angle out of range',
      'A,in,vee,,,180,,,,,1,,',
      'included angle',
      '180',
      'an included angle in degrees, 5 to 170',
    ],
    ['an unknown kind', 'A,in,ball,,,,,,,,1,,', 'kind', '"ball"', '"straight" or "vee" or "tapered" or "beading"'],
    ['an unknown unit', 'A,cm,straight,,1,,,,,,1,,', 'unit', '"cm"', '"in" or "mm"'],
    ['no name', ',in,straight,,1,,,,,,1,,', 'name', 'nothing', 'some text'],
    ['a pass longer than the flute', 'A,in,straight,,1,,,,,,1,2,', 'max pass', '2', 'at most the flute length, 1'],
    [
      'a flute shorter than the bead',
      'A,in,beading,,,,,,0.5,0.1,0.25,,',
      'flute length',
      '0.25',
      'at least the profile radius, 0.5',
    ],
    ['a cell too many', `${GOOD},more`, 'number 14', '"more"', 'no cell beyond the last column'],
    [
      'a quote in a bare cell',
      'A "b",in,straight,,1,,,,,,1,,',
      'name',
      '"A \\"b\\""',
      'the whole cell in double quotes when it holds one',
    ],
    [
      'text after a closing quote',
      '"A"b,in,straight,,1,,,,,,1,,',
      'name',
      '"b" after a closing quote',
      'a comma or the end of the line there; a quote inside a cell is written twice',
    ],
  ])('then %s is named with line and column', (_what, row, column, got, takes) => {
    expect(told(GOOD, row)).toEqual([{ line: 3, column, got, takes }]);
    expect(read(GOOD, row).cutters).toHaveLength(1);
  });

  test('then several wrong cells of a row are all told', () => {
    expect(told('A,cm,straight,x,1,,,,,,1,,').map((p) => p.column)).toEqual(['number', 'unit']);
  });

  test('then a line end inside quotes counts as a line of the file', () => {
    const { cutters, problems } = read(GOOD.replace('Sharp', '"Two\r\nlines"'), 'B,in,straight,,x,,,,,,1,,');
    expect(cutters[0]!.entry.remarks).toBe('Two\r\nlines');
    expect(problems.map((p) => [p.line, p.column])).toEqual([[4, 'diameter']]);
  });

  test('then a name that stands twice is the second row’s problem', () => {
    expect(told(GOOD, GOOD.replace('Straight', 'STRAIGHT'))).toEqual([
      { line: 3, column: 'name', got: '"STRAIGHT 3/8"', takes: 'another name than line 2' },
    ]);
  });

  test('then an open quote at the end of the file is told where it began', () => {
    expect(told(GOOD, '"A,in\r\nstraight')).toMatchObject([
      { line: 3, column: 'name', takes: 'a closing double quote' },
    ]);
  });

  test.each([
    ['an empty file', '', 'the header row', 'nothing'],
    ['semicolons', 'name;unit;kind\r\n', 'the header row', '"name;unit;kind"'],
    ['a strange column', `${HEADER},colour\r\n`, 'colour', 'a column that is not known'],
    ['a column twice', `${HEADER},name\r\n`, 'name', 'this column twice'],
    ['a column missing', 'name,unit,kind\r\n', 'flute length', 'no such column'],
  ])('then %s has no rows, and the header is told', (_what, csv, column, got) => {
    const { cutters, problems } = parseCuttersCsv(csv);
    expect(cutters).toEqual([]);
    expect(problems).toMatchObject([{ line: 1, column, got }]);
  });

  test('then more rows than a drawer holds are told', () => {
    const rows = Array.from({ length: 502 }, (_, i) => GOOD.replace('Straight', `Straight ${i}`));
    const { cutters, problems } = read(...rows);
    expect(cutters).toHaveLength(500);
    expect(problems).toMatchObject([{ line: 502, got: '502 rows', takes: 'at most 500' }]);
  });

  test('then whatever text it holds, reading never throws', () => {
    const piece = fc.oneof(fc.constantFrom(HEADER, GOOD, '"', ',', '\r\n', '\n', '\r', "'", ';', '\0'), fc.string());
    fc.assert(
      fc.property(
        fc.array(piece).map((p) => p.join('')),
        (text) => void parseCuttersCsv(text),
      ),
      { numRuns: 300 },
    );
  });
});
