import { decodeCp1252 } from '../../csv/decode-cp1252.ts';

/** How a file's letters are kept: UTF-8, or one of the code pages of older files by their WHATWG name. */
export type TextEncoding = 'utf-8' | 'windows-1252' | (string & {});

/** A name may be this long; more is cut off, so that one endless name does not fill the census. */
const LONGEST_NAME = 255;

const ESCAPE = /\\U\+([0-9a-fA-F]{4})/g;

/**
 * The text between two places of a file. Bytes that are no UTF-8 in a file that should be are taken for Windows-1252;
 * `\U+XXXX` becomes the letter it names (DXF Reference, text of older files). At most 255 letters.
 */
export function decodeText(bytes: Uint8Array, start: number, end: number, encoding: TextEncoding): string {
  const stop = Math.min(end, start + 8 * LONGEST_NAME);
  const raw = asciiOf(bytes, start, stop) ?? decodeLetters(bytes.subarray(start, stop), encoding);
  const text = raw.includes('\\U+')
    ? raw.replace(ESCAPE, (_, code: string) => String.fromCharCode(parseInt(code, 16)))
    : raw;
  return text.length > LONGEST_NAME ? text.slice(0, LONGEST_NAME) : text;
}

function asciiOf(bytes: Uint8Array, start: number, end: number): string | null {
  let text = '';
  for (let at = start; at < end; at++) {
    const byte = bytes[at]!;
    if (byte > 127) return null;
    text += String.fromCharCode(byte);
  }
  return text;
}

function decodeLetters(bytes: Uint8Array, encoding: TextEncoding): string {
  if (encoding === 'windows-1252') return decodeCp1252(bytes);
  try {
    return new TextDecoder(encoding, { fatal: true }).decode(bytes);
  } catch (error) {
    // TypeError: not letters of this encoding.
    if (error instanceof TypeError) return decodeCp1252(bytes);
    throw error;
  }
}
