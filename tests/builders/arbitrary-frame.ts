import fc from 'fast-check';
import type { Dado, DadoEnd, LayoutPart, Particulars } from '#shared/kernel/particulars/particulars.ts';
import { workedExample } from './worked-example.ts';

/** A length as people enter it: 64ths of an inch, thousandths, or any number at all. */
const lengthFrom = (min: number, max: number): fc.Arbitrary<number> =>
  fc.oneof(
    fc.integer({ min: Math.ceil(min * 64), max: Math.floor(max * 64) }).map((n) => n / 64),
    fc.integer({ min: Math.ceil(min * 1000), max: Math.floor(max * 1000) }).map((n) => n / 1000),
    fc.double({ min, max, noNaN: true }),
  );

const opening: fc.Arbitrary<LayoutPart> = fc.oneof(
  { weight: 3, arbitrary: fc.constant<LayoutPart>({ opening: {} }) },
  { weight: 1, arbitrary: lengthFrom(0.1, 0.6).map((arch): LayoutPart => ({ opening: { arch } })) },
);

/** Layout trees two levels deep: columns of rows, rows of columns, or less. Parts share what is left equally. */
const layout: fc.Arbitrary<LayoutPart> = fc.oneof(
  opening,
  fc
    .tuple(fc.array(fc.oneof(opening, rowsOf(opening)), { minLength: 1, maxLength: 3 }), lengthFrom(1, 2))
    .map(([columns, between]): LayoutPart => ({ columns, between })),
  fc
    .tuple(fc.array(fc.oneof(opening, columnsOf(opening)), { minLength: 1, maxLength: 3 }), lengthFrom(1, 2))
    .map(([rows, between]): LayoutPart => ({ rows, between })),
);

function rowsOf(part: fc.Arbitrary<LayoutPart>): fc.Arbitrary<LayoutPart> {
  return fc
    .tuple(fc.array(part, { minLength: 2, maxLength: 3 }), lengthFrom(1, 2))
    .map(([rows, between]) => ({ rows, between }));
}

function columnsOf(part: fc.Arbitrary<LayoutPart>): fc.Arbitrary<LayoutPart> {
  return fc
    .tuple(fc.array(part, { minLength: 2, maxLength: 3 }), lengthFrom(1, 2))
    .map(([columns, between]) => ({ columns, between }));
}

const end = fc.constantFrom<DadoEnd>('open', 'stopped', 'meets');

const dado: fc.Arbitrary<Dado> = fc
  .record({
    part: fc.constant('Part'),
    runs: fc.constantFrom('vertical' as const, 'horizontal' as const),
    at: lengthFrom(0.1, 19),
    panel: lengthFrom(0.5, 1),
    clearance: lengthFrom(0, 0.03),
    depth: fc.constantFrom(0.25, 0.25, 0.3125),
    from: lengthFrom(0, 9),
    long: lengthFrom(2, 10),
    ends: fc.tuple(end, end),
  })
  .map(({ from, long, ...rest }) => ({ ...rest, from, to: from + long }));

/** Frames of 20 to 60 in with random layouts, dados, turning and squaring; some on a board that is given. */
export const arbitraryFrame: fc.Arbitrary<Particulars> = fc
  .record({
    width: lengthFrom(20, 60),
    height: lengthFrom(20, 60),
    members: fc.tuple(lengthFrom(1, 2.5), lengthFrom(1, 2.5), lengthFrom(1, 2.5), lengthFrom(1, 2.5)),
    feet: fc.oneof(fc.constant(0), lengthFrom(1, 4)),
    layout,
    dados: fc.array(dado, { maxLength: 6 }),
    flip: fc.constantFrom('side-to-side' as const, 'end-over-end' as const),
    squaring: fc.constantFrom('two-edges' as const, 'all-edges' as const),
    allowance: lengthFrom(0.5, 2),
    trim: lengthFrom(0.1, 0.5),
    spare: fc.option(fc.tuple(lengthFrom(0, 10), lengthFrom(0, 10)), { nil: undefined }),
    sizeHeldAt: fc.constantFrom('face' as const, 'back' as const),
  })
  .map(({ width, height, members, feet, layout, dados, flip, squaring, allowance, trim, spare, sizeHeldAt }) => {
    const [left, right, top, bottom] = members;
    const round = 2 * (allowance + trim);
    return workedExample({
      outline: { kind: 'members', width, height, stiles: { left, right }, rails: { top, bottom }, feet, layout },
      edge: { style: 'square', sizeHeldAt },
      dados,
      setup: { flip, squaring, allowance, trim, spoilboard: 0.02 },
      ...(spare ? { blank: { width: width + round + spare[0], height: height + round + spare[1] } } : {}),
    });
  });
