import { describe, expect, it } from 'vitest';
import { z } from 'zod';
import { uploadFile } from '../../../src/lib/upload-file.ts';
import { takeUploads } from '../fake-upload.ts';

function begin() {
  const begun = takeUploads();
  const control = new AbortController();
  const sent: number[] = [];
  const answered = uploadFile({
    path: '/api/jobs/j1/tracings',
    field: 'file',
    file: new File(['0'], 'a.dxf'),
    answer: z.object({ id: z.string() }),
    signal: control.signal,
    onSent: (done) => sent.push(done),
  });
  return { answered, control, sent, upload: begun[0]! };
}

describe('uploadFile', () => {
  it('When the file goes, then it says which share has gone, and answers what the server does', async () => {
    const { answered, sent, upload } = begin();
    upload.progress(25, 100);
    upload.progress(100, 100);
    upload.answer(201, { id: 't1' });
    expect(await answered).toEqual({ id: 't1' });
    expect(sent).toEqual([0.25, 1]);
    expect([upload.path, upload.sent?.name]).toEqual(['/api/jobs/j1/tracings', 'a.dxf']);
  });

  it('When the server refuses it, then its code and message come as an error', async () => {
    const { answered, upload } = begin();
    upload.answer(413, { code: 'too-large', message: 'a.dxf is larger than 32 MB.' });
    await expect(answered).rejects.toMatchObject({
      status: 413,
      code: 'too-large',
      message: 'a.dxf is larger than 32 MB.',
    });
  });

  it('When the answer is none that the contract knows, then it says so', async () => {
    const { answered, upload } = begin();
    upload.answer(201, '<html>');
    await expect(answered).rejects.toMatchObject({ code: 'unexpected-answer' });
  });

  it('When nothing answers, then the server is unreachable', async () => {
    const { answered, upload } = begin();
    upload.fail();
    await expect(answered).rejects.toMatchObject({ status: 0, code: 'unreachable' });
  });

  it('When it is cancelled, then the upload stops and an abort is thrown', async () => {
    const { answered, control, upload } = begin();
    control.abort();
    expect(upload.aborted).toBe(true);
    await expect(answered).rejects.toMatchObject({ name: 'AbortError' });
  });
});
