/**
 * Breaks text into lines of at most `columns` characters (at least 1): at spaces, but not within a length such as
 * "30 1/2 in" where that can be helped; else after hyphens, slashes and underscores; within a word where it must.
 * Nothing is dropped but the spaces at the breaks. '' gives one empty line.
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

/** How many characters go on this line. */
function breakBefore(characters: readonly string[], width: number): number {
  let withinLength = 0;
  for (let i = width; i > 0; i--) {
    if (characters[i] !== ' ') continue;
    if (!isWithinLength(characters, i)) return i;
    withinLength ||= i;
  }
  for (let i = width; i > width / 3; i--)
    if ('-/_'.includes(characters[i - 1]!) && !/\d/.test(characters[i]!)) return i;
  return withinLength || width;
}

/** Whether the space at `i` stands between the parts of one length: "30 1/2", "30 in", "3/4 in". */
function isWithinLength(characters: readonly string[], i: number): boolean {
  return /\d/.test(characters[i - 1]!) && /^(\d+\/\d+|in|mm)\b/.test(characters.slice(i + 1, i + 8).join(''));
}

/** Characters as a reader counts them: code points. */
export const countCharacters = (text: string): number => Array.from(text).length;
