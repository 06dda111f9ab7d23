import { passDepths } from '../cutters/pass-depths.ts';
import { mergeDados } from '../frame/merge-dados.ts';
import type { DadoOutline } from '../frame/dado-outline.ts';
import type { Particulars } from '../particulars/particulars.ts';
import type { Unit } from '../units/unit.ts';
import type { LineSet, Shape } from './line-set.ts';

/** A depth within a layer name: thousandths of an inch, hundredths of a millimetre. 'D0250' is 0.250 in. */
function depthVariant(depth: number, unit: Unit): string {
  return `D${String(Math.round(depth * (unit === 'in' ? 1000 : 100))).padStart(4, '0')}`;
}

/** Dados by depth, shallow ones first. */
const byDepth = (dados: readonly DadoOutline[]): Map<number, DadoOutline[]> => {
  const groups = new Map<number, DadoOutline[]>();
  for (const dado of dados) groups.set(dado.depth, [...(groups.get(dado.depth) ?? []), dado]);
  return new Map([...groups].sort(([a], [b]) => a - b));
};

/** One line set for each depth of dado, shallow ones first, touching dados merged; frame view. */
export function dadoLineSets({ unit, cutters }: Particulars, dados: readonly DadoOutline[]): LineSet[] {
  const groups = byDepth(dados);
  return [...groups].map(([depth, group]) => ({
    face: 'back',
    set: 'DADO',
    variant: groups.size > 1 ? depthVariant(depth, unit) : '',
    cutter: 'dado',
    side: 'inside',
    depth,
    passes: passDepths(depth, cutters.dado.maxPass),
    shapes: mergeDados(group).flatMap(({ contours, of }) => contours.map((contour): Shape => ({ kind: 'contour', contour, of }))),
  }));
}
