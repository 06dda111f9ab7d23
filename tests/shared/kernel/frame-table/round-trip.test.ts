import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { readCsv } from '#shared/kernel/csv/read-csv.ts';
import { frameOfTable } from '#shared/kernel/frame-table/frame-of-table.ts';
import { readFrameTable } from '#shared/kernel/frame-table/read-frame-table.ts';
import { TABLE_HEADINGS, type TableHeading } from '#shared/kernel/frame-table/table-columns.ts';
import { writeFrameTable } from '#shared/kernel/frame-table/write-frame-table.ts';
import { listChanges } from '#shared/kernel/particulars/list-changes.ts';
import type { MembersOutline, Particulars } from '#shared/kernel/particulars/particulars.ts';
import { allowSlowMachine } from '../../../setup/slow-machine.ts';
import { arbitraryFrame } from '../../../builders/arbitrary-frame.ts';
import { beadedExample } from '../../../builders/beaded-example.ts';
import { workedExample } from '../../../builders/worked-example.ts';
import { arbitraryTableFrame } from './arbitrary-table-frame.ts';

allowSlowMachine();

const read = (text: string) => readFrameTable(text, 100);
const cellsOf = (frame: Particulars): Record<TableHeading, string> => {
  const { rows } = readCsv(writeFrameTable([frame]));
  return Object.fromEntries(TABLE_HEADINGS.map((heading, i) => [heading, rows[1]!.cells[i]!])) as never;
};
const outline = workedExample().outline as MembersOutline;
/** The worked example as the table says it: without its partition. */
const plain = (change: object = {}): Particulars => {
  const { dados } = workedExample();
  return workedExample({ dados: dados.filter(({ part }) => part !== 'Partition'), ...change });
};

describe('When frames of the table’s kind go to CSV and back', () => {
  test('then their particulars are the same, number by number, and nothing is remarked', () => {
    fc.assert(
      fc.property(fc.array(arbitraryTableFrame, { minLength: 1, maxLength: 5 }), (rows) => {
        const frames = rows.map(frameOfTable);
        const back = read(writeFrameTable(frames));
        expect(back.problems).toEqual([]);
        expect(back.rows.flatMap(({ problems }) => problems)).toEqual([]);
        expect(back.rows.map(({ frame }) => frameOfTable(frame!))).toEqual(frames);
        expect(back.rows.map(({ remark }) => remark)).toEqual(rows.map(() => ''));
      }),
      { numRuns: 300 },
    );
  });

  test('then it is the same with semicolons or tabs between the cells, as a spreadsheet writes them', () => {
    fc.assert(
      fc.property(arbitraryTableFrame, fc.constantFrom(';', '\t'), (row, separator) => {
        const frame = frameOfTable({ ...row, name: 'B33' });
        const text = writeFrameTable([frame]).replaceAll(',', separator);
        expect(read(text).rows.map((r) => r.frame && frameOfTable(r.frame))).toEqual([frame]);
      }),
    );
  });
});

describe('When any frame is written as a row', () => {
  test('then reading the row gives no other frame: what differs is remarked, or a needed cell is empty', () => {
    fc.assert(
      fc.property(arbitraryFrame, (frame) => {
        const [row] = read(writeFrameTable([frame])).rows;
        expect(row!.name).toBe(frame.name);
        if (!row!.frame) {
          expect(row!.problems.every(({ got }) => got === 'nothing')).toBe(true);
          expect(row!.remark).toMatch(/^not in table: /);
          return;
        }
        const parts = listChanges(frame, frameOfTable(row!.frame)).map(({ path }) =>
          path.endsWith('.label') ? 'label' : path.split('.')[0],
        );
        for (const part of parts) expect(['label', 'setup', 'cutters', 'blank']).toContain(part);
        expect(row!.remark === '').toBe(parts.length === 0);
      }),
      { numRuns: 300 },
    );
  });

  test('then the worked example without its partition has every number and no remark', () => {
    expect(cellsOf(plain())).toMatchObject({
      name: 'Two-door base',
      unit: 'in',
      width: '33',
      height: '30.5',
      'left stile': '1.75',
      'bottom rail': '1.25',
      'mid-stile': '1.5',
      columns: '2',
      rows: '1',
      edge: 'square',
      'box thickness': '0.75',
    });
  });

  test.each([
    ['dados that do not follow from a box', workedExample(), ['box thickness'], 'dados'],
    [
      'openings in uneven rows',
      plain({
        outline: {
          ...outline,
          layout: {
            columns: [{ opening: {} }, { rows: [{ opening: {} }, { opening: {} }], between: 1.5 }],
            between: 1.5,
          },
        },
      }),
      ['columns', 'rows', 'mid-stile', 'mid-rail', 'arch'],
      'openings that are no even grid',
    ],
    [
      'an opening that keeps a square edge beside beaded ones',
      beadedExample({
        outline: {
          ...outline,
          layout: { columns: [{ opening: { edge: 'square' } }, { opening: {} }], between: 1.5 },
        },
      }),
      ['columns', 'rows'],
      'openings that are no even grid',
    ],
    ['a size held at the back', plain({ edge: { style: 'square', sizeHeldAt: 'back' } }), ['edge'], 'edge'],
    [
      'a V-cutter after the lift',
      plain({ edge: { style: 'square', sizeHeldAt: 'face', corners: 'vee' } }),
      ['edge'],
      'edge',
    ],
  ])('then %s leave their cells empty, and the remark names them', (_what, frame, empty, remark) => {
    const cells = cellsOf(frame);
    expect(empty.filter((heading) => cells[heading as TableHeading] !== '')).toEqual([]);
    expect(cells.remark).toContain(`not in table: `);
    expect(cells.remark).toContain(remark);
    expect(cells.width).toBe('33');
    expect(read(writeFrameTable([frame])).rows[0]!.frame).toBeUndefined();
  });

  test('then labels, cutters, turning over and a given board are remarked, and the sizes stay', () => {
    const frame = plain({
      outline: { ...outline, layout: { columns: [{ opening: { label: 'Sink' } }, { opening: {} }], between: 1.5 } },
      setup: { ...plain().setup, flip: 'end-over-end' },
      blank: { width: 40, height: 40 },
      cutters: { ...plain().cutters, dado: { kind: 'straight', diameter: 0.25, fluteLength: 1 } },
    });
    const cells = cellsOf(frame);
    expect(cells).toMatchObject({ columns: '2', rows: '1', 'box thickness': '0.75', edge: 'square' });
    expect(cells.remark).toBe('not in table: labels of the openings, turning over and setup, cutters, the given board');
  });

  test('then a traced outline is remarked and has no sizes', () => {
    const square = [
      [0, 0],
      [10, 0],
      [10, 10],
      [0, 10],
    ] as const;
    const cells = cellsOf(workedExample({ outline: { kind: 'traced', perimeter: square, openings: [] } }));
    const filled = Object.entries(cells).flatMap(([heading, cell]) => (cell === '' ? [] : [heading]));
    expect(filled).toEqual(['name', 'unit', 'board thickness', 'remark']);
    expect(cells.remark).toContain('an outline traced from a drawing');
  });

  test('then a name that a spreadsheet would run is text, and comes back', () => {
    const text = writeFrameTable([plain({ name: '=1+1' })]);
    expect(text).toContain(`\r\n'=1+1,in,`);
    expect(read(text).rows[0]!.name).toBe('=1+1');
  });
});
