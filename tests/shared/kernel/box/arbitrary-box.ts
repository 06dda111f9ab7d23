import fc from 'fast-check';
import type { Box, PartitionPlaces } from '#shared/kernel/box/box.ts';

/** A length as a shop enters it: sixteenths and thousandths of an inch; tenths and whole millimetres. */
const lengths =
  (unit: 'in' | 'mm') =>
  (min: number, max: number): fc.Arbitrary<number> => {
    const per = (n: number) => fc.integer({ min: Math.ceil(min * n), max: Math.floor(max * n) }).map((i) => i / n);
    return unit === 'in' ? fc.oneof(per(16), per(1000)) : fc.oneof(per(1), per(10));
  };

/** Boxes of all kinds, most of which can be: kitchens, walls, tall ones; with toe kicks, feet, tops, stretchers, partitions. */
const boxIn = (unit: 'in' | 'mm'): fc.Arbitrary<Box> => {
  const inches = lengths(unit);
  const scale = unit === 'in' ? 1 : 25.4;
  const length = (min: number, max: number) => inches(min * scale, max * scale);
  const panel = length(0.47, 1);
  const count = fc.integer({ min: 1, max: 4 });
  const places: fc.Arbitrary<PartitionPlaces> = fc.oneof(
    count.map((n): PartitionPlaces => ({ kind: 'equal openings', count: n })),
    count.map((n): PartitionPlaces => ({ kind: 'equal spaces', count: n })),
    fc.array(length(4, 7), { minLength: 1, maxLength: 3 }).map((steps): PartitionPlaces => ({
      kind: 'given',
      at: steps.map((_, i) => steps.slice(0, i + 1).reduce((sum, step) => sum + step, 0)),
    })),
  );
  const some = <T>(arbitrary: fc.Arbitrary<T>) => fc.option(arbitrary, { nil: undefined });
  const none = fc.constant(0);
  return fc.record({
    name: fc.constant('Any box'),
    unit: fc.constant(unit),
    width: length(10, 45),
    height: length(12, 44),
    depth: some(length(10, 25)),
    ends: fc.record({ thickness: panel }),
    bottom: fc.record({ thickness: panel, up: fc.oneof(none, length(0, 5)) }),
    top: some(
      fc.oneof(
        fc.record({ kind: fc.constant('panel' as const), thickness: panel, down: fc.oneof(none, length(0, 2)) }),
        fc.record({ kind: fc.constant('stretcher' as const), thickness: panel, down: none, width: length(2, 5) }),
      ),
    ),
    partitions: some(fc.record({ thickness: panel, places })),
    overhang: fc.record({
      left: fc.oneof(none, length(-0.5, 2)),
      right: fc.oneof(none, length(-0.5, 2)),
      top: fc.oneof(none, length(-1, 1)),
      bottom: fc.oneof(none, length(-4, 1)),
    }),
    reveal: fc.record({
      left: length(0, 1),
      right: length(0, 1),
      top: length(0, 2),
      bottom: fc.oneof(none, length(0, 1)),
      partition: length(0, 0.5),
    }),
    feet: fc.oneof({ weight: 3, arbitrary: none }, { weight: 1, arbitrary: length(1, 4) }),
    dado: fc.record({
      depth: length(0.125, 0.5),
      clearance: length(0, 0.05),
      run: fc.constantFrom('open' as const, 'stopped' as const),
    }),
    letIn: fc.oneof(none, length(0, 0.25)),
  });
};

export const arbitraryBox: fc.Arbitrary<Box> = fc.oneof(boxIn('in'), boxIn('mm'));
