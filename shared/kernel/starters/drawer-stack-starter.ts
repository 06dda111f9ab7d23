import { frameOf, stack } from './frame-of.ts';
import type { Starter } from './starter.ts';

const SIZES = {
  in: { width: 17.5, reveal: { left: 0.75, right: 0.75, top: 1.5, bottom: 0.25, partition: 0 }, rail: 1.5, drawer: 5 },
  mm: { width: 438, reveal: { left: 21, right: 21, top: 40, bottom: 8, partition: 0 }, rail: 40, drawer: 125 },
} as const;

export const drawerStackStarter: Starter = {
  id: 'drawer-stack',
  name: 'Drawer stack',
  line: 'Four drawers one above another: a shallow one on top, three alike below.',
  frames(unit, edge) {
    const s = SIZES[unit];
    const box = { width: s.width, partitions: undefined, reveal: s.reveal };
    return [
      frameOf(unit, { name: 'Drawer stack', box, fill: [stack(s.rail, [['A', s.drawer], ['B'], ['C'], ['D']])] }, edge),
    ];
  },
};
