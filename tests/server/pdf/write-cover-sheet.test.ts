import { describe, expect, test } from 'vitest';
import type { CoverContext, CoverFrame } from '#shared/kernel/sheet/cover-model.ts';
import { describeCover } from '#shared/kernel/sheet/describe-cover.ts';
import { workFrame } from '#shared/kernel/work-frame.ts';
import { writeCoverSheet } from '../../../server/pdf/write-cover-sheet.ts';
import { workedExample } from '../../builders/worked-example.ts';
import { archOnFeet, inMillimetres } from '../../shared/kernel/sheet/sheet-frames.ts';
import { inOneLine, pdfFacts, pdfPages } from './read-pdf.ts';

const frame = (particulars = workedExample(), revision = 'A'): CoverFrame => {
  const folder = `${particulars.name.replaceAll(' ', '-')}_rev-${revision}`;
  return {
    worked: workFrame(particulars),
    revision,
    folder,
    files: [`${folder}_back.dxf`, `${folder}_front.dxf`, 'setup-sheet.pdf'],
  };
};

const context: CoverContext = {
  shopName: 'Tern & Alder Joinery',
  jobName: 'Fenwick Lane kitchen',
  author: 'Ines Marlow',
  releasedAt: '2026-03-31T09:12:00.000Z',
  profileName: 'R12 for older programs',
  leftOut: ['Plinth'],
};

describe('writeCoverSheet', () => {
  test('It lists each frame with revision, size, thickness, openings, board, findings and files', async () => {
    const pdf = await writeCoverSheet(
      describeCover([frame(), frame(archOnFeet(), 'C'), frame(inMillimetres())], context),
      'A4',
    );
    const [text] = pdfPages(pdf).map(inOneLine);
    expect(pdfFacts(pdf)['Pages']).toBe('1');
    for (const words of [
      '3 frames, 7 openings',
      'R12 for older programs',
      'Two-door base',
      '33 × 30 1/2 in',
      '35 1/2 × 33',
      '36 × 42 in',
      '900 × 762 mm',
      'Hearth-arch_rev-C/',
      'Two-door-base_rev-A_back.dxf',
      'Plinth has no released revision.',
      'Cover sheet',
      '1 of 1',
      'hold them down',
    ])
      expect(text).toContain(words);
    expect(text).toMatch(/\d cautions?, \d notes?/);
  });

  test('Boards of one size are counted together, largest first', () => {
    const { blocks } = describeCover([frame(), frame(archOnFeet()), frame()], context);
    const boards = blocks.find((b) => b.id === 'boards');
    expect(boards?.kind === 'list' && boards.items.map((i) => `${i.word} ${i.text}`)).toEqual([
      '1 of 38 1/2 × 44 1/2, 3/4 in thick',
      '2 of 35 1/2 × 33, 3/4 in thick',
    ]);
  });

  test('The same frames give the same bytes', async () => {
    const write = () => writeCoverSheet(describeCover([frame()], context), 'Letter');
    expect(Buffer.from(await write()).equals(await write())).toBe(true);
  });

  test('When there are very many frames, then it goes on to more sheets and loses none', async () => {
    const frames = Array.from({ length: 120 }, (_, i) =>
      frame(workedExample({ name: `Frame number ${i} of the house` })),
    );
    const pages = pdfPages(await writeCoverSheet(describeCover(frames, context), 'Letter')).map(inOneLine);
    expect(pages.length).toBeGreaterThan(2);
    const all = pages.join(' ').replaceAll(' ', '');
    for (let i = 0; i < 120; i++) expect(all).toContain(`Frame-number-${i}-of-the-house_rev-A_front.dxf`);
  });

  test('When there are none, then it says so', async () => {
    expect(inOneLine(pdfPages(await writeCoverSheet(describeCover([], context), 'A4'))[0]!)).toContain(
      'No released frames.',
    );
  });
});
