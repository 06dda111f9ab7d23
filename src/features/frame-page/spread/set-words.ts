import type { LineSet, SetName } from '#shared/kernel/line-sets/line-set.ts';
import { lineSetKey } from '#shared/kernel/line-sets/line-set.ts';
import { formatLength } from '#shared/kernel/units/format-length.ts';
import type { Unit } from '#shared/kernel/units/unit.ts';

const WORDS: Record<SetName, string> = {
  DADO: 'Dados',
  SQUARING: 'Squaring edge',
  BLANK: 'Blank',
  BEAD_INNER: 'Bead, opening side',
  BEAD_OUTER: 'Bead, frame side',
  QUIRK: 'Quirk',
  QUIRK_CORNER: 'Quirk corners',
  OPENING: 'Openings',
  OPENING_AXIS: 'Opening axis',
  CORNER_LIFT: 'Corner lift',
  CORNER_VEE: 'Corner V',
  PERIMETER: 'Perimeter',
};

/** One switch of a face's legend. */
export interface LegendEntry {
  readonly key: string;
  /** Place in cutting order; 0 when it is not cut. Both ways of saying the opening cut have one place. */
  readonly order: number;
  readonly words: string;
  readonly set: SetName;
}

/** What a line set is called, with its depth where there are several of the name. */
function wordsOf(lineSet: LineSet, several: boolean, unit: Unit): string {
  return several ? `${WORDS[lineSet.set]}, ${formatLength(lineSet.depth, unit)} deep` : WORDS[lineSet.set];
}

/** The legend of a face, in cutting order. */
export function legendOf(lineSets: readonly LineSet[], unit: Unit): LegendEntry[] {
  let order = 0;
  let before: SetName | null = null;
  return lineSets.map((lineSet) => {
    const sameCut = lineSet.set === 'OPENING_AXIS' && before === 'OPENING';
    if (lineSet.cutter !== null && !sameCut) order += 1;
    before = lineSet.set;
    const several = lineSets.filter((other) => other.set === lineSet.set).length > 1;
    return {
      key: lineSetKey(lineSet),
      order: lineSet.cutter === null ? 0 : order,
      words: wordsOf(lineSet, several, unit),
      set: lineSet.set,
    };
  });
}
