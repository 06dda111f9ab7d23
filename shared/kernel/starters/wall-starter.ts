import { frameOf } from './frame-of.ts';
import type { Starter } from './starter.ts';

const SIZES = {
  in: {
    width: 29.5,
    height: 35,
    depth: 11.25,
    panel: 0.75,
    overhang: { left: 0.25, right: 0.25, top: 0.5, bottom: 0.5 },
    reveal: { left: 0.75, right: 0.75, top: 0.5, bottom: 0.5, partition: 0.375 },
    dado: { depth: 0.25, clearance: 0.01 },
  },
  mm: {
    width: 748,
    height: 876,
    depth: 281,
    panel: 18,
    overhang: { left: 6, right: 6, top: 12, bottom: 12 },
    reveal: { left: 21, right: 21, top: 15, bottom: 15, partition: 11 },
    dado: { depth: 6, clearance: 0.3 },
  },
} as const;

export const wallStarter: Starter = {
  id: 'wall',
  name: 'Wall',
  line: 'Two doors with a partition; the frame stands past the box all round and its dados are stopped, so that none shows from below.',
  frames(unit, edge) {
    const { width, height, depth, panel, overhang, reveal, dado } = SIZES[unit];
    const box = {
      width,
      height,
      depth,
      reveal,
      overhang,
      top: { kind: 'panel', thickness: panel, down: 0 },
      dado: { ...dado, run: 'stopped' },
    } as const;
    return [
      frameOf(unit, { name: 'Wall', box, fill: [{ opening: { label: 'A' } }, { opening: { label: 'B' } }] }, edge),
    ];
  },
};
