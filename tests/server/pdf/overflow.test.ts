import { beforeAll, describe, expect, test } from 'vitest';
import { describeSheet } from '#shared/kernel/sheet/describe-sheet.ts';
import type { SheetContext } from '#shared/kernel/sheet/sheet-model.ts';
import { workFrame } from '#shared/kernel/work-frame.ts';
import { writeSetupSheet } from '../../../server/pdf/write-setup-sheet.ts';
import { workedExample } from '../../builders/worked-example.ts';
import {
  archOnFeet,
  flipped,
  fullToTheLimits,
  inMillimetres,
  sheetContext,
  wallOfTwelve,
} from '../../shared/kernel/sheet/sheet-frames.ts';
import { inOneLine, pdfPages, pdfWords, type Word } from './read-pdf.ts';

const SIZE = { A4: { width: 210, height: 297 }, Letter: { width: 215.9, height: 279.4 } } as const;
const BORDER = 8;

/** The reader's boxes are as high as a line and its neighbours' may touch: what is inked is well within. */
function inked({ left, right, top, bottom }: Word): Omit<Word, 'text'> {
  const shy = 0.24 * Math.min(right - left, bottom - top);
  return { left: left + shy, right: right - shy, top: top + shy, bottom: bottom - shy };
}

const touch = (a: Omit<Word, 'text'>, b: Omit<Word, 'text'>) =>
  a.left < b.right && b.left < a.right && a.top < b.bottom && b.top < a.bottom;

/** "page: one | other" for each two words that lie over each other. */
const overlaps = (pages: readonly Word[][]): string[] =>
  pages.flatMap((words, page) => {
    const boxes = words.map((w) => ({ text: w.text, ...inked(w) }));
    return boxes.flatMap((a, i) =>
      boxes
        .slice(i + 1)
        .filter((b) => touch(a, b))
        .map((b) => `${page + 1}: ${a.text} | ${b.text}`),
    );
  });

const outside = (pages: readonly Word[][], paper: 'A4' | 'Letter'): string[] =>
  pages.flatMap((words, page) =>
    words
      .filter(
        (w) =>
          w.left < BORDER ||
          w.right > SIZE[paper].width - BORDER ||
          w.top < BORDER ||
          w.bottom > SIZE[paper].height - BORDER,
      )
      .map((w) => `${page + 1}: ${w.text}`),
  );

const crowded: Partial<SheetContext> = {
  shopName:
    'Tern & Alder Joinery and Fitted Furniture Makers to the Trade and to Private Houses in the Valley of the Upper River Fenwick',
  jobName:
    'Fenwick_Lane_kitchen_larder_boot_room_utility_and_the_long_wall_of_the_dining_room_all_in_one_job_without_a_single_space_here',
  author:
    'Ines Maximiliane Marlow-Featheringham of the Drawing Office, second floor, at the end of the corridor on the left hand side',
  note: 'Partition moved. '.repeat(29).trim(),
};

describe('nothing is clipped and nothing lies over anything', () => {
  for (const paper of ['A4', 'Letter'] as const)
    for (const make of [workedExample, archOnFeet, wallOfTwelve, inMillimetres])
      for (const particulars of [make(), flipped(make())])
        test(`${particulars.name}, ${particulars.setup.flip}, ${paper}`, async () => {
          const words = pdfWords(
            await writeSetupSheet(
              describeSheet(workFrame(particulars), sheetContext({ note: 'Partition moved.' })),
              paper,
            ),
          );
          expect(words.flat().length).toBeGreaterThan(500);
          expect(outside(words, paper)).toEqual([]);
          expect(overlaps(words)).toEqual([]);
        });
});

describe('a frame with a hundred openings and a hundred dados, and long names', () => {
  const particulars = { ...fullToTheLimits(), name: 'N'.repeat(120) };
  let pdf: Uint8Array;

  beforeAll(async () => {
    pdf = await writeSetupSheet(describeSheet(workFrame(particulars), sheetContext(crowded)), 'Letter');
  });

  test('It goes on to more sheets, in order, and each says that it is a continuation', () => {
    const pages = pdfPages(pdf).map(inOneLine);
    expect(pages.length).toBeGreaterThan(8);
    pages.forEach((text, i) => expect(text).toContain(`${i + 1} of ${pages.length}`));
    const titles = ['Back, cut first', 'Turn over, side to side', 'Front, cut second', 'Cutters, parts and sign-off'];
    for (const title of titles)
      expect(pages.filter((p) => p.includes(title) && !p.includes(`${title}, continued`))).toHaveLength(1);
    expect(pages.filter((p) => p.includes('Dados, measured from the pins, continued')).length).toBeGreaterThanOrEqual(
      1,
    );
  });

  test('No dado, no opening, no word of the note is lost', () => {
    const text = inOneLine(pdfPages(pdf).join(' '));
    for (let i = 0; i < 100; i++) {
      expect(text).toContain(`Box part with a long name, no ${i} `);
      expect(text).toContain(`Opening with a long label, no ${i} `);
    }
    expect(text.match(/Partition moved\./g)).toHaveLength(29);
  });

  test('Nothing is clipped and nothing lies over anything', () => {
    const words = pdfWords(pdf);
    expect(outside(words, 'Letter')).toEqual([]);
    expect(overlaps(words)).toEqual([]);
  });

  test('Long names stand whole in the title block', () => {
    const words = pdfWords(pdf)[1]!.filter((w) => w.top > SIZE.Letter.height - BORDER - 23);
    const joined = words.map((w) => w.text).join('');
    // Once as the title and once in the identification, after the job; and the one of the job's own words.
    expect(joined.match(/N/g)!.length).toBeGreaterThanOrEqual(240);
    expect(joined).toContain('without_a_single_space_here');
    expect(joined).toContain('left');
    expect(joined).not.toContain('…');
  });
});
