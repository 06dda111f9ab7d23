import type { Difference, LargestDifference } from '#shared/kernel/height-field/find-difference.ts';
import type { Unit } from '#shared/kernel/units/unit.ts';
import type { DrawnFrame } from '#shared/kernel/worked-frame.ts';

function featureWords({ contours, dados }: DrawnFrame, { of }: Difference): string {
  if (of === 'perimeter') return ' at the perimeter';
  const opening = contours.openings.find((o) => o.id === of);
  if (opening) return ` at opening ${opening.label}`;
  const dado = dados.find((d) => d.id === of);
  return dado ? ` at the dado of ${dado.part}` : '';
}

/** Digits of what was measured at samples: it is never exact, and is marked so. */
const DIGITS: Record<Unit, { readonly size: number; readonly place: number }> = {
  in: { size: 4, place: 2 },
  mm: { size: 2, place: 0 },
};

/** One difference in words: how much, what, where. */
export function differenceWords(worked: DrawnFrame, difference: Difference): string {
  const { unit, thickness } = worked.particulars;
  const { kind, off, x, y, depth, intended } = difference;
  const digits = DIGITS[unit];
  const size = (value: number) => `≈${value.toFixed(digits.size)}`;
  const place = (value: number) => `≈${value.toFixed(digits.place)}`;
  const deep = (z: number) => (z >= thickness ? 'through' : z === 0 ? 'not at all' : `${size(z)} deep`);
  const what = kind === 'left' ? 'of board left standing' : 'cut away too much';
  return `${size(off)} ${unit} ${what}${featureWords(worked, difference)}, at ${place(x)}, ${place(y)}: cut ${deep(depth)}, ${intended === 0 ? 'not meant to be' : `meant to be ${deep(intended)}`}`;
}

/** The least difference that is told, half of the last digit shown. */
const leastOff = (unit: Unit): number => 0.5 * 10 ** -DIGITS[unit].size;

/** The largest differences of a face that show in the digits said, the greater first. */
export function sortDifferences({ left, cut }: LargestDifference, unit: Unit): Difference[] {
  return [left, cut]
    .filter((d) => d !== null && d.off >= leastOff(unit))
    .sort((a, b) => b!.off - a!.off) as Difference[];
}

/** What is said where there is none. */
export const noDifferenceWords = (unit: Unit): string =>
  `Less than ${leastOff(unit).toFixed(DIGITS[unit].size + 1)} ${unit} off everywhere.`;
