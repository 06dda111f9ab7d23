import { frameOf, stack } from './frame-of.ts';
import type { Starter } from './starter.ts';

const SIZES = {
  in: {
    width: 47.5,
    height: 31,
    depth: 20.25,
    panel: 0.75,
    side: 0.25,
    feet: 4,
    up: 4.5,
    reveal: { left: 0.75, right: 0.75, top: 1.5, bottom: 0.25, partition: 0.375 },
    partitions: [12.875, 33.875],
    rail: 1.5,
    drawer: 5,
  },
  mm: {
    width: 1188,
    height: 790,
    depth: 510,
    panel: 18,
    side: 6,
    feet: 100,
    up: 110,
    reveal: { left: 21, right: 21, top: 40, bottom: 12, partition: 11 },
    partitions: [330, 840],
    rail: 40,
    drawer: 130,
  },
} as const;

export const vanityStarter: Starter = {
  id: 'vanity',
  name: 'Vanity',
  line: 'On feet: three drawers on either side of a wide opening for the basin.',
  frames(unit, edge) {
    const s = SIZES[unit];
    const drawers = (top: string, middle: string, low: string) => stack(s.rail, [[top, s.drawer], [middle], [low]]);
    const box = {
      width: s.width,
      height: s.height,
      depth: s.depth,
      bottom: { thickness: s.panel, up: s.up },
      partitions: { thickness: s.panel, places: { kind: 'given', at: s.partitions } },
      overhang: { left: s.side, right: s.side, top: 0, bottom: 0 },
      reveal: s.reveal,
      feet: s.feet,
    } as const;
    return [
      frameOf(
        unit,
        { name: 'Vanity', box, fill: [drawers('A', 'B', 'C'), { opening: { label: 'D' } }, drawers('E', 'F', 'G')] },
        edge,
      ),
    ];
  },
};
