import type { Cutters, Particulars } from '#shared/kernel/particulars/particulars.ts';
import { workedExample } from './worked-example.ts';

/** The cutters of the bead example: R 3/32, tip flat 1/32, quirk 1/8, a 30° V. */
export const beadCutterSet: Required<Pick<Cutters, 'bead' | 'quirk' | 'corner'>> = {
  bead: { kind: 'beading', profileRadius: 3 / 32, tipFlat: 1 / 32, fluteLength: 0.5 },
  quirk: { kind: 'straight', diameter: 0.125, fluteLength: 0.5 },
  corner: { kind: 'vee', includedAngle: 30, fluteLength: 1 },
};

/** The worked example with the bead of the bead example: R 3/32, drop 0.010, quirk 1/8. */
export const beadedExample = (changes: Partial<Particulars> = {}): Particulars =>
  workedExample({
    edge: { style: 'beaded', bead: { radius: 3 / 32, drop: 0.01, quirk: 0.125 } },
    cutters: { ...workedExample().cutters, ...beadCutterSet },
    ...changes,
  });
