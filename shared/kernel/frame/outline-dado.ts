import type { Dado, DadoEnd } from '../particulars/particulars.ts';
import type { DadoOutline } from './dado-outline.ts';
import { dadoRelief } from './dado-relief.ts';

/** A dado as it is cut, frame view: as wide as panel and clearance, its ends moved as `ends` says. `radius` is the dado cutter's. */
export function outlineDado(dado: Dado, index: number, radius: number): DadoOutline {
  const longer: Record<DadoEnd, number> = { open: radius, stopped: dadoRelief(radius, dado.clearance), meets: 0 };
  const low = dado.at - dado.clearance / 2;
  const high = dado.at + dado.panel + dado.clearance / 2;
  const from = dado.from - longer[dado.ends[0]];
  const to = dado.to + longer[dado.ends[1]];
  return {
    id: `dado-${index}`,
    part: dado.part,
    index,
    extents:
      dado.runs === 'vertical'
        ? { minX: low, maxX: high, minY: from, maxY: to }
        : { minX: from, maxX: to, minY: low, maxY: high },
    depth: dado.depth,
  };
}
