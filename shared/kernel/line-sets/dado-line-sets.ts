import { passDepths } from '../cutters/pass-depths.ts';
import { mergeDados } from '../frame/merge-dados.ts';
import type { DadoOutline } from '../frame/dado-outline.ts';
import type { Particulars } from '../particulars/particulars.ts';
import { SAME_DEPTH } from '../tolerances.ts';
import type { Unit } from '../units/unit.ts';
import type { LineSet, Shape } from './line-set.ts';

/**
 * Depths within layer names: thousandths of an inch, hundredths of a millimetre ('D0250' is 0.250 in), and more digits
 * where those do not tell them apart. One depth needs no name.
 */
function depthVariants(depths: readonly number[], unit: Unit): string[] {
  if (depths.length <= 1) return depths.map(() => '');
  for (let digits = unit === 'in' ? 3 : 2; ; digits++) {
    const names = depths.map((depth) => `D${String(Math.round(depth * 10 ** digits)).padStart(digits + 1, '0')}`);
    if (new Set(names).size === names.length) return names;
  }
}

/** Dados by depth, shallow ones first. */
function byDepth(dados: readonly DadoOutline[]): { depth: number; group: DadoOutline[] }[] {
  const groups: { depth: number; group: DadoOutline[] }[] = [];
  for (const dado of dados.toSorted((a, b) => a.depth - b.depth)) {
    const last = groups.at(-1);
    if (last && dado.depth - last.depth < SAME_DEPTH) last.group.push(dado);
    else groups.push({ depth: dado.depth, group: [dado] });
  }
  return groups;
}

/** One line set for each depth of dado, shallow ones first, touching dados merged; frame view. */
export function dadoLineSets({ unit, cutters }: Particulars, dados: readonly DadoOutline[]): LineSet[] {
  const groups = byDepth(dados);
  const variants = depthVariants(
    groups.map((g) => g.depth),
    unit,
  );
  return groups.map(({ depth, group }, i) => ({
    face: 'back',
    set: 'DADO',
    variant: variants[i]!,
    cutter: 'dado',
    side: 'inside',
    depth,
    passes: passDepths(depth, cutters.dado.maxPass),
    shapes: mergeDados(group).flatMap(({ contours, of }) =>
      contours.map((contour): Shape => ({ kind: 'contour', contour, of })),
    ),
  }));
}
