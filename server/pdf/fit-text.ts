import { CHARACTER_WIDTH } from '#shared/kernel/sheet/paper-picture.ts';
import { countCharacters, wrapText } from '#shared/kernel/sheet/wrap-text.ts';

export const LINE_HEIGHT = 1.3;

export interface FittedText {
  readonly lines: readonly string[];
  readonly size: number;
}

/**
 * Text broken into lines at the largest of `sizes` (falling, millimetres) at which it stays within width × height.
 * Text too long for the least of them is cut, with "…" to say so.
 */
export function fitText(text: string, width: number, height: number, sizes: readonly number[]): FittedText {
  const at = (size: number) => wrapText(text, width / (CHARACTER_WIDTH * size));
  const rows = (size: number) => Math.max(1, Math.floor(height / (size * LINE_HEIGHT)));
  for (const size of sizes) {
    const lines = at(size);
    if (lines.length <= rows(size)) return { lines, size };
  }
  const size = sizes[sizes.length - 1]!;
  const lines = at(size).slice(0, rows(size));
  const last = lines[lines.length - 1]!;
  const columns = Math.max(1, Math.floor(width / (CHARACTER_WIDTH * size)));
  lines[lines.length - 1] = `${
    countCharacters(last) < columns
      ? last
      : Array.from(last)
          .slice(0, columns - 1)
          .join('')
  }…`;
  return { lines, size };
}
