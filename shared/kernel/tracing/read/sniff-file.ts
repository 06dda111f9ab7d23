/** Why a file is not read as a DXF: a stable code, and what it is and what to export instead. */
export interface NotADxf {
  readonly code:
    | 'empty-file'
    | 'is-dwg'
    | 'is-pdf'
    | 'is-zip'
    | 'is-binary-dxf'
    | 'is-utf16'
    | 'is-svg'
    | 'is-html'
    | 'is-xml'
    | 'is-picture'
    | 'is-step'
    | 'not-a-dxf';
  readonly message: string;
}

const EXPORT = 'Export the drawing as an ASCII DXF, R12 or R2000 to R2018.';
/** Marks stand within this many bytes from the beginning. */
const LOOKED_AT = 4096;

const BINARY_MARKS: readonly (readonly [mark: string, code: NotADxf['code'], what: string])[] = [
  ['%PDF', 'is-pdf', 'This is a PDF.'],
  ['PK\x03\x04', 'is-zip', 'This is a zip archive. Take the DXF out of it.'],
  ['AutoCAD Binary DXF', 'is-binary-dxf', 'This is a binary DXF.'],
  ['\x89PNG', 'is-picture', 'This is a picture (PNG).'],
  ['\xff\xd8\xff', 'is-picture', 'This is a picture (JPEG).'],
  ['GIF8', 'is-picture', 'This is a picture (GIF).'],
  ['ISO-10303-21', 'is-step', 'This is a STEP file.'],
];

/**
 * Says what a file is when it is no ASCII DXF, by its first bytes; null when it may be one: its first line that is not
 * empty is a group code.
 */
export function sniffFile(bytes: Uint8Array): NotADxf | null {
  let head = '';
  for (let i = 0; i < Math.min(bytes.length, LOOKED_AT); i++) head += String.fromCharCode(bytes[i]!);
  const no = (code: NotADxf['code'], what: string): NotADxf => ({ code, message: `${what} ${EXPORT}` });
  if (isUtf16(head)) return no('is-utf16', 'This text is in UTF-16, which no DXF is.');
  const text = head.replace(/^\xef\xbb\xbf/, '').trimStart();
  if (text === '' && bytes.length <= LOOKED_AT) return no('empty-file', 'This file is empty.');
  if (/^AC\d{4}/.test(text) || text.startsWith('AC1.') || text.startsWith('AC2.'))
    return no('is-dwg', 'This is a DWG.');
  for (const [mark, code, what] of BINARY_MARKS) if (text.startsWith(mark)) return no(code, what);
  if (text.startsWith('<')) return sniffMarkup(text, no);
  if (/^-?\d{1,5}[ \t]*(\r|\n)/.test(text)) return null;
  return no('not-a-dxf', 'This is no DXF: it does not begin with a group code.');
}

function sniffMarkup(text: string, no: (code: NotADxf['code'], what: string) => NotADxf): NotADxf {
  if (/<svg[\s>:]/i.test(text) || /<!doctype svg/i.test(text)) return no('is-svg', 'This is an SVG.');
  if (/<(!doctype html|html|head|body)\b/i.test(text))
    return no('is-html', 'This is a web page; the download of the drawing may have failed.');
  return no('is-xml', 'This is an XML file.');
}

/** A byte order mark of UTF-16, or every other of the first bytes 0. */
function isUtf16(head: string): boolean {
  if (head.startsWith('\xff\xfe') || head.startsWith('\xfe\xff')) return true;
  const first = head.slice(0, 8);
  return first.length >= 4 && (/^(\0[^\0])+\0?$/.test(first) || /^([^\0]\0)+[^\0]?$/.test(first));
}
