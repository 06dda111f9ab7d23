/** Letters of Windows-1252 at 0x80 to 0x9F (WHATWG Encoding Standard, index windows-1252); the rest are those of Latin-1. */
const LETTERS =
  '\u20ac\u0081\u201a\u0192\u201e\u2026\u2020\u2021\u02c6\u2030\u0160\u2039\u0152\u008d\u017d\u008f' +
  '\u0090\u2018\u2019\u201c\u201d\u2022\u2013\u2014\u02dc\u2122\u0161\u203a\u0153\u009d\u017e\u0178';

/** Text in Windows-1252. Not by TextDecoder: some releases of Node read the letters from 0x80 to 0x9F as Latin-1. */
export const decodeCp1252 = (bytes: Uint8Array): string =>
  Array.from(bytes, (byte) => (byte >= 0x80 && byte <= 0x9f ? LETTERS[byte - 0x80]! : String.fromCharCode(byte))).join(
    '',
  );
