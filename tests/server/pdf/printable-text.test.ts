import PDFDocument from 'pdfkit';
import { describe, expect, test } from 'vitest';
import { describeSheet } from '#shared/kernel/sheet/describe-sheet.ts';
import { workFrame } from '#shared/kernel/work-frame.ts';
import { loadFonts } from '../../../server/pdf/load-fonts.ts';
import { printableDeep, printableText } from '../../../server/pdf/printable-text.ts';
import { readCmap } from '../../../server/pdf/read-cmap.ts';
import { writeSetupSheet } from '../../../server/pdf/write-setup-sheet.ts';
import { workedExample } from '../../builders/worked-example.ts';
import { sheetContext } from '../../shared/kernel/sheet/sheet-frames.ts';
import { inOneLine, pdfPages } from './read-pdf.ts';

const latin = (code: number) => code < 256;

describe('printableText', () => {
  test('What has a glyph stays, and so does the mark of a rounded number', () => {
    expect(printableText('Küche ≈0.5 × 3°', latin)).toBe('Küche ≈0.5 × 3°');
  });

  test('Signs without one are spelled out', () => {
    expect(printableText('depth ≤ 1/2, ≥1/4', latin)).toBe('depth at most 1/2, at least 1/4');
    expect(printableText('left → right', latin)).toBe('left to right');
  });

  test('What cannot be spelled out is seen to be missing, one mark a character', () => {
    expect(printableText('棚 A 🪚', latin)).toBe('[?] A [?]');
  });

  test('A letter and its mark are put together; joiners and direction marks print nothing', () => {
    expect(printableText('u\u0308ber\u200d\ufe0f\u202e', latin)).toBe('über');
  });

  test('Every string within a value is made printable, and nothing else changes', () => {
    expect(printableDeep({ a: ['≤1', 2, null, true], b: { c: '棚' } }, latin)).toEqual({
      a: ['at most 1', 2, null, true],
      b: { c: '[?]' },
    });
  });
});

describe('readCmap', () => {
  test('It finds the characters that fontkit, which pdfkit brings, finds in each font', async () => {
    const { regular, bold } = await loadFonts();
    for (const font of [...regular, ...bold]) {
      const doc = new PDFDocument().font(Buffer.from(font.bytes) as unknown as string) as unknown as {
        _font: { font: { characterSet: number[] } };
      };
      // fontkit counts the table's end mark 0xFFFF and code points that lead to glyph 0.
      const known = doc._font.font.characterSet.filter((code) => code !== 0xffff);
      expect(known.length).toBeGreaterThan(8);
      expect([...readCmap(font.bytes)].sort((a, b) => a - b)).toEqual(known.sort((a, b) => a - b));
    }
  });

  test('The latin part lacks ≈ and ≤, which is why they are drawn and spelled out', async () => {
    const { regular } = await loadFonts();
    for (const sign of ['≈', '≤', '→']) expect(regular.some((f) => f.has.has(sign.codePointAt(0)!))).toBe(false);
    for (const sign of ['×', '°', '–', '…', '’']) expect(regular[0]!.has.has(sign.codePointAt(0)!)).toBe(true);
  });

  test('When it is no font, then it throws', () => {
    expect(() => readCmap(new Uint8Array(64))).toThrow('no cmap table');
  });
});

describe('names in other scripts on a sheet', () => {
  test('Greek, Cyrillic, Polish and Vietnamese are printed; Chinese and pictures are seen to be missing', async () => {
    const name = 'Łódź Кухня Κουζίνα Bếp 厨房 🪚';
    const pdf = await writeSetupSheet(
      describeSheet(workFrame(workedExample({ name })), sheetContext({ note: 'Gap ≤ 1/8 → fill' })),
      'A4',
    );
    const [first] = pdfPages(pdf).map(inOneLine);
    expect(first).toContain('Łódź Кухня Κουζίνα Bếp [?][?] [?]');
    expect(first).toContain('Gap at most 1/8 to fill');
  });
});
