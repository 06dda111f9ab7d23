import type { FoundProblem } from '../found-drawing.ts';
import { PLACES_KEPT } from './read-limits.ts';

interface Tally {
  count: number;
  readonly line: number | undefined;
  readonly tell: (count: number) => string;
}

/**
 * Problems of a drawing, however many there are of a kind: told one by one up to ten of a code, or counted, where only
 * the number matters, with the line of the first.
 */
export class ProblemList {
  readonly #told: FoundProblem[] = [];
  readonly #counts = new Map<string, number>();
  readonly #tallies = new Map<string, Tally>();

  add(code: string, message: string, line?: number): void {
    const count = (this.#counts.get(code) ?? 0) + 1;
    this.#counts.set(code, count);
    if (count <= PLACES_KEPT) this.#told.push(line === undefined ? { code, message } : { code, message, line });
  }

  /** Counts one more of a kind; `tell` makes its message in the end. */
  tally(code: string, tell: (count: number) => string, line?: number, times = 1): void {
    const known = this.#tallies.get(code);
    if (known) known.count += times;
    else this.#tallies.set(code, { count: times, line, tell });
  }

  /** All of them: told ones in the order they came, how many more there were, then the counted ones. */
  list(): FoundProblem[] {
    const out = [...this.#told];
    for (const [code, count] of this.#counts)
      if (count > PLACES_KEPT) out.push({ code, message: `And ${count - PLACES_KEPT} more of the same.` });
    for (const [code, { count, line, tell }] of this.#tallies)
      out.push(line === undefined ? { code, message: tell(count) } : { code, message: tell(count), line });
    return out;
  }
}
