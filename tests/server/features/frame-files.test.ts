import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { frame as frameContract, frameFilesTaken, type FrameFilesTaken } from '../../../shared/contracts/frames.ts';
import { jobPage } from '../../../shared/contracts/jobs.ts';
import { LIMITS } from '../../../shared/contracts/limits.ts';
import { writeFrameFile } from '../../../shared/contracts/write-frame-file.ts';
import { aFrame } from '../../builders/particulars.ts';
import { addJob, expectStatus, openShop } from '../../builders/shops.ts';
import type { Answer, HttpClient } from '../../setup/http-client.ts';
import { allowSlowMachine } from '../../setup/slow-machine.ts';
import { startTestServer, type TestServer } from '../../setup/test-server.ts';

allowSlowMachine();

let server: TestServer;
let visitor: HttpClient;
beforeAll(async () => {
  server = await startTestServer();
  visitor = (await openShop(server)).visitor;
});
afterAll(() => server.close());

type Files = readonly (readonly [name: string, content: string | Uint8Array<ArrayBuffer>])[];

async function upload(files: Files, field = 'files'): Promise<{ answer: Answer; jobId: string }> {
  const { id: jobId } = await addJob(visitor);
  const form = new FormData();
  for (const [name, content] of files) form.append(field, new Blob([content]), name);
  return { answer: await visitor.send('POST', `/api/jobs/${jobId}/frame-files`, { body: form }), jobId };
}
const taken = async (files: Files): Promise<FrameFilesTaken & { jobId: string }> => {
  const { answer, jobId } = await upload(files);
  return { ...frameFilesTaken.parse(expectStatus(answer, 200).json()), jobId };
};
const namesIn = async (jobId: string) =>
  jobPage.parse((await visitor.get(`/api/jobs/${jobId}`)).json()).frames.map((f) => f.name);

describe('Uploading frame files', () => {
  it('When a file is good, then the frame is there, exactly as in the file', async () => {
    const particulars = aFrame({ name: 'From a file', 'outline.width': 31.015625 });
    const result = await taken([['Schränke.frame.json', `\uFEFF${writeFrameFile(particulars)}`]]);
    expect(result.taken).toMatchObject([{ file: 'Schränke.frame.json', name: 'From a file' }]);
    const frame = frameContract.parse((await visitor.get(`/api/frames/${result.taken[0]!.frameId}`)).json());
    expect(frame.particulars).toEqual(particulars);
  });

  it('When some files are bad, then the good ones are taken and each bad one is named with what is wrong', async () => {
    const bad = JSON.stringify({ ...aFrame({ thickness: -1 }), wood: 'oak' });
    const result = await taken([
      ['1.json', writeFrameFile(aFrame({ name: 'One' }))],
      ['2.json', '{ not json'],
      ['3.json', bad],
      ['4.json', ''],
      ['5.json', new Uint8Array([0x50, 0x4b, 3, 4, 0xff, 0xfe])],
      ['6.json', writeFrameFile(aFrame({ name: 'Six' }))],
    ]);
    expect(result.taken.map((t) => t.file)).toEqual(['1.json', '6.json']);
    expect(result.refused.map((r) => r.file)).toEqual(['2.json', '3.json', '4.json', '5.json']);
    expect(result.refused[1]!.fields.map((f) => f.path).sort()).toEqual(['thickness', 'wood']);
    expect(result.refused.map((r) => r.message)).toEqual([
      expect.stringContaining('not JSON'),
      expect.stringContaining('2 entries'),
      expect.stringContaining('empty'),
      expect.stringContaining('UTF-8'),
    ]);
    expect(await namesIn(result.jobId)).toEqual(['One', 'Six']);
  });

  it('When one file is too large, then only that one is refused', async () => {
    const result = await taken([
      ['large.json', 'x'.repeat(LIMITS.frameFileBytes + 1)],
      ['small.json', writeFrameFile(aFrame({ name: 'Small' }))],
    ]);
    expect(result.refused).toMatchObject([
      { file: 'large.json', message: expect.stringContaining(String(LIMITS.frameFileBytes)) as string },
    ]);
    expect(await namesIn(result.jobId)).toEqual(['Small']);
  });

  it('When there are too many files, or none, or in another field, then it says so and nothing is taken', async () => {
    const many = Array.from({ length: LIMITS.frameFilesAtOnce + 1 }, (_, i) => [`${i}.json`, '{}'] as const);
    for (const { answer, jobId } of [
      await upload(many),
      await upload([]),
      await upload([['a.json', '{}']], 'drawings'),
    ]) {
      expect(answer.status).toBe(400);
      expect(answer.json<{ fields: { takes: string }[] }>().fields[0]!.takes).toMatch(/files/);
      expect(await namesIn(jobId)).toEqual([]);
    }
  });

  it('When it is no form at all, then it says so', async () => {
    const { id } = await addJob(visitor);
    expect((await visitor.post(`/api/jobs/${id}/frame-files`, { files: [] })).status).toBe(400);
    const broken = await visitor.send('POST', `/api/jobs/${id}/frame-files`, {
      body: '--x\r\nbroken',
      headers: { 'Content-Type': 'multipart/form-data; boundary=x' },
    });
    expect(broken.status).toBe(400);
  });
});
