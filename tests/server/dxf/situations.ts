import type { Particulars } from '#shared/kernel/particulars/particulars.ts';
import { dado, workedExample } from '../../builders/worked-example.ts';

/** A frame to write files of; the name says what is special about it. */
export interface Situation {
  readonly name: string;
  readonly particulars: Particulars;
}

const example = workedExample();
const turned = (changes: Partial<Particulars['setup']>): Particulars['setup'] => ({ ...example.setup, ...changes });

const columns = { columns: [{ opening: { label: 'A', arch: 1.5 } }, { opening: { label: 'B' } }], between: 1.5 };

/** Half and quarter circles as bulges (DXF Reference, group 42: tan of a quarter of the angle). */
const HALF = 1;
const QUARTER = Math.tan(Math.PI / 8);

const traced: Particulars = workedExample({
  name: 'Traced with arcs',
  unit: 'mm',
  thickness: 19,
  outline: {
    kind: 'traced',
    // A board with a round head, and corners rounded below; run clockwise, far from the origin.
    perimeter: [
      [1000, 520], [1000, 1000, -HALF], [1600, 1000], [1600, 520, -QUARTER], [1580, 500], [1020, 500, -QUARTER],
    ], // prettier-ignore
    openings: [
      [[1200, 1000, HALF], [1400, 1000, HALF]],
      [[1100, 600], [1500, 600], [1500, 780], [1450, 830, QUARTER], [1150, 830]],
    ], // prettier-ignore
  },
  dados: [
    dado({
      part: 'Left end',
      at: 20,
      panel: 18,
      clearance: 0.3,
      depth: 6,
      from: 0,
      to: 400,
      ends: ['open', 'stopped'],
    }),
  ],
  setup: { flip: 'side-to-side', allowance: 25, trim: 6, squaring: 'two-edges', spoilboard: 0.5 },
  cutters: {
    dado: { kind: 'straight', diameter: 10, fluteLength: 32 },
    squaring: { kind: 'straight', diameter: 10, fluteLength: 32 },
    opening: { kind: 'tapered', tipRadius: 1.5, sideAngle: 1.5, fluteLength: 32 },
    perimeter: { kind: 'straight', diameter: 10, fluteLength: 32 },
  },
});

export const SITUATIONS: readonly Situation[] = [
  { name: 'worked example, side to side', particulars: example },
  { name: 'worked example, end over end', particulars: workedExample({ setup: turned({ flip: 'end-over-end' }) }) },
  {
    name: 'all edges squared, end over end',
    particulars: workedExample({ setup: turned({ flip: 'end-over-end', squaring: 'all-edges' }) }),
  },
  {
    name: 'an arched opening',
    particulars: workedExample({ outline: { ...example.outline, layout: columns } as Particulars['outline'] }),
  },
  {
    name: 'feet',
    particulars: workedExample({ outline: { ...example.outline, feet: 4 } as Particulars['outline'], dados: [] }),
  },
  {
    name: 'dados of two depths, sharp cutter',
    particulars: workedExample({
      dados: [dado(), dado({ part: 'Shelf', at: 31.9, depth: 0.375, ends: ['stopped', 'open'], from: 4 })],
      cutters: { ...example.cutters, opening: { kind: 'vee', includedAngle: 30, fluteLength: 3 } },
    }),
  },
  { name: 'traced with arcs, millimetres', particulars: traced },
];
