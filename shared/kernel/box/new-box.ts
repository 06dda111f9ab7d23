import type { Unit } from '../units/unit.ts';
import type { Box } from './box.ts';

/** Numbers of a box to begin from, in each unit: round numbers of the trade, common practice, no source. */
const USUAL = {
  in: {
    width: 32.5,
    height: 30,
    depth: 23.25,
    panel: 0.75,
    overhang: 0.25,
    low: 0.5,
    reveal: 0.75,
    top: 1.75,
    partition: 0.375,
    dado: 0.25,
    clearance: 0.01,
  },
  mm: {
    width: 828,
    height: 761,
    depth: 580,
    panel: 18,
    overhang: 6,
    low: 14,
    reveal: 21,
    top: 45,
    partition: 11,
    dado: 6,
    clearance: 0.3,
  },
} as const;

/** The box behind the two-door base frame of new-frame.ts, to begin from: a partition in the middle, no top. */
export function newBox(unit: Unit, name: string): Box {
  const u = USUAL[unit];
  return {
    name,
    unit,
    width: u.width,
    height: u.height,
    depth: u.depth,
    ends: { thickness: u.panel },
    bottom: { thickness: u.panel, up: 0 },
    partitions: { thickness: u.panel, places: { kind: 'equal openings', count: 1 } },
    overhang: { left: u.overhang, right: u.overhang, top: 0, bottom: u.low },
    reveal: { left: u.reveal, right: u.reveal, top: u.top, bottom: 0, partition: u.partition },
    feet: 0,
    dado: { depth: u.dado, clearance: u.clearance, run: 'open' },
    letIn: 0,
  };
}
