import { describe, expect, test } from 'vitest';
import type { Particulars } from '#shared/kernel/particulars/particulars.ts';
import { BUILTIN_PROFILES } from '#shared/kernel/profiles/builtin-profiles.ts';
import type { FileProfile } from '#shared/kernel/profiles/file-profile.ts';
import { describeSheet } from '#shared/kernel/sheet/describe-sheet.ts';
import type { SheetBlock, SheetContext, SheetModel } from '#shared/kernel/sheet/sheet-model.ts';
import { workFrame } from '#shared/kernel/work-frame.ts';
import { dado, workedExample } from '../../../builders/worked-example.ts';
import { archOnFeet, flipped, inMillimetres, sheetContext } from './sheet-frames.ts';

const sheetOf = (particulars: Particulars, context: Partial<SheetContext> = {}) =>
  describeSheet(workFrame(particulars), sheetContext(context));

const block = (sheet: SheetModel, id: string): SheetBlock =>
  sheet.pages.flatMap((p) => p.blocks).find((b) => b.id === id)!;

/** A table's rows as records of its column keys. */
function rows(sheet: SheetModel, id: string): Record<string, string>[] {
  const found = block(sheet, id);
  if (found?.kind !== 'table') throw new Error(`no table ${id}`);
  return found.table.rows.map((cells) =>
    Object.fromEntries(found.table.columns.map((c, i) => [c.key, cells[i]!.text])),
  );
}

function lines(sheet: SheetModel, id: string): string[] {
  const found = block(sheet, id);
  if (found?.kind !== 'list') throw new Error(`no list ${id}`);
  return found.items.map(({ word, text }) => (word ? `${word} ${text}` : text));
}

const withProfile = (changes: Partial<FileProfile>) => ({ profile: { ...BUILTIN_PROFILES[0]!.profile, ...changes } });

describe('describeSheet, worked example of spec 2', () => {
  const sheet = sheetOf(workedExample());

  test('It has four pages in the order they are used', () => {
    expect(sheet.pages.map((p) => [p.id, p.title])).toEqual([
      ['back', 'Back, cut first'],
      ['turn', 'Turn over, side to side'],
      ['front', 'Front, cut second'],
      ['cutters', 'Cutters, parts and sign-off'],
    ]);
  });

  test('Dados are told from the pins in the back setup', () => {
    expect(rows(sheet, 'dados')).toEqual([
      { tag: 'D1', part: 'Left end', x1: '33.245', x2: '34.005', y1: '1 1/16', y2: '31 15/16', depth: '1/4' },
      { tag: 'D2', part: 'Right end', x1: '1.495', x2: '2.255', y1: '1 1/16', y2: '31 15/16', depth: '1/4' },
      { tag: 'D3', part: 'Partition', x1: '17.37', x2: '18.13', y1: '2 1/2', y2: '31 15/16', depth: '1/4' },
      { tag: 'D4', part: 'Bottom', x1: '2 1/4', x2: '33 1/4', y1: '1.745', y2: '2.505', depth: '1/4' },
    ]);
  });

  test('Openings are told from the pins in the front setup', () => {
    expect(rows(sheet, 'openings')[0]).toEqual({
      tag: 'O1',
      label: 'A',
      x1: '2 3/4',
      x2: '16 3/4',
      y1: '2 1/4',
      y2: '29 3/4',
      size: '14 × 27 1/2',
    });
  });

  test('Line sets are told in cutting order; the axis is another way to say the opening, and the perimeter is last', () => {
    const told = rows(sheet, 'front-line-sets').map((r) => [r['order'], r['layer'], r['side'], r['depth'], r['count']]);
    expect(told).toEqual([
      ['1', 'FRONT_OPENING', 'inside', '13/16', '2'],
      ['or 1', 'FRONT_OPENING_AXIS', 'on the line', '13/16', '2'],
      ['2', 'FRONT_CORNER_LIFT', 'on the line', '13/16, climbs', '8'],
      ['3', 'FRONT_PERIMETER', 'outside', '0.77', '1'],
      ['–', 'FRONT_BLANK', 'not cut', '–', '1'],
    ]);
    const back = rows(sheet, 'back-line-sets').map((r) => [r['order'], r['layer'], r['side'], r['cutter']]);
    expect(back).toEqual([
      ['1', 'BACK_DADO', 'inside, pocket', 'C1 straight 3/8'],
      ['2', 'BACK_SQUARING', 'waste side', 'C1 straight 3/8'],
      ['–', 'BACK_BLANK', 'not cut', '–'],
    ]);
  });

  test('Lengths of line sets: perimeter 2(33 + 30 1/2), openings 4(14 + 27 1/2)', () => {
    const found = block(sheet, 'front-line-sets');
    const lengths = found.kind === 'table' ? found.table.rows.map((r) => r[8]!.value!) : [];
    expect(lengths[0]).toBeCloseTo(166, 9);
    expect(lengths[3]).toBeCloseTo(127, 9);
  });

  test('It says where the entered size is true, the axis offset, and to cut one of two lines', () => {
    const [size, which] = lines(sheet, 'sizes');
    expect(size).toBe(
      'Entered size is true at the face (z0 = 0). At the back each opening is ≈0.0196 in smaller a side than at the face.',
    );
    expect(which).toContain('Cut one, not both.');
    expect(which).toContain('≈0.0822 in');
  });

  test('One cutter that does three things is listed once, with the flute that its deepest cut needs', () => {
    expect(rows(sheet, 'cutters').map((r) => [r['tag'], r['roles'], r['flute'], r['needed']])).toEqual([
      ['C1', 'dado, squaring, perimeter', '1 1/4', 'at least 0.77'],
      ['C2', 'opening', '1 1/4', 'at least 13/16'],
    ]);
  });

  test('Box parts grow by the depth of their dado', () => {
    expect(rows(sheet, 'box-parts')).toEqual([
      {
        part: 'Left end, Right end, Partition, Bottom',
        panel: '3/4',
        width: '0.76',
        grow: 'add 1/4 in to the front-to-back size',
      },
    ]);
  });

  test('Corners: sharp at the face, then the nose; unlifted ρ(√2 − 1)', () => {
    const [face, , half] = rows(sheet, 'residue');
    expect(face).toMatchObject({
      corners: '8 of 90°',
      depth: 'at the face',
      lifted: '0',
      liftedDiagonal: '0',
      unlifted: '≈0.0822',
    });
    expect(half!['liftedDiagonal']).toBe('≈0.0259');
  });

  test('Cautions are those of spec 1, word for word', () => {
    expect(lines(sheet, 'cautions')).toEqual([
      "Dry-run above the board first. Check cutter data against the cutter maker's drawing and the cutter in your hand. Measure the board. " +
        'Offcuts come free when openings and perimeter are cut through: hold them down. MDF dust harms lungs: extract it and wear a respirator. ' +
        "Machine guarding, dust and formaldehyde rules are your local authority's; the machine maker's manual and a qualified operator come first.",
    ]);
  });

  test('Offcuts stand under their own heading and not among the findings', () => {
    expect(lines(sheet, 'offcuts').join()).toContain('comes free');
    expect(lines(sheet, 'findings').join()).not.toContain('comes free');
    expect(lines(sheet, 'findings').length).toBeGreaterThan(1);
  });

  test('The title block says whose, what, which and when', () => {
    expect(sheet.titleBlock).toEqual({
      legalOwner: 'Tern & Alder Joinery',
      identification: 'Fenwick Lane kitchen / Two-door base',
      title: 'Two-door base',
      documentType: 'Setup sheet',
      revision: 'A',
      dateOfIssue: '2026-03-31',
      createdBy: 'Ines Marlow',
      approvedBy: '',
    });
  });
});

describe('describeSheet, other frames', () => {
  test('When the board is turned end over end, then the left and top edges are squared', () => {
    const sheet = sheetOf(flipped(workedExample()));
    expect(lines(sheet, 'before-turning').join()).toContain('Square the left and top edges in the same clamping');
    expect(rows(sheet, 'turn-edges').map((r) => Object.values(r))).toEqual([
      ['A', 'left', 'left', 'squared', 'against the pins'],
      ['B', 'top', 'bottom', 'squared', 'against the pins'],
      ['C', 'right', 'right', 'rough', 'free'],
      ['D', 'bottom', 'top', 'rough', 'free'],
    ]);
  });

  test('When the trim is no wider than the cutter, then nothing comes free at the squared edges; else the rest of it does', () => {
    const { setup } = workedExample();
    const said = (trim: number) =>
      lines(sheetOf(workedExample({ setup: { ...setup, trim } })), 'before-turning').join();
    expect(said(0.25)).toContain('Nothing comes free: the cutter takes the whole strip.');
    expect(said(0.5)).toContain('Strips 1/8 in wide come free');
    expect(lines(sheetOf(inMillimetres()), 'before-turning').join()).toContain('A rim comes free all round');
  });

  test('When the board tolerance is said, then it is that of ANSI A208.2 (from memory) in the unit of the frame', () => {
    expect(lines(sheetOf(workedExample()), 'before-turning')[0]).toContain(
      'worked for 3/4 in. More than 0.005 in away',
    );
    expect(lines(sheetOf(inMillimetres()), 'before-turning')[0]).toContain('worked for 19 mm. More than 0.13 mm away');
  });

  test('When the profile carries the axis alone, then the sheet has no entered opening and asks for no offset', () => {
    const sheet = sheetOf(workedExample(), withProfile({ openingLines: 'axis' }));
    expect(rows(sheet, 'front-line-sets').map((r) => r['layer'])).not.toContain('FRONT_OPENING');
    expect(rows(sheet, 'front-line-sets')[0]).toMatchObject({ order: '1', layer: 'FRONT_OPENING_AXIS' });
    expect(lines(sheet, 'sizes')[1]).toContain('no offset of your own');
    expect(lines(sheet, 'sizes').join()).not.toContain('Cut one, not both');
  });

  test('When sizes are held at the back, then it says so with the depth', () => {
    expect(lines(sheetOf(workedExample({ edge: { style: 'square', sizeHeldAt: 'back' } })), 'sizes')[0]).toContain(
      'true at the back, 3/4 in below the face (z0 = 3/4)',
    );
  });

  test('When the profile writes the other unit or another origin, then the sheet says both', () => {
    const sheet = sheetOf(workedExample(), withProfile({ unit: 'mm', origin: 'frame', decimals: 4, flavour: 'R12' }));
    const found = block(sheet, 'back-line-sets');
    const [said] = found.kind === 'table' ? found.after : [];
    // Back setup, side to side: the frame's lower left corner as it lies is at Bw − t − k − W = 1.25, t + k = 1.25.
    expect(said).toBe(
      "DXF of the back: R12, millimetres (this sheet is in inches), 4 decimals, 0, 0 at the lower left corner of the frame as it lies here, 1 1/4 right of and 1 1/4 above the pins' corner.",
    );
  });

  test('When dados have two depths, then each has its layer and its own row of box parts', () => {
    const sheet = sheetOf(archOnFeet());
    expect(rows(sheet, 'back-line-sets').map((r) => r['layer'])).toEqual([
      'BACK_DADO_D0250',
      'BACK_DADO_D0375',
      'BACK_SQUARING',
      'BACK_BLANK',
    ]);
    expect(rows(sheet, 'box-parts').map((r) => [r['part'], r['grow']])).toEqual([
      ['Left end, Right end, Shelf', 'add 1/4 in to the front-to-back size'],
      ['Bottom', 'add 3/8 in to the front-to-back size'],
    ]);
  });

  test('When many parts grow alike, then a row names at most eight, and one that plugs in twice says so', () => {
    const dados = Array.from({ length: 10 }, (_, i) =>
      dado({ part: `Part ${Math.min(i, 8)}`, at: 1 + 3 * i, panel: 0.5 }),
    );
    const parts = rows(sheetOf(workedExample({ dados })), 'box-parts').map((r) => r['part']);
    expect(parts).toEqual(['Part 0, Part 1, Part 2, Part 3, Part 4, Part 5, Part 6, Part 7', 'Part 8 (2 dados)']);
  });

  test('When cutters have names, places and passes, then the sheet uses them', () => {
    const sheet = sheetOf(inMillimetres());
    expect(rows(sheet, 'back-line-sets')[1]).toMatchObject({
      cutter: 'C1 T3 Compression 9.5',
      passes: '8, 16, 19.5',
      depth: '19.5',
    });
    expect(rows(sheet, 'cutters')[0]).toMatchObject({ number: '3', pass: '8', needed: 'at least 19.5' });
  });

  test('When it is a draft, then it is marked, has no proof, and nobody has signed', () => {
    const sheet = sheetOf(workedExample(), { revision: '', proof: null });
    expect(sheet.draft).toBe(true);
    expect(sheet.titleBlock.revision).toBe('draft');
    expect(lines(sheet, 'proof')).toEqual(['Not proved. No files have been written for this sheet.']);
    const boxes = block(sheet, 'sign-off');
    expect(boxes.kind === 'sign-off' && boxes.boxes.every((b) => b.name === '' && b.date === '')).toBe(true);
  });

  test('When a proof failed, then each check that does not hold is told with what was wanted and got', () => {
    const proof = {
      ok: false,
      checks: [
        { name: 'back: unit', ok: false, got: 'mm', wanted: 'in' },
        { name: 'front: unit', ok: true, got: 'in', wanted: 'in' },
      ],
    };
    expect(lines(sheetOf(workedExample(), { proof }), 'proof')).toEqual([
      'Failed. 1 of 2 checks do not hold. Do not cut.',
      'back: unit wanted in, got mm',
    ]);
  });

  test('When both faces passed the same check, then it is named once', () => {
    const checks = ['back: unit', 'back: text', 'front: unit', 'front: text', 'front: openings'].map((name) => ({
      name,
      ok: true,
      got: '',
      wanted: '',
    }));
    expect(lines(sheetOf(workedExample(), { proof: { ok: true, checks } }), 'proof')).toEqual([
      'Passed. 5 of 5 checks hold. back and front: unit, text; front: openings.',
    ]);
  });

  test('When a frame has stops and lines are missing, then there is still a sheet, and it names them', () => {
    const broken = workedExample({ outline: { ...workedExample().outline, width: 4 } as Particulars['outline'] });
    const sheet = sheetOf(broken, { revision: '', proof: null });
    expect(lines(sheet, 'findings')[0]).toMatch(/^Stop /);
  });

  test('When there is a note with the revision, then it stands on the first page', () => {
    const sheet = sheetOf(workedExample(), { note: 'Partition moved.' });
    expect(sheet.pages[0]!.blocks.at(-1)).toMatchObject({ kind: 'list', items: [{ text: 'Partition moved.' }] });
  });

  test('When the date is none, then it throws with it', () => {
    expect(() => sheetOf(workedExample(), { releasedAt: 'soon' })).toThrow('got "soon"');
  });

  test('The model is plain data, which a worker can be sent', () => {
    const sheet = sheetOf(archOnFeet());
    expect(structuredClone(sheet)).toEqual(sheet);
  });
});
