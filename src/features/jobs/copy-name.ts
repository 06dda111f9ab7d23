import { LIMITS } from '#shared/contracts/limits.ts';

/** A name for a copy that none of `taken` has: "B33 copy", "B33 copy 2" …; shortened to what the contract takes. */
export function copyName(name: string, taken: readonly string[]): string {
  const base = name.replace(/ copy( \d+)?$/, '');
  for (let n = 1; ; n++) {
    const end = n === 1 ? ' copy' : ` copy ${n}`;
    const candidate = base.slice(0, LIMITS.nameLength - end.length) + end;
    if (!taken.includes(candidate)) return candidate;
  }
}
