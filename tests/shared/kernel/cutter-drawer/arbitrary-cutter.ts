import fc from 'fast-check';
import type { Cutter } from '#shared/kernel/cutters/cutter.ts';
import type { DrawerEntry } from '#shared/kernel/cutter-drawer/drawer-cutter.ts';

/** Lengths as they are entered: 64ths of an inch and hundredths. */
const entered = fc.oneof(
  fc.integer({ min: 1, max: 4000 }).map((n) => n / 64),
  fc.integer({ min: 1, max: 2000 }).map((n) => n / 100),
);
/** Any that the contract takes, very small ones too. */
const any = fc.oneof(entered, fc.double({ min: 1e-12, max: 9_999, noNaN: true }));

/** Text that tries a spreadsheet and a CSV reader: formulas, quotes, commas, apostrophes; trimmed and not empty, as names are. */
const text = fc
  .array(
    fc.oneof(
      fc.constantFrom('=', '+', '-', '@', "'", '"', ',', ';', ' ', '＝', '1', 'é', '刀'),
      fc.string({ maxLength: 3, unit: 'grapheme' }),
    ),
    { minLength: 1, maxLength: 8 },
  )
  .map((parts) =>
    parts
      .join('')
      .replace(/\p{Cc}/gu, '')
      .replaceAll('\uFEFF', '')
      .trim(),
  )
  .filter((words) => words.length > 0 && words.length <= 120);

const common = { name: text, number: fc.option(fc.integer({ min: 0, max: 9999 }), { nil: undefined }) };
const shapesOf = (length: fc.Arbitrary<number>): fc.Arbitrary<Cutter> =>
  fc.oneof(
    fc.record({ kind: fc.constant('straight' as const), diameter: length, fluteLength: length }),
    fc.record({
      kind: fc.constant('vee' as const),
      includedAngle: fc.double({ min: 5, max: 170, noNaN: true }),
      fluteLength: length,
    }),
    fc.record({
      kind: fc.constant('tapered' as const),
      tipRadius: length,
      sideAngle: fc.double({ min: 0.1, max: 45, noNaN: true }),
      fluteLength: length,
    }),
    fc.record({
      kind: fc.constant('beading' as const),
      profileRadius: length,
      tipFlat: fc.oneof(fc.constant(0), length),
      fluteLength: length,
    }),
  );

/** Cutters of every kind; the flute may be shorter than nose or bead, which the drawing must bear. */
export const arbitraryCutter = shapesOf(entered);

const without = <T extends object>(value: T): T =>
  Object.fromEntries(Object.entries(value).filter(([, v]) => v !== undefined)) as T;

/** Entries that the contract takes. */
export const arbitraryEntry: fc.Arbitrary<DrawerEntry> = fc
  .record({
    unit: fc.constantFrom('in' as const, 'mm' as const),
    shape: shapesOf(any),
    common: fc.record(common),
    passes: fc.option(fc.double({ min: 0.05, max: 1, noNaN: true }), { nil: undefined }),
    remarks: fc.oneof(
      fc.constant(''),
      fc.array(text, { minLength: 1, maxLength: 3 }).map((parts) => parts.join('\n')),
    ),
  })
  .map(({ unit, shape, common: { name, number }, passes, remarks }) => {
    const least = shape.kind === 'beading' ? shape.profileRadius : shape.kind === 'tapered' ? shape.tipRadius : 0;
    const fluteLength = Math.max(shape.fluteLength, least);
    const cutter = without({
      ...shape,
      fluteLength,
      name,
      number,
      maxPass: passes === undefined ? undefined : fluteLength * passes,
    });
    return { unit, cutter, remarks };
  });
