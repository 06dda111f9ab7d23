import fc from 'fast-check';
import type { TableFrame } from '#shared/kernel/frame-table/frame-of-table.ts';
import type { Share } from '#shared/kernel/frame-table/parse-shares.ts';
import type { Unit } from '#shared/kernel/units/unit.ts';

/** A length as people enter it: 64ths, thousandths, or any number at all. */
const lengthFrom = (min: number, max: number): fc.Arbitrary<number> =>
  fc.oneof(
    fc.integer({ min: Math.ceil(min * 64), max: Math.floor(max * 64) }).map((n) => n / 64),
    fc.integer({ min: Math.ceil(min * 1000), max: Math.floor(max * 1000) }).map((n) => n / 1000),
    fc.double({ min, max, noNaN: true }),
  );
const orNone = (length: fc.Arbitrary<number>): fc.Arbitrary<number> => fc.oneof(fc.constant(0), length);

/** One alone is what is left: a row of the table cannot say one size. */
const shares = (size: fc.Arbitrary<number>): fc.Arbitrary<readonly Share[]> =>
  fc
    .array(fc.oneof(fc.constant('*' as const), size), { minLength: 1, maxLength: 4 })
    .map((all) => (all.length === 1 ? ['*' as const] : all));

/** Names with what CSV and spreadsheets trip over. */
const name = fc
  .array(fc.oneof(fc.constantFrom('"', ',', ';', "'", '=', '-', '@', 'ö', '½', ' '), fc.string({ maxLength: 3 })), {
    minLength: 1,
  })
  .map((parts) =>
    parts
      .join('')
      .replace(/\p{Cc}/gu, '')
      .trim()
      .slice(0, 120)
      .trim(),
  )
  .filter((text) => text !== '');

const frameIn = (unit: Unit, inch: number): fc.Arbitrary<TableFrame> => {
  const of = (min: number, max: number) => lengthFrom(min * inch, max * inch);
  return fc
    .record({
      name,
      width: of(10, 60),
      height: of(10, 90),
      stiles: fc.record({ left: of(1, 3), right: of(1, 3) }),
      rails: fc.record({ top: of(1, 3), bottom: of(1, 3) }),
      midStile: of(1, 2),
      midRail: of(1, 2),
      columns: shares(of(2, 12)),
      rows: shares(of(2, 12)),
      feet: orNone(of(1, 5)),
      arch: orNone(of(0.5, 2)),
      thickness: of(0.5, 1),
      box: orNone(of(0.5, 1)),
      bead: fc.option(fc.record({ radius: of(0.05, 0.2), drop: orNone(of(0.005, 0.02)), quirk: of(0.1, 0.25) }), {
        nil: undefined,
      }),
    })
    .map(({ bead, ...frame }): TableFrame => ({
      ...frame,
      unit,
      midStile: frame.columns.length > 1 ? frame.midStile : 0,
      midRail: frame.rows.length > 1 ? frame.midRail : 0,
      ...(bead ? { bead } : {}),
    }));
};

/** Frames of the kind that the table can say, whether they can be cut or not. */
export const arbitraryTableFrame: fc.Arbitrary<TableFrame> = fc.oneof(frameIn('in', 1), frameIn('mm', 25.4));
