/**
 * Starts of a cell that a spreadsheet takes for a formula and runs (OWASP, "CSV Injection"; from memory), with any
 * apostrophes before them, so that guarding can be undone whatever the text was.
 */
const FORMULA = /^'*[=+\-@\t\r\n＝＋－＠]/;

/** Text that a spreadsheet would run as a formula, made text again by an apostrophe before it. */
export const guardFormula = (text: string): string => (FORMULA.test(text) ? `'${text}` : text);

/** The text that was guarded; text that needed no guard stays as it is. */
export const unguardFormula = (text: string): string =>
  text.startsWith("'") && FORMULA.test(text) ? text.slice(1) : text;

/** One line of CSV after RFC 4180, with its line end; cells guarded against being run as formulas. */
export function writeCsvLine(cells: readonly string[]): string {
  const quoted = cells.map((cell) => {
    const safe = guardFormula(cell);
    return /[",\r\n]/.test(safe) ? `"${safe.replaceAll('"', '""')}"` : safe;
  });
  return `${quoted.join(',')}\r\n`;
}
