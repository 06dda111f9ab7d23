import { frameOf, stack } from './frame-of.ts';
import type { Starter } from './starter.ts';

/**
 * The right-hand frame's edge stands against the face of the left-hand one. The left-hand frame's corner stile is its
 * filler: wider than the right-hand one's by the thickness of the board, so that both show the same width in the corner.
 */
const SIZES = {
  in: {
    left: { width: 25.25, past: 1.5 },
    right: { width: 29, past: 0.75 },
    side: 0.25,
    low: 0.5,
    reveal: { left: 0.75, right: 0.75, top: 1.5, bottom: 0.25, partition: 0 },
    rail: 1.5,
    drawer: 5,
  },
  mm: {
    left: { width: 648, past: 36 },
    right: { width: 737, past: 17 },
    side: 6,
    low: 14,
    reveal: { left: 21, right: 21, top: 40, bottom: 8, partition: 0 },
    rail: 40,
    drawer: 130,
  },
} as const;

export const cornerPairStarter: Starter = {
  id: 'corner-pair',
  name: 'Corner pair',
  line: 'Two base frames that meet in an inside corner, a drawer over a door each; the left one has a wide filler stile.',
  frames(unit, edge) {
    const s = SIZES[unit];
    const common = { partitions: undefined, reveal: s.reveal };
    const fill = [stack(s.rail, [['A', s.drawer], ['B']])];
    const level = { top: 0, bottom: s.low };
    return [
      frameOf(
        unit,
        {
          name: 'Corner, left',
          box: { ...common, width: s.left.width, overhang: { left: s.side, right: s.left.past, ...level } },
          fill,
        },
        edge,
      ),
      frameOf(
        unit,
        {
          name: 'Corner, right',
          box: { ...common, width: s.right.width, overhang: { left: s.right.past, right: s.side, ...level } },
          fill,
        },
        edge,
      ),
    ];
  },
};
