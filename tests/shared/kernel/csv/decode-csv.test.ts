import { describe, expect, test } from 'vitest';
import { decodeCsv } from '#shared/kernel/csv/decode-csv.ts';
import { sniffSeparator } from '#shared/kernel/csv/sniff-separator.ts';

const bytes = (...all: number[]) => Uint8Array.from(all);

describe('When the bytes of a CSV file are decoded', () => {
  test('then UTF-8 is read as it is', () => {
    expect(decodeCsv(new TextEncoder().encode('Küche ½ €'))).toEqual({ ok: true, text: 'Küche ½ €', letters: 'utf-8' });
  });

  // WHATWG Encoding Standard, index windows-1252: 0x80 is the euro sign, 0x93 and 0x94 curly quotes, 0xFC ü, 0xBD ½.
  test('then what is no UTF-8 is read as Windows-1252, and says so', () => {
    const text = bytes(0x4b, 0xfc, 0x63, 0x68, 0x65, 0x20, 0x80, 0x93, 0x94, 0xbd);
    expect(decodeCsv(text)).toEqual({ ok: true, text: 'Küche €“”½', letters: 'windows-1252' });
  });

  test.each([
    ['an empty file', bytes()],
    ['a spreadsheet’s own file or a zip', bytes(0x50, 0x4b, 3, 4, 20)],
    ['a spreadsheet’s own file of an older kind', bytes(0xd0, 0xcf, 0x11, 0xe0, 0xa1)],
    ['a PDF', new TextEncoder().encode('%PDF-1.7')],
    ['text in UTF-16', bytes(0xff, 0xfe, 0x6e, 0)],
    ['text in UTF-16', bytes(0xfe, 0xff, 0, 0x6e)],
    ['a file that is no text', bytes(0x6e, 0, 0x61)],
  ])('then %s is refused by what it is', (got, file) => {
    expect(decodeCsv(file)).toEqual({ ok: false, got, takes: 'a CSV file: save the table as “CSV UTF-8”' });
  });
});

describe('When the separator of a table is looked for', () => {
  const known = ['name', 'unit', 'width'];

  test.each([
    ['name,unit,width', ','],
    ['\n\n"Name";unit;width\na,b;c', ';'],
    ['name\tunit,\twidth', '\t'],
    ['name', ','],
    ['something else', ','],
    ['', ','],
  ])('then %j is parted by %j', (text, separator) => {
    expect(sniffSeparator(text, known)).toBe(separator);
  });
});
