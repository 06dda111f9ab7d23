import type { Unit } from '../units/unit.ts';
import type { EdgePreset } from './edge-preset.ts';

/**
 * Numbers of a beaded edge to begin from: the inch ones are the specification's example, the millimetre ones round
 * numbers near them. The quirk is as wide as tip flat and radius together, so that no scar is left beside it. Common
 * practice, no source.
 */
const BEAD = {
  in: { radius: 0.09375, drop: 0.01, tipFlat: 0.03125, quirk: 0.125, quirkCutter: 0.125, flute: 0.5 },
  mm: { radius: 2.5, drop: 0.25, tipFlat: 0.5, quirk: 3, quirkCutter: 3, flute: 12 },
} as const;

/** The edges that a shop begins with: square, and beaded. */
export function usualEdgePresets(unit: Unit): EdgePreset[] {
  const { radius, drop, tipFlat, quirk, quirkCutter, flute } = BEAD[unit];
  return [
    { name: 'Square', unit, edge: { style: 'square', sizeHeldAt: 'face' }, cutters: {} },
    {
      name: unit === 'in' ? 'Bead 3/32' : 'Bead 2.5',
      unit,
      edge: { style: 'beaded', sizeHeldAt: 'bead base', bead: { radius, drop, quirk } },
      cutters: {
        bead: { kind: 'beading', profileRadius: radius, tipFlat, fluteLength: flute },
        quirk: { kind: 'straight', diameter: quirkCutter, fluteLength: flute },
        corner: { kind: 'vee', includedAngle: 30, fluteLength: flute },
      },
    },
  ];
}
