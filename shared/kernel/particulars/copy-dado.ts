import type { Dado, Particulars } from './particulars.ts';

/**
 * The dados with a copy of the one at `index` right after it, two panels further along so that the two do not
 * touch, and with a name of its own. Throws when there is none at `index`.
 */
export function copyDado(particulars: Particulars, index: number): readonly Dado[] {
  const dado = particulars.dados[index];
  if (dado === undefined) throw new Error(`no dado at ${index}`);
  const stem = dado.part.replace(/ \d+$/, '');
  const names = new Set(particulars.dados.map((d) => d.part));
  let n = 2;
  while (names.has(`${stem} ${n}`)) n += 1;
  return particulars.dados.toSpliced(index + 1, 0, { ...dado, part: `${stem} ${n}`, at: dado.at + 2 * dado.panel });
}
