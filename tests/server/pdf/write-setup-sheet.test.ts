import { describe, expect, test } from 'vitest';
import type { Particulars } from '#shared/kernel/particulars/particulars.ts';
import { CAUTIONS } from '#shared/kernel/sheet/cautions.ts';
import { describeSheet } from '#shared/kernel/sheet/describe-sheet.ts';
import { SHEET_COLOURS } from '#shared/kernel/sheet/sheet-colours.ts';
import type { SheetContext } from '#shared/kernel/sheet/sheet-model.ts';
import { workFrame } from '#shared/kernel/work-frame.ts';
import { writeSetupSheet } from '../../../server/pdf/write-setup-sheet.ts';
import { workedExample } from '../../builders/worked-example.ts';
import {
  archOnFeet,
  flipped,
  inMillimetres,
  sheetContext,
  wallOfTwelve,
} from '../../shared/kernel/sheet/sheet-frames.ts';
import { countPixels, inOneLine, pdfFacts, pdfFonts, pdfPages, pdfPixels } from './read-pdf.ts';

const write = (particulars: Particulars, context: Partial<SheetContext> = {}, paper: 'A4' | 'Letter' = 'A4') =>
  writeSetupSheet(describeSheet(workFrame(particulars), sheetContext(context)), paper);

const hexChannels = (hex: string) => [1, 3, 5].map((i) => parseInt(hex.slice(i, i + 2), 16));
const near = (hex: string) => (rgb: readonly [number, number, number]) =>
  hexChannels(hex).every((c, i) => Math.abs(c - rgb[i]!) < 24);
const isInk = ([r, g, b]: readonly [number, number, number]) => r + g + b < 3 * 128;

describe('writeSetupSheet', () => {
  // Twelve openings take a fifth sheet on Letter, which is the shorter paper.
  const sheets = (name: string, paper: string) => (name === 'Larder wall' && paper === 'Letter' ? 5 : 4);

  for (const paper of ['A4', 'Letter'] as const)
    for (const make of [workedExample, archOnFeet, wallOfTwelve, inMillimetres])
      for (const particulars of [make(), flipped(make())]) {
        const wanted = sheets(particulars.name, paper);
        test(`${particulars.name}, ${particulars.setup.flip}, ${paper}: ${wanted} sheets, each with its title block`, async () => {
          const pdf = await write(particulars, {}, paper);
          const facts = pdfFacts(pdf);
          expect(facts['Pages']).toBe(String(wanted));
          expect(facts['Page size']).toMatch(paper === 'A4' ? /^595\.\d+ x 841\.\d+ pts/ : /^612 x 792 pts/);
          const pages = pdfPages(pdf).map(inOneLine);
          const fields =
            'Legal owner,Identification number,Revision,Date of issue,Sheet,Title,Approved by,Created by,Document type';
          const values = ['Tern & Alder Joinery', particulars.name, '2026-03-31', 'Ines Marlow', 'Setup sheet'];
          pages.forEach((text, i) => {
            for (const words of [...fields.split(','), ...values, `${i + 1} of ${wanted}`])
              expect(text).toContain(words);
          });
        });
      }

  test('Worked example: each page says what its face needs', async () => {
    const [back, turn, front, cutters] = pdfPages(await write(workedExample())).map(inOneLine);
    for (const words of [
      'Back, cut first',
      'BACK_DADO',
      'BACK_SQUARING',
      '33.245',
      '34.005',
      '1.495',
      'D1 Left end',
      'Scale 1 : ',
      'in the same clamping',
    ])
      expect(back).toContain(words);
    for (const words of ['Turn over, side to side', 'BACK', 'FRONT', 'against the pins', 'fold'])
      expect(turn).toContain(words);
    for (const words of [
      'Front, cut second',
      'FRONT_OPENING_AXIS',
      'Cut one, not both',
      '≈0.0822 in',
      '14 × 27 1/2',
      'Perimeter last',
    ])
      expect(front).toContain(words);
    for (const words of [
      'at least 13/16',
      'add 1/4 in to the front-to-back size',
      'Passed. 1 of 1 checks hold',
      'Drawn',
      'Checked',
      'Cut',
      CAUTIONS.join(' '),
    ])
      expect(cutters).toContain(words);
  });

  test('JetBrains Mono is embedded, and no other font is used', async () => {
    const fonts = pdfFonts(await write(workedExample()));
    expect(fonts.length).toBeGreaterThanOrEqual(2);
    for (const font of fonts) expect(font).toEqual({ name: expect.stringContaining('JetBrainsMono'), embedded: true });
  });

  test('Text is really drawn: ink stands where the heading, the lead and the title block are, in the colour of the face', async () => {
    const pdf = await write(workedExample());
    const heading = { left: 12, top: 9, right: 100, bottom: 17 };
    const lead = { left: 12, top: 17, right: 150, bottom: 22 };
    const owner = { left: 9, top: 269, right: 60, bottom: 275 };
    for (const [page, colour] of [
      [1, SHEET_COLOURS.back],
      [2, SHEET_COLOURS.ink],
      [3, SHEET_COLOURS.front],
      [4, SHEET_COLOURS.ink],
    ] as const) {
      const pixels = pdfPixels(pdf, page, 100);
      expect(countPixels(pixels, heading, near(colour))).toBeGreaterThan(400);
      expect(countPixels(pixels, lead, isInk)).toBeGreaterThan(200);
      expect(countPixels(pixels, owner, isInk)).toBeGreaterThan(60);
    }
  });

  test('The mark of a rounded number is drawn as two strokes and read out as one sign', async () => {
    const pdf = await write(workedExample());
    expect(pdfPages(pdf)[2]).toContain('≈0.0822');
    expect(pdfPages(pdf).join('')).not.toContain('~');
  });

  test('When it is a draft, then every page says so, in its heading and across', async () => {
    const draft = await write(workedExample(), { revision: '', proof: null });
    const released = await write(workedExample());
    const pages = pdfPages(draft);
    expect(pages).toHaveLength(4);
    for (const page of pages) expect(inOneLine(page)).toContain('draft, not for cutting');
    expect(pdfPages(released).join('')).not.toContain('not for cutting');
    const middle = { left: 75, top: 105, right: 135, bottom: 190 };
    const tinted = ([r, g, b]: readonly [number, number, number]) => r - g > 15 && g - b < 12 && r > 225;
    for (const page of [2, 4]) {
      const count = (pdf: Uint8Array) => countPixels(pdfPixels(pdf, page, 50), middle, tinted);
      expect(count(draft)).toBeGreaterThan(count(released) + 500);
    }
  });

  test('The same model gives the same bytes, whatever was written between; another date or paper gives others', async () => {
    const first = await write(archOnFeet());
    await write(inMillimetres(), {}, 'Letter');
    expect(Buffer.from(await write(archOnFeet())).equals(first)).toBe(true);
    expect(Buffer.from(await write(archOnFeet(), { releasedAt: '2026-04-01T09:12:00.000Z' })).equals(first)).toBe(
      false,
    );
    expect(Buffer.from(await write(archOnFeet(), {}, 'Letter')).equals(first)).toBe(false);
  });

  test('The only date in the file is that of the release', async () => {
    const pdf = await write(workedExample());
    expect(pdfFacts(pdf)['CreationDate']).toMatch(/^2026-03-31T09:12:00/);
    expect(
      new Set(
        Buffer.from(pdf)
          .toString('latin1')
          .match(/\(D:\d{14}/g),
      ),
    ).toEqual(new Set(['(D:20260331091200']));
  });

  test('When the date is none, then it throws with it', async () => {
    const model = describeSheet(workFrame(workedExample()), sheetContext());
    await expect(writeSetupSheet({ ...model, releasedAt: 'soon' }, 'A4')).rejects.toThrow('got "soon"');
  });

  test('When a frame has stops, then its draft is still a sheet', async () => {
    const pdf = await write(workedExample({ thickness: 0.3 }), { revision: '', proof: null });
    expect(inOneLine(pdfPages(pdf).join(' '))).toMatch(/Stop .*deep/);
  });
});
