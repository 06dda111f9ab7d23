import type { Cutter } from '../cutters/cutter.ts';
import { tidyLength } from '../box/tidy-length.ts';
import { convertLength } from '../units/convert-length.ts';
import type { Unit } from '../units/unit.ts';

/**
 * A cutter's numbers in another unit, without the noise of the multiplication: 3/8 in is 9.525 mm. Angles, name and
 * number stay; the same unit gives the very same cutter back.
 */
export function convertCutter(cutter: Cutter, from: Unit, to: Unit): Cutter {
  if (from === to) return cutter;
  const length = (value: number): number => tidyLength(convertLength(value, from, to));
  const common = {
    fluteLength: length(cutter.fluteLength),
    ...(cutter.maxPass === undefined ? {} : { maxPass: length(cutter.maxPass) }),
    ...(cutter.name === undefined ? {} : { name: cutter.name }),
    ...(cutter.number === undefined ? {} : { number: cutter.number }),
  };
  switch (cutter.kind) {
    case 'straight':
      return { kind: cutter.kind, diameter: length(cutter.diameter), ...common };
    case 'vee':
      return { kind: cutter.kind, includedAngle: cutter.includedAngle, ...common };
    case 'tapered':
      return { kind: cutter.kind, tipRadius: length(cutter.tipRadius), sideAngle: cutter.sideAngle, ...common };
    case 'beading':
      return {
        kind: cutter.kind,
        profileRadius: length(cutter.profileRadius),
        tipFlat: length(cutter.tipFlat),
        ...common,
      };
  }
}
