import type { Particulars } from '#shared/kernel/particulars/particulars.ts';

/** A two-door base without dados; numbers as in the worked example of the product's geometry. */
export const exampleFrame: Particulars = {
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
  dados: [],
  setup: { flip: 'side-to-side', allowance: 1, trim: 0.25, squaring: 'two-edges', spoilboard: 0.02 },
  cutters: {
    dado: { kind: 'straight', diameter: 0.375, fluteLength: 1.25 },
    squaring: { kind: 'straight', diameter: 0.375, fluteLength: 1.25 },
    opening: { kind: 'tapered', tipRadius: 0.0625, sideAngle: 1.5, fluteLength: 1.25 },
    perimeter: { kind: 'straight', diameter: 0.375, fluteLength: 1.25 },
  },
};
