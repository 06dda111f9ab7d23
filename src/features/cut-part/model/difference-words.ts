import type { Difference, LargestDifference } from '#shared/kernel/height-field/find-difference.ts';
import { formatLength, formatWithUnit } from '#shared/kernel/units/format-length.ts';
import type { WorkedFrame } from '#shared/kernel/worked-frame.ts';

function featureWords({ contours, dados }: WorkedFrame, { of }: Difference): string {
  if (of === 'perimeter') return ' at the perimeter';
  const opening = contours.openings.find((o) => o.id === of);
  if (opening) return ` at opening ${opening.label}`;
  const dado = dados.find((d) => d.id === of);
  return dado ? ` at the dado of ${dado.part}` : '';
}

/** One difference in words: how much, what, where. */
export function differenceWords(worked: WorkedFrame, difference: Difference): string {
  const { unit, thickness } = worked.particulars;
  const { kind, off, x, y, depth, intended } = difference;
  const deep = (z: number) => (z >= thickness ? 'through' : formatLength(z, unit));
  const what = kind === 'left' ? 'of board left standing' : 'cut away too much';
  return `${formatWithUnit(off, unit)} ${what}${featureWords(worked, difference)}, at ${formatLength(x, unit)}, ${formatLength(y, unit)}: cut ${deep(depth)}, meant ${deep(intended)}`;
}

/** The largest differences of a face, the greater first; empty when there are none above rounding. */
export const sortDifferences = ({ left, cut }: LargestDifference): Difference[] => [left, cut].filter((d) => d !== null).sort((a, b) => b.off - a.off);
