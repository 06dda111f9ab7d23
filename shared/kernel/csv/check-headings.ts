import type { CellProblem } from './cell-problem.ts';

/**
 * What is wrong with a header row: columns that are not known, that stand twice, that are missing. `headings` are its
 * cells trimmed and in small letters; none when a table of this kind can be read by them.
 */
export function checkHeadings(
  line: number,
  headings: readonly string[],
  known: readonly string[],
  needed: readonly string[],
): CellProblem[] {
  const strange = headings.filter((heading) => !known.includes(heading));
  const twice = headings.filter((heading, i) => known.includes(heading) && headings.indexOf(heading) < i);
  const missing = needed.filter((heading) => !headings.includes(heading));
  return [
    ...strange.map((heading) => ({
      line,
      column: heading === '' ? 'without a heading' : heading,
      got: 'a column that is not known',
      takes: known.join(', '),
    })),
    ...twice.map((heading) => ({ line, column: heading, got: 'this column twice', takes: 'each column once' })),
    ...missing.map((heading) => ({ line, column: heading, got: 'no such column', takes: 'this column' })),
  ];
}
