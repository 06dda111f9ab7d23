import { parseLength } from '../units/parse-length.ts';
import type { Unit } from '../units/unit.ts';

/** Size of one column or row of openings, in the frame's unit; `*` shares what is left equally. */
export type Share = number | '*';

export type ParsedShares =
  { readonly ok: true; readonly shares: readonly Share[] } | { readonly ok: false; readonly takes: string };

/** Most columns and most rows of a frame: as many as a frame may have openings. */
const MOST = 100;

const TAKES = 'a whole number such as 3, or sizes with + between them and * for what is left, such as 12 + * + 12';

/**
 * Reads how openings are divided: a number of equal ones, `3`, or their sizes, `12 + * + 12 1/2`. One size alone is refused,
 * since it would be read as a number of openings.
 */
export function parseShares(text: string, unit: Unit): ParsedShares {
  if (/^\d+$/.test(text)) {
    const count = Number(text);
    return count >= 1 && count <= MOST
      ? { ok: true, shares: Array.from({ length: count }, () => '*' as const) }
      : { ok: false, takes: `a whole number from 1 to ${MOST}` };
  }
  const parts = text.split('+').map((part) => part.trim());
  if (parts.length < 2 || parts.length > MOST) return { ok: false, takes: TAKES };
  const shares: Share[] = [];
  for (const part of parts) {
    const parsed = parseLength(part, unit);
    if (part === '*') shares.push('*');
    else if (parsed.ok && parsed.value > 0) shares.push(parsed.value);
    else return { ok: false, takes: TAKES };
  }
  return { ok: true, shares };
}
