/** What is written out in words because the fonts have no sign for it. */
const IN_WORDS: Record<string, string> = {
  '≤': 'at most ',
  '≥': 'at least ',
  '→': ' to ',
  '√': 'root of ',
  '∅': 'diameter ',
  '⌀': 'diameter ',
  '‐': '-',
  '‑': '-',
  '\u00a0': ' ',
  '\u2009': ' ',
  '\u202f': ' ',
  '\t': ' ',
};

/** Stands for a character that the sheet cannot print, so that nobody takes the rest for the whole. */
export const UNPRINTABLE = '[?]';

/** Drawn from other signs, see draw-text.ts. */
export const DRAWN_SIGNS = new Set(['≈']);

/** Joiners, direction marks and variation selectors print nothing. */
const SILENT = /[\u200b-\u200f\u202a-\u202e\u2060\ufe00-\ufe0f\ufeff]|\p{Cc}/u;

/** Text as the sheet can print it: signs that the fonts lack are spelled out or stand as [?]. Line breaks stay. */
export function printableText(text: string, has: (codePoint: number) => boolean): string {
  let out = '';
  for (const character of text.normalize('NFC')) {
    if (character === '\n' || DRAWN_SIGNS.has(character)) out += character;
    else if (IN_WORDS[character] !== undefined) out += IN_WORDS[character];
    else if (SILENT.test(character)) continue;
    else out += has(character.codePointAt(0)!) ? character : UNPRINTABLE;
  }
  return out.replace(/ {2,}/g, ' ');
}

/** A value with every string in it made printable; everything else stays as it is. */
export function printableDeep<T>(value: T, has: (codePoint: number) => boolean): T {
  if (typeof value === 'string') return printableText(value, has) as T;
  if (Array.isArray(value)) return value.map((v: unknown) => printableDeep(v, has)) as T;
  if (value === null || typeof value !== 'object') return value;
  return Object.fromEntries(Object.entries(value).map(([key, v]) => [key, printableDeep(v, has)])) as T;
}
