import { decodeText, type TextEncoding } from './decode-text.ts';
import { parseNumber } from './parse-number.ts';
import type { FilePlace, TagReader } from './tag-reader.ts';

export interface FileHeader {
  /** Code of the drawing unit, $INSUNITS; null when it is not said. */
  readonly insertUnits: number | null;
  /** $MEASUREMENT: 0 for inches, 1 for metric; null when it is not said. */
  readonly measurement: number | null;
  readonly encoding: TextEncoding;
  /** A code page that we have no table of; its names are read as Windows-1252. */
  readonly unknownCodePage: string | null;
}

/** Versions from here on are UTF-8 whatever they say of code pages (DXF Reference of 2007). */
const FIRST_UTF8_VERSION = 1021;

/** WHATWG names of the code pages that files may name. */
const CODE_PAGES: Readonly<Record<string, TextEncoding>> = {
  ANSI_874: 'windows-874',
  ANSI_932: 'shift_jis',
  ANSI_936: 'gbk',
  ANSI_949: 'euc-kr',
  ANSI_950: 'big5',
  ...Object.fromEntries(
    [1250, 1251, 1252, 1253, 1254, 1255, 1256, 1257, 1258].map((n) => [`ANSI_${n}`, `windows-${n}`]),
  ),
  'UTF-8': 'utf-8',
  UTF8: 'utf-8',
};

/** Reads what matters of the header variables (DXF Reference, HEADER section); the first of a name counts. */
export function readHeader(reader: TagReader, places: readonly FilePlace[]): FileHeader {
  const said = new Map<string, string>();
  for (const place of places) {
    reader.goTo(place);
    let name = '';
    while (reader.next() && reader.code !== 0) {
      const text = () => decodeText(reader.bytes, reader.start, reader.end, 'windows-1252');
      if (reader.code === 9) name = text().toUpperCase();
      else if (WANTED.has(name) && !said.has(name)) said.set(name, text());
    }
  }
  const version = Number(/^AC(\d+)$/i.exec(said.get('$ACADVER') ?? '')?.[1] ?? NaN);
  const page = said.get('$DWGCODEPAGE')?.toUpperCase() ?? '';
  const hasMark = reader.bytes[0] === 0xef && reader.bytes[1] === 0xbb;
  const named = CODE_PAGES[page];
  // Without a word of either, letters that are no UTF-8 are taken for Windows-1252 one by one.
  const isUtf8 = hasMark || version >= FIRST_UTF8_VERSION || page === '';
  return {
    insertUnits: wholeOrNull(said.get('$INSUNITS')),
    measurement: wholeOrNull(said.get('$MEASUREMENT')),
    encoding: isUtf8 ? 'utf-8' : (named ?? 'windows-1252'),
    unknownCodePage: !isUtf8 && named === undefined ? page : null,
  };
}

const WANTED: ReadonlySet<string> = new Set(['$ACADVER', '$DWGCODEPAGE', '$INSUNITS', '$MEASUREMENT']);

function wholeOrNull(text: string | undefined): number | null {
  if (text === undefined) return null;
  const bytes = Uint8Array.from(text, (letter) => letter.charCodeAt(0));
  const value = parseNumber(bytes, 0, bytes.length);
  return Number.isInteger(value) ? value : null;
}
