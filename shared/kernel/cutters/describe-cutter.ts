import { formatWithUnit } from '../units/format-length.ts';
import type { Unit } from '../units/unit.ts';
import type { Cutter } from './cutter.ts';

/** A cutter's shape in words and numbers: "tapered, tip radius 1/16 in, 1.5° a side". */
export function describeCutter(cutter: Cutter, unit: Unit): string {
  switch (cutter.kind) {
    case 'straight':
      return `straight, diameter ${formatWithUnit(cutter.diameter, unit)}`;
    case 'vee':
      return `V, ${cutter.includedAngle}° included`;
    case 'tapered':
      return `tapered, tip radius ${formatWithUnit(cutter.tipRadius, unit)}, ${cutter.sideAngle}° a side`;
    case 'beading':
      return `beading, profile radius ${formatWithUnit(cutter.profileRadius, unit)}, tip flat ${formatWithUnit(cutter.tipFlat, unit)}`;
  }
}
