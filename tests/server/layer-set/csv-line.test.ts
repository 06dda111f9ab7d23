import { describe, expect, test } from 'vitest';
import { csvLine } from '../../../server/layer-set/csv-line.ts';

describe('When cells become a line of CSV', () => {
  // RFC 4180, section 2: quotes about commas, quotes and line ends; quotes doubled; lines end with CRLF.
  test.each([
    [['a', 'b c', ''], 'a,b c,\r\n'],
    [['a,b', 'say "x"', 'two\nlines'], '"a,b","say ""x""","two\nlines"\r\n'],
  ])('then they are quoted after RFC 4180: %j', (cells, line) => expect(csvLine(cells)).toBe(line));

  // OWASP, "CSV Injection": cells that begin with = + - @, tab or carriage return.
  test.each(['=1+1', '+1', '-1', '@SUM(A1)', '\t=1', '\r=1'])('then %j cannot run as a formula', (cell) => {
    expect(csvLine([cell]).replace(/^"/, '').startsWith("'")).toBe(true);
  });
});
