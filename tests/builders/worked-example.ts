import type { Dado, Particulars } from '#shared/kernel/particulars/particulars.ts';

/** A vertical dado of the example's kind. */
export const dado = (changes: Partial<Dado> = {}): Dado => ({
  part: 'Left end',
  runs: 'vertical',
  at: 0.25,
  panel: 0.75,
  clearance: 0.01,
  depth: 0.25,
  from: 0,
  to: 30.5,
  ends: ['open', 'open'],
  ...changes,
});

/** The worked example that tests, help and samples share: a two-door base, 33 × 30 1/2, four dados. */
export const workedExample = (changes: Partial<Particulars> = {}): Particulars => ({
  format: 'stilepost.frame/1',
  name: 'Two-door base',
  unit: 'in',
  thickness: 0.75,
  outline: {
    kind: 'members',
    width: 33,
    height: 30.5,
    stiles: { left: 1.75, right: 1.75 },
    rails: { top: 1.75, bottom: 1.25 },
    feet: 0,
    layout: { columns: [{ opening: { label: 'A' } }, { opening: { label: 'B' } }], between: 1.5 },
  },
  edge: { style: 'square', sizeHeldAt: 'face' },
  dados: [
    dado(),
    dado({ part: 'Right end', at: 32 }),
    dado({ part: 'Partition', at: 16.125, from: 1.25, ends: ['meets', 'open'] }),
    dado({ part: 'Bottom', runs: 'horizontal', at: 0.5, from: 1, to: 32, ends: ['meets', 'meets'] }),
  ],
  setup: { flip: 'side-to-side', allowance: 1, trim: 0.25, squaring: 'two-edges', spoilboard: 0.02 },
  cutters: {
    dado: { kind: 'straight', diameter: 0.375, fluteLength: 1.25 },
    squaring: { kind: 'straight', diameter: 0.375, fluteLength: 1.25 },
    opening: { kind: 'tapered', tipRadius: 0.0625, sideAngle: 1.5, fluteLength: 1.25 },
    perimeter: { kind: 'straight', diameter: 0.375, fluteLength: 1.25 },
  },
  ...changes,
});
