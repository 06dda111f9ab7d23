import type { Cutter } from '../cutters/cutter.ts';
import type { Unit } from '../units/unit.ts';
import type { DrawerEntry } from './drawer-cutter.ts';

type Named = Cutter & { readonly name: string };

const straight = (name: string, diameter: number, fluteLength: number, maxPass: number): Named => ({
  kind: 'straight',
  name,
  diameter,
  fluteLength,
  maxPass,
});
const tapered = (name: string, tipRadius: number, sideAngle: number, fluteLength: number, maxPass: number): Named => ({
  kind: 'tapered',
  name,
  tipRadius,
  sideAngle,
  fluteLength,
  maxPass,
});
const vee = (name: string, includedAngle: number, fluteLength: number): Named => ({
  kind: 'vee',
  name,
  includedAngle,
  fluteLength,
});
const beading = (name: string, profileRadius: number, tipFlat: number, fluteLength: number): Named => ({
  kind: 'beading',
  name,
  profileRadius,
  tipFlat,
  fluteLength,
});

/** Common sizes of each unit, not converted from the other. Common practice, no source. */
const CUTTERS: Record<Unit, readonly Named[]> = {
  in: [
    straight('Straight 1/2', 0.5, 1.25, 0.5),
    straight('Straight 3/8', 0.375, 1.25, 0.5),
    straight('Straight 1/4', 0.25, 1, 0.25),
    straight('Straight 1/8', 0.125, 0.5, 0.125),
    tapered('Tapered, 1/16 nose, 1.5 degrees', 0.0625, 1.5, 1.25, 0.5),
    tapered('Tapered, 1/8 nose, 1 degree', 0.125, 1, 1.25, 0.5),
    vee('V 30 degrees', 30, 0.5),
    vee('V 60 degrees', 60, 0.5),
    vee('V 90 degrees', 90, 0.5),
    beading('Bead 3/32', 0.09375, 0.03125, 0.5),
    beading('Bead 1/8', 0.125, 0.03125, 0.5),
  ],
  mm: [
    straight('Straight 12', 12, 32, 12),
    straight('Straight 10', 10, 32, 12),
    straight('Straight 6', 6, 25, 6),
    straight('Straight 3', 3, 12, 3),
    tapered('Tapered, 1.5 nose, 1.5 degrees', 1.5, 1.5, 32, 12),
    tapered('Tapered, 3 nose, 1 degree', 3, 1, 32, 12),
    vee('V 30 degrees', 30, 12),
    vee('V 60 degrees', 60, 12),
    vee('V 90 degrees', 90, 12),
    beading('Bead 2.5', 2.5, 0.5, 12),
    beading('Bead 3', 3, 0.5, 12),
  ],
};

/** What a new shop's drawer begins with. The numbers are to be held against the cutters in hand, so each says so in its remarks. */
export const startingCutters = (unit: Unit): DrawerEntry[] =>
  CUTTERS[unit].map((cutter) => ({
    unit,
    cutter,
    remarks: 'A common size. Check it against the cutter in your hand.',
  }));
