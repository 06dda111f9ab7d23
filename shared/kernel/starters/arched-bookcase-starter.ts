import { frameOf } from './frame-of.ts';
import type { Starter } from './starter.ts';

/** The box's top lies above the crown of the arches, so that the rail hides it. */
const SIZES = {
  in: {
    width: 35.5,
    height: 84,
    depth: 11.25,
    panel: 0.75,
    side: 0.25,
    up: 4,
    down: 2,
    reveal: { left: 0.75, right: 0.75, top: 0.75, bottom: 0.25, partition: 0.375 },
    arch: 4,
  },
  mm: {
    width: 888,
    height: 2100,
    depth: 281,
    panel: 18,
    side: 6,
    up: 100,
    down: 50,
    reveal: { left: 21, right: 21, top: 22, bottom: 7, partition: 11 },
    arch: 100,
  },
} as const;

export const archedBookcaseStarter: Starter = {
  id: 'arched-bookcase',
  name: 'Arched bookcase',
  line: 'Two tall open bays with arched heads over a plinth-high bottom rail, a partition between.',
  frames(unit, edge) {
    const { width, height, depth, panel, side, up, down, reveal, arch } = SIZES[unit];
    const box = {
      width,
      height,
      depth,
      bottom: { thickness: panel, up },
      top: { kind: 'panel', thickness: panel, down },
      overhang: { left: side, right: side, top: 0, bottom: 0 },
      reveal,
    } as const;
    const bay = (label: string) => ({ opening: { label, arch } });
    return [frameOf(unit, { name: 'Arched bookcase', box, fill: [bay('A'), bay('B')] }, edge)];
  },
};
