/** Characters that RFC 8187 lets stand in an extended value, as they are. */
const ATTR_CHAR = /[A-Za-z0-9!#$&+.^_`|~-]/;

const percent = (name: string): string =>
  [...new TextEncoder().encode(name)]
    .map((byte) => {
      const char = String.fromCharCode(byte);
      return byte < 128 && ATTR_CHAR.test(char) ? char : `%${byte.toString(16).toUpperCase().padStart(2, '0')}`;
    })
    .join('');

/**
 * Content-Disposition for a file name (RFC 6266): plain for any reader, and in UTF-8 (RFC 8187, formerly 5987) where the
 * plain one cannot say it. Path separators, quotes and control characters never get out.
 */
export function contentDisposition(kind: 'attachment' | 'inline', fileName: string): string {
  const name = fileName.replace(/[/\\]/g, '-').replace(/\p{Cc}/gu, '');
  const plain = name
    .normalize('NFKD')
    .replace(/\p{M}/gu, '')
    .replace(/[^\x20-\x7e]/g, '_')
    .replace(/["%]/g, '_');
  return plain === name
    ? `${kind}; filename="${plain}"`
    : `${kind}; filename="${plain}"; filename*=UTF-8''${percent(name)}`;
}
