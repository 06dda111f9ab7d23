import { describe, expect, it } from 'vitest';
import { contentDisposition } from '../../../server/http/content-disposition.ts';

// Forms after RFC 6266 section 4.1 and RFC 8187 section 3.2; the percent-encoded example is that of RFC 8187 section 3.2.3.
describe('contentDisposition', () => {
  it('When the name is plain, then it stands as it is', () => {
    expect(contentDisposition('attachment', 'B33_rev-A.zip')).toBe('attachment; filename="B33_rev-A.zip"');
  });

  it('When the name has other letters, then a plain one is sent beside the true one', () => {
    expect(contentDisposition('inline', '£ and € rates')).toBe(
      'inline; filename="_ and _ rates"; filename*=UTF-8\'\'%C2%A3%20and%20%E2%82%AC%20rates',
    );
    expect(contentDisposition('inline', 'Küche.pdf')).toContain('filename="Kuche.pdf"');
  });

  it.each(['a"b', 'a\r\nSet-Cookie: x', '../../etc/passwd', 'a\\b', 'a%41', 'a;b', "it's"])(
    'When the name is %j, then nothing breaks out of it',
    (name) => {
      const header = contentDisposition('attachment', name);
      expect(header).toMatch(/^attachment; filename="[^"%/\\\r\n]*"(; filename\*=UTF-8''[A-Za-z0-9!#$&+.^_`|~%-]*)?$/);
    },
  );
});
