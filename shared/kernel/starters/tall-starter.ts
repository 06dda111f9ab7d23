import { membersContours } from '../frame/members-contours.ts';
import type { Dado, MembersOutline, Particulars } from '../particulars/particulars.ts';
import { frameOf, stack } from './frame-of.ts';
import type { Starter } from './starter.ts';

const SIZES = {
  in: {
    width: 23.5,
    height: 83.75,
    panel: 0.75,
    past: 0.25,
    feet: 4,
    up: 4.5,
    reveal: { left: 0.75, right: 0.75, top: 0.75, bottom: 0.25, partition: 0 },
    rail: 1.5,
    upper: 24,
  },
  mm: {
    width: 588,
    height: 2124,
    panel: 18,
    past: 6,
    feet: 100,
    up: 110,
    reveal: { left: 21, right: 21, top: 21, bottom: 12, partition: 0 },
    rail: 40,
    upper: 600,
  },
} as const;

/** A fixed shelf between the ends, behind the middle of the mid-rail. */
function withShelf(particulars: Particulars): Particulars {
  const rail = membersContours(particulars.outline as MembersOutline, particulars.unit).contours.members.find(
    (m) => m.kind === 'mid-rail',
  );
  const bottom = particulars.dados.find((dado) => dado.part === 'Bottom');
  if (!rail || !bottom) throw new Error('starter: a shelf takes a mid-rail and a bottom');
  const at = (rail.extents.minY + rail.extents.maxY - bottom.panel) / 2;
  const shelf: Dado = { ...bottom, part: 'Fixed shelf', at };
  return { ...particulars, dados: [...particulars.dados, shelf] };
}

export const tallStarter: Starter = {
  id: 'tall',
  name: 'Tall',
  line: 'A pantry on feet: a short door over a long one, a fixed shelf behind the rail between.',
  frames(unit, edge) {
    const { width, height, panel, past, feet, up, reveal, rail, upper } = SIZES[unit];
    const box = {
      width,
      height,
      partitions: undefined,
      bottom: { thickness: panel, up },
      top: { kind: 'panel', thickness: panel, down: 0 },
      overhang: { left: past, right: past, top: past, bottom: 0 },
      reveal,
      feet,
    } as const;
    return [withShelf(frameOf(unit, { name: 'Tall', box, fill: [stack(rail, [['A', upper], ['B']])] }, edge))];
  },
};
