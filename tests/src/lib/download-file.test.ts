import { describe, expect, it, vi } from 'vitest';
import { downloadFile, nameFromDisposition } from '../../../src/lib/download-file.ts';
import { answerCalls, json } from '../answer-calls.ts';

describe('nameFromDisposition', () => {
  // RFC 6266, section 5: examples of both parameters.
  it.each([
    ['attachment; filename="kitchen_B33_rev-A.zip"', 'kitchen_B33_rev-A.zip'],
    ['attachment; filename=plain.pdf', 'plain.pdf'],
    ['attachment; filename="EURO rates"; filename*=UTF-8\'\'%e2%82%ac%20rates', '€ rates'],
    [null, undefined],
  ])('When the header is %s, then the name is %s', (header, name) => {
    expect(nameFromDisposition(header)).toBe(name);
  });
});

describe('downloadFile', () => {
  it('When the server sends a file, then the browser is handed its bytes under its name', async () => {
    answerCalls(
      () => new Response('zip bytes', { headers: { 'content-disposition': 'attachment; filename="set.zip"' } }),
    );
    const saved: { name: string; blob: Blob }[] = [];
    let kept: Blob | undefined;
    vi.stubGlobal('URL', {
      createObjectURL: (blob: Blob) => ((kept = blob), 'blob:set'),
      revokeObjectURL: () => undefined,
    });
    const click = vi.spyOn(HTMLAnchorElement.prototype, 'click').mockImplementation(function (this: HTMLAnchorElement) {
      if (kept) saved.push({ name: this.download, blob: kept });
    });
    const counted: number[] = [];
    const result = await downloadFile({
      path: '/api/set.zip',
      signal: new AbortController().signal,
      onBytes: (n) => counted.push(n),
    });
    expect(result).toEqual({ name: 'set.zip', bytes: 9 });
    expect(counted.at(-1)).toBe(9);
    expect(saved.map(({ name, blob }) => [name, blob.size])).toEqual([['set.zip', 9]]);
    click.mockRestore();
  });

  it('When the server refuses, then nothing is saved and the refusal is an ApiError', async () => {
    answerCalls(() => json({ code: 'proof-failed', message: 'withheld' }, 422));
    const click = vi.spyOn(HTMLAnchorElement.prototype, 'click');
    await expect(downloadFile({ path: '/api/set.zip', signal: new AbortController().signal })).rejects.toMatchObject({
      code: 'proof-failed',
    });
    expect(click).not.toHaveBeenCalled();
    click.mockRestore();
  });
});
