import { openingParts } from './layout-parts.ts';
import type { LayoutPart } from './particulars.ts';

/** 0 → A, 25 → Z, 26 → AA. */
const letters = (n: number): string =>
  (n < 26 ? '' : letters(Math.floor(n / 26) - 1)) + String.fromCharCode(65 + (n % 26));

/** The first of A, B, C … that no opening of the layout carries as its label. */
export function nextLabel(layout: LayoutPart): string {
  const taken = new Set(openingParts(layout).map((part) => part.opening.label));
  let n = 0;
  while (taken.has(letters(n))) n += 1;
  return letters(n);
}
