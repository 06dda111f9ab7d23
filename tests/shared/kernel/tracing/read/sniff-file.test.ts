import { describe, expect, test } from 'vitest';
import { sniffFile } from '#shared/kernel/tracing/read/sniff-file.ts';
import { bytesOf, dxfText, latinBytes, line } from './dxf-text.ts';

const utf16 = (text: string, mark: string, low: boolean): Uint8Array =>
  latinBytes(mark + [...text].map((letter) => (low ? `${letter}\0` : `\0${letter}`)).join(''));

const dxf = dxfText({ entities: line(0, 0, 1, 0) });

describe('When a file is no ASCII DXF', () => {
  // First bytes as the formats' own specifications have them.
  test.each([
    ['nothing', new Uint8Array(0), 'empty-file'],
    ['empty lines', bytesOf('\r\n \n'), 'empty-file'],
    ['a DWG', latinBytes('AC1027\0\0\0\0'), 'is-dwg'],
    ['a PDF', bytesOf('%PDF-1.7\n'), 'is-pdf'],
    ['a zip', latinBytes('PK\x03\x04\x14\0'), 'is-zip'],
    ['a binary DXF', latinBytes('AutoCAD Binary DXF\r\n\x1a\0'), 'is-binary-dxf'],
    ['UTF-16 with a mark, low byte first', utf16(dxf, '\xff\xfe', true), 'is-utf16'],
    ['UTF-16 with a mark, high byte first', utf16(dxf, '\xfe\xff', false), 'is-utf16'],
    ['UTF-16 without a mark', utf16(dxf, '', true), 'is-utf16'],
    ['an SVG', bytesOf('<?xml version="1.0"?>\n<!-- x -->\n<svg xmlns="http://www.w3.org/2000/svg"/>'), 'is-svg'],
    ['an SVG with a byte order mark', bytesOf('\ufeff<svg width="1">'), 'is-svg'],
    ['a web page', bytesOf('\n<!DOCTYPE html><html><body>Sign in</body></html>'), 'is-html'],
    ['other XML', bytesOf('<?xml version="1.0"?><part/>'), 'is-xml'],
    ['a PNG', latinBytes('\x89PNG\r\n\x1a\n'), 'is-picture'],
    ['a JPEG', latinBytes('\xff\xd8\xff\xe0'), 'is-picture'],
    ['a STEP file', bytesOf('ISO-10303-21;\nHEADER;'), 'is-step'],
    ['a letter', bytesOf('Dear shop,\n'), 'not-a-dxf'],
    ['zeros', new Uint8Array(100), 'not-a-dxf'],
  ] as const)('then %s is named, and what to export instead', (_, bytes, code) => {
    expect(sniffFile(bytes)).toMatchObject({ code, message: expect.stringMatching(/^This .*ASCII DXF/s) });
  });

  test.each([
    ['as usual', dxf],
    ['with spaces before the code', `  ${dxf}`],
    ['with a byte order mark', `\ufeff${dxf}`],
    ['with CR', dxf.replaceAll('\n', '\r')],
    ['with CR CR LF', dxf.replaceAll('\n', '\r\r\n')],
    ['with a comment first', `999\nmade by hand\n${dxf}`],
    ['with empty lines first', `\r\n\r\n${dxf}`],
  ])('then a DXF %s is let through', (_, text) => {
    expect(sniffFile(bytesOf(text))).toBeNull();
  });
});
