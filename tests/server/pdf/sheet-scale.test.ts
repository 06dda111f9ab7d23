import { describe, expect, test } from 'vitest';
import type { Particulars } from '#shared/kernel/particulars/particulars.ts';
import { describeSheet } from '#shared/kernel/sheet/describe-sheet.ts';
import { workFrame } from '#shared/kernel/work-frame.ts';
import { writeSetupSheet } from '../../../server/pdf/write-setup-sheet.ts';
import { workedExample } from '../../builders/worked-example.ts';
import { sheetContext } from '../../shared/kernel/sheet/sheet-frames.ts';
import { pdfPages, pdfPixels } from './read-pdf.ts';

/** A board without openings: on the front nothing but its perimeter stands in the way. */
const panel = (unit: 'in' | 'mm', width: number, height: number): Particulars => {
  const { cutters, setup } = workedExample();
  const mm = { dado: { kind: 'straight', diameter: 9.5, fluteLength: 32 } as const };
  return workedExample({
    name: 'Panel',
    unit,
    thickness: unit === 'in' ? 0.75 : 19,
    outline: {
      kind: 'traced',
      perimeter: [
        [0, 0],
        [width, 0],
        [width, height],
        [0, height],
      ],
      openings: [],
    },
    dados: [],
    setup: unit === 'in' ? setup : { ...setup, allowance: 25, trim: 6 },
    cutters: unit === 'in' ? cutters : { dado: mm.dado, squaring: mm.dado, opening: mm.dado, perimeter: mm.dado },
  });
};

/** Middles of the dark strokes that a scan line crosses, in millimetres. */
function strokes(levels: readonly number[], dotsPerMm: number, from: number, to: number): number[] {
  const out: number[] = [];
  let run: number[] = [];
  for (let i = Math.round(from * dotsPerMm); i <= Math.round(to * dotsPerMm); i++) {
    if (levels[i]! < 110) run.push(i);
    else if (run.length > 0) {
      out.push((run[0]! + run[run.length - 1]! + 1) / 2 / dotsPerMm);
      run = [];
    }
  }
  return out;
}

describe('drawings are to scale on paper', () => {
  for (const [paper, unit, width, height] of [
    ['A4', 'in', 20, 10],
    ['A4', 'mm', 700, 300],
    ['Letter', 'in', 96, 48],
    ['Letter', 'mm', 1200, 500],
  ] as const)
    test(`${width} × ${height} ${unit} on ${paper}: measured on the page at 200 dots an inch`, async () => {
      const pdf = await writeSetupSheet(describeSheet(workFrame(panel(unit, width, height)), sheetContext()), paper);
      const denominator = Number(/Scale 1 : ([\d.]+)/.exec(pdfPages(pdf)[2]!)![1]);
      const page = pdfPixels(pdf, 3, 200);
      const gray = (x: number, y: number) => page.at(x, y).reduce((a, b) => a + b, 0) / 3;
      const inPaper = (length: number) => (length * (unit === 'in' ? 25.4 : 1)) / denominator;

      // A little above the middle of the board: clear of the pin at its left.
      const row = Math.round((28 + inPaper(height) * 0.45) * page.dotsPerMm);
      const across = strokes(
        Array.from({ length: page.width }, (_, x) => gray(x, row)),
        page.dotsPerMm,
        12,
        page.width / page.dotsPerMm - 12,
      );
      expect(across[across.length - 1]! - across[0]!).toBeGreaterThan(inPaper(width) - 0.1);
      expect(Math.min(...across.flatMap((a) => across.map((b) => Math.abs(b - a - inPaper(width)))))).toBeLessThan(0.1);

      const column = Math.round(((across[0]! + across[across.length - 1]!) / 2) * page.dotsPerMm);
      const up = strokes(
        Array.from({ length: page.height }, (_, y) => gray(column, y)),
        page.dotsPerMm,
        24,
        30 + inPaper(height) * 1.5,
      );
      expect(Math.min(...up.flatMap((a) => up.map((b) => Math.abs(b - a - inPaper(height)))))).toBeLessThan(0.1);
    });
});
