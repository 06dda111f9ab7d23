import type { Face, SetName } from '#shared/kernel/line-sets/line-set.ts';
import type { Rgb } from '../sweeping/picture.ts';
import type { Step } from './steps.ts';

const TOKENS = ['paper', 'ink', 'board', 'board-light', 'back', 'front', 'bead', 'lift'] as const;
type Token = (typeof TOKENS)[number];

/** The product's colours as the style sheet has them. */
export type Tokens = Readonly<Record<Token, Rgb>>;

/** Reads the style sheet's tokens off the page. Throws when one is missing or no six-digit colour. */
export function readTokens(): Tokens {
  const style = getComputedStyle(document.documentElement);
  const read = (token: Token): [Token, Rgb] => {
    const text = style.getPropertyValue(`--color-${token}`).trim();
    const digits = /^#([0-9a-f]{2})([0-9a-f]{2})([0-9a-f]{2})$/i.exec(text);
    if (!digits) throw new Error(`--color-${token}: got "${text}", takes a colour of six digits`);
    return [token, [digits[1]!, digits[2]!, digits[3]!].map((pair) => parseInt(pair, 16)) as unknown as Rgb];
  };
  return Object.fromEntries(TOKENS.map(read)) as Tokens;
}

const FAMILIES: Record<SetName, Token> = {
  DADO: 'back',
  SQUARING: 'back',
  BLANK: 'ink',
  BEAD_INNER: 'bead',
  BEAD_OUTER: 'bead',
  QUIRK: 'bead',
  QUIRK_CORNER: 'lift',
  OPENING: 'front',
  OPENING_AXIS: 'front',
  CORNER_LIFT: 'lift',
  CORNER_VEE: 'lift',
  PERIMETER: 'ink',
};

/** How much of the token the board takes on: by place among steps of one colour, so that neighbours differ. */
const SHARES = [0.62, 0.4, 0.52, 0.3] as const;
/** The step that was taken last stands out. */
const LAST_SHARE = 0.88;

const mix = (a: Rgb, b: Rgb, share: number): Rgb =>
  [0, 1, 2].map((i) => Math.round(a[i]! + (b[i]! - a[i]!) * share)) as unknown as Rgb;

/** The colour of each step's surfaces; `last` is the place of the step that stands out, −1 for none. */
export function stepColours(steps: readonly Step[], last: number, tokens: Tokens): Rgb[] {
  const seen = new Map<Token, number>();
  return steps.map((step, i) => {
    const family = FAMILIES[step.set];
    const nth = seen.get(family) ?? 0;
    seen.set(family, nth + 1);
    return mix(tokens.board, tokens[family], i === last ? LAST_SHARE : SHARES[nth % SHARES.length]!);
  });
}

/** Colours of one face by who cut there: the untouched board first, then the face's layers in cutting order. */
export function facePalette(face: Face, steps: readonly Step[], colours: readonly Rgb[], tokens: Tokens): Rgb[] {
  return [tokens['board-light'], ...steps.flatMap((step, i) => (step.face === face ? [colours[i]!] : []))];
}

export const hexOf = (rgb: Rgb): string => `#${rgb.map((value) => value.toString(16).padStart(2, '0')).join('')}`;
