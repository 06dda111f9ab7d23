import type { Cutter, CutterKind } from '../cutters/cutter.ts';
import type { Unit } from '../units/unit.ts';

/**
 * A cutter of another kind with the flute length, pass, name and place of the one before. The numbers of its shape are
 * usual ones to begin from (common practice, no source), to be held against the cutter in hand.
 */
export function changeCutterKind(cutter: Cutter, kind: CutterKind, unit: Unit): Cutter {
  if (cutter.kind === kind) return cutter;
  const { fluteLength, maxPass, name, number } = cutter;
  const common = {
    fluteLength,
    ...(maxPass === undefined ? {} : { maxPass }),
    ...(name === undefined ? {} : { name }),
    ...(number === undefined ? {} : { number }),
  };
  const inch = unit === 'in';
  switch (kind) {
    case 'straight':
      return { kind, diameter: inch ? 0.375 : 10, ...common };
    case 'vee':
      return { kind, includedAngle: 30, ...common };
    case 'tapered':
      return { kind, tipRadius: inch ? 0.0625 : 1.5, sideAngle: 1.5, ...common };
    case 'beading':
      return { kind, profileRadius: inch ? 0.09375 : 2.5, tipFlat: inch ? 0.03125 : 0.8, ...common };
  }
}
