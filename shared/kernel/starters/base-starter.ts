import { frameOf, stack } from './frame-of.ts';
import type { Starter } from './starter.ts';

const SIZES = {
  in: {
    width: 35.5,
    reveal: { left: 0.75, right: 0.75, top: 1.5, bottom: 0.25, partition: 0.375 },
    rail: 1.5,
    drawer: 5,
  },
  mm: { width: 888, reveal: { left: 21, right: 21, top: 40, bottom: 8, partition: 11 }, rail: 40, drawer: 130 },
} as const;

export const baseStarter: Starter = {
  id: 'base',
  name: 'Base',
  line: 'Two drawers over two doors with a partition between, open above for a counter.',
  frames(unit, edge) {
    const s = SIZES[unit];
    const column = (drawer: string, door: string) => stack(s.rail, [[drawer, s.drawer], [door]]);
    const box = { width: s.width, reveal: s.reveal };
    return [frameOf(unit, { name: 'Base', box, fill: [column('A', 'B'), column('C', 'D')] }, edge)];
  },
};
