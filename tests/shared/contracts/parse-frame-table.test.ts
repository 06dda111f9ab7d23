import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import { describe, expect, test } from 'vitest';
import { FRAME_TABLE_LIMITS, frameTableRequest } from '#shared/contracts/frame-table.ts';
import { parseFrameTable } from '#shared/contracts/parse-frame-table.ts';
import { columnOfField } from '#shared/kernel/frame-table/column-of-field.ts';
import { frameTableTemplate, sampleFrameTable } from '#shared/kernel/frame-table/sample-frame-table.ts';
import { TABLE_COLUMNS, TABLE_HEADINGS } from '#shared/kernel/frame-table/table-columns.ts';
import { workFrame } from '#shared/kernel/work-frame.ts';

const sample = (name: string) => readFileSync(join(import.meta.dirname, '../../../samples', name), 'utf8');
const stopsOf = (text: string) =>
  parseFrameTable(text).rows.map(
    ({ particulars }) => particulars && workFrame(particulars).findings.filter(({ level }) => level === 'stop').length,
  );

describe('When the samples are read', () => {
  test('then the sample kitchen is the one that the page offers, and every frame of it can be cut', () => {
    expect(sample('kitchen.csv')).toBe(sampleFrameTable('in'));
    expect(stopsOf(sample('kitchen.csv'))).toEqual([0, 0, 0, 0, 0, 0, 0, 0]);
    expect(stopsOf(sampleFrameTable('mm'))).toEqual([0, 0, 0, 0, 0, 0, 0, 0]);
  });

  test('then a template has every heading and one frame that can be cut without a caution', () => {
    for (const unit of ['in', 'mm'] as const) {
      const text = frameTableTemplate(unit);
      expect(text.split('\r\n')[0]).toBe(TABLE_HEADINGS.join(','));
      const { rows, problems } = parseFrameTable(text);
      expect(problems).toEqual([]);
      const levels = rows.map(({ particulars }) => workFrame(particulars!).findings.map(({ level }) => level));
      expect(levels).toEqual([expect.not.arrayContaining(['stop', 'caution'])]);
    }
  });

  test('then their README tells every column as the page does', () => {
    const readme = sample('README.md').replaceAll('\\', '').replace(/ +/g, ' ');
    const missing = TABLE_COLUMNS.filter((column) => {
      const heading = 'needed' in column ? `**${column.heading}**` : column.heading;
      return !readme.includes(`| ${heading} | ${column.says} |`);
    });
    expect(missing).toEqual([]);
  });

  test('then the kitchen with mistakes has each wrong cell by line and column, and its good rows', () => {
    const { rows, problems } = parseFrameTable(sample('kitchen-with-mistakes.csv'));
    expect(problems).toEqual([]);
    expect(rows.flatMap((row) => row.problems.map(({ line, column }) => `${line} ${column}`))).toEqual([
      '3 height',
      '4 unit',
      '5 mid-stile',
      '9 edge',
      '9 columns',
    ]);
    expect(rows.map(({ particulars }) => particulars !== undefined)).toEqual([
      true,
      false,
      false,
      false,
      true,
      true,
      true,
      false,
    ]);
    // Sizes that do not add up, and an arch too high: stops of frames that can be read.
    const stops = rows.map(({ particulars }) =>
      particulars
        ? workFrame(particulars)
            .findings.filter(({ level }) => level === 'stop')
            .map(({ field = '' }) => columnOfField(field))
        : [],
    );
    expect(stops).toEqual([[], [], [], [], [], ['columns'], ['arch', 'arch'], []]);
  });
});

describe('When a frame is more than the server takes', () => {
  const row = (change: Readonly<Record<string, string>>) => {
    const cells = {
      name: 'B33',
      unit: 'in',
      width: '33',
      height: '30.5',
      'left stile': '1.75',
      'right stile': '1.75',
      'top rail': '1.75',
      'bottom rail': '1.25',
      'mid-stile': '1.5',
      'mid-rail': '1.5',
      columns: '2',
      rows: '1',
      edge: 'square',
      'box thickness': '0.75',
      ...change,
    };
    return parseFrameTable(`${Object.keys(cells).join(',')}\r\n${Object.values(cells).join(',')}`).rows[0]!;
  };

  test.each([
    ['name', { name: 'x'.repeat(121) }, 'at most 120 characters'],
    ['width', { width: '10001' }, 'a length up to 10000'],
    ['left stile', { 'left stile': '10001' }, 'a length up to 10000'],
    ['bottom rail', { 'bottom rail': '10001' }, 'a length up to 10000'],
    ['columns', { columns: '11', rows: '10' }, 'at most 100 openings'],
    ['box thickness', { width: '2' }, 'a place beyond'],
  ])('then %s is named', (column, change, takes) => {
    const { problems, particulars } = row(change);
    expect(particulars).toBeUndefined();
    expect(problems).toMatchObject([{ line: 2, column }]);
    expect(problems[0]!.takes).toContain(takes);
  });

  test('then the rows beyond the limit are told, and what is read fits one request', () => {
    const [head, first] = frameTableTemplate('in').split('\r\n');
    const most = FRAME_TABLE_LIMITS.frames;
    const { rows, problems } = parseFrameTable([head, ...Array<string>(most + 1).fill(first!)].join('\r\n'));
    expect(problems).toMatchObject([{ line: most + 2, got: `${most + 1} rows` }]);
    const frames = rows.map(({ particulars }) => particulars!);
    expect(frameTableRequest.safeParse({ frames }).success).toBe(true);
    expect(frameTableRequest.safeParse({ frames: [...frames, frames[0]!] }).success).toBe(false);
    expect(frameTableRequest.safeParse({ frames: [] }).success).toBe(false);
  });
});
