// A spreadsheet takes a cell that starts so for a formula and runs it; an apostrophe makes it text again
// (OWASP, "CSV Injection").
const FORMULA = /^[=+\-@\t\r]/;

/** One line of CSV after RFC 4180, with its line end. Cells that a spreadsheet would run as a formula become text. */
export function csvLine(cells: readonly string[]): string {
  const quoted = cells.map((cell) => {
    const safe = FORMULA.test(cell) ? `'${cell}` : cell;
    return /[",\r\n]/.test(safe) ? `"${safe.replaceAll('"', '""')}"` : safe;
  });
  return `${quoted.join(',')}\r\n`;
}
