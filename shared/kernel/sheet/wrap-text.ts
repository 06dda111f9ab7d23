/**
 * Breaks text into lines of at most `columns` characters (at least 1), at spaces, after hyphens, slashes and
 * underscores where it can, within a word where it must. Nothing is dropped but the spaces at the breaks. '' gives one empty line.
 */
export function wrapText(text: string, columns: number): string[] {
  const width = Math.max(1, Math.floor(columns));
  const lines: string[] = [];
  for (const paragraph of text.split('\n')) {
    let rest = Array.from(paragraph.trim());
    while (rest.length > width) {
      const cut = breakBefore(rest, width);
      lines.push(rest.slice(0, cut).join('').trimEnd());
      rest = Array.from(rest.slice(cut).join('').trimStart());
    }
    lines.push(rest.join(''));
  }
  return lines;
}

/** How many characters go on this line: up to the last good break in the first `width` + 1, else `width`. */
function breakBefore(characters: readonly string[], width: number): number {
  for (let i = width; i > 0; i--) {
    if (characters[i] === ' ') return i;
    if (i < width + 1 && i > width / 3 && '-/_'.includes(characters[i - 1]!) && characters[i - 1] !== undefined) return i;
  }
  return width;
}

/** Characters as a reader counts them: code points. */
export const countCharacters = (text: string): number => Array.from(text).length;
