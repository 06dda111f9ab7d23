import { execFileSync } from 'node:child_process';
import { mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import JSZip from 'jszip';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { parseFrameFile } from '../../../shared/contracts/parse-frame-file.ts';
import { aFrame, aFrameWithStop } from '../../builders/particulars.ts';
import { addFrame, addJob, expectStatus, openShop, openShopWithFrame, releaseFrame } from '../../builders/shops.ts';
import type { Answer } from '../../setup/http-client.ts';
import { allowSlowMachine } from '../../setup/slow-machine.ts';
import { startTestServer, type TestServer } from '../../setup/test-server.ts';

allowSlowMachine();

let server: TestServer;
beforeAll(async () => void (server = await startTestServer()));
afterAll(() => server.close());

async function filesIn(answer: Answer): Promise<Map<string, Uint8Array>> {
  const zip = await JSZip.loadAsync(answer.bytes);
  const files = new Map<string, Uint8Array>();
  for (const entry of Object.values(zip.files)) if (!entry.dir) files.set(entry.name, await entry.async('uint8array'));
  return files;
}

/** What coreutils' sha256sum says of the files of a layer set. */
function sha256sum(files: Map<string, Uint8Array>): string {
  const folder = mkdtempSync(join(tmpdir(), 'stilepost-sums-'));
  try {
    for (const [name, bytes] of files) writeFileSync(join(folder, name), bytes);
    return execFileSync('sha256sum', ['-c', 'SHA256SUMS'], { cwd: folder, encoding: 'utf8' });
  } finally {
    rmSync(folder, { recursive: true });
  }
}

const isPdf = (answer: Answer) => new TextDecoder('latin1').decode(answer.bytes.slice(0, 5)) === '%PDF-';

describe('Downloading a layer set', () => {
  it('When a revision is downloaded, then the zip has its six files, and its sums check', async () => {
    const { visitor, frame } = await openShopWithFrame(server, aFrame({ name: 'Base 33' }));
    await releaseFrame(visitor, frame);
    const answer = expectStatus(await visitor.get(`/api/frames/${frame.id}/revisions/A/layer-set.zip`), 200);
    expect(answer.headers.get('content-type')).toBe('application/zip');
    expect(answer.headers.get('content-disposition')).toBe('attachment; filename="Job_Base-33_rev-A.zip"');
    const files = await filesIn(answer);
    expect([...files.keys()].sort()).toEqual([
      'Base-33_rev-A.frame.json',
      'Base-33_rev-A_back.dxf',
      'Base-33_rev-A_front.dxf',
      'SHA256SUMS',
      'layers.csv',
      'setup-sheet.pdf',
    ]);
    expect(sha256sum(files).match(/: OK$/gm)).toHaveLength(5);
    const frozen = await visitor.get(`/api/frames/${frame.id}/revisions/A/frame-file`);
    expect(files.get('Base-33_rev-A.frame.json')).toEqual(frozen.bytes);
    const sheet = await visitor.get(`/api/frames/${frame.id}/revisions/A/setup-sheet.pdf`);
    expect(sheet.headers.get('content-type')).toBe('application/pdf');
    expect(sheet.headers.get('content-disposition')).toBe('inline; filename="Job_Base-33_rev-A_setup-sheet.pdf"');
    expect(sheet.bytes).toEqual(files.get('setup-sheet.pdf'));
  });

  it('When it is downloaded again, later and after the draft went on, then the bytes are the same', async () => {
    const { visitor, frame } = await openShopWithFrame(server);
    await releaseFrame(visitor, frame);
    const path = `/api/frames/${frame.id}/revisions/A/layer-set.zip`;
    const first = await visitor.get(path);
    server.wait(3600);
    expectStatus(
      await visitor.put(`/api/frames/${frame.id}/draft`, {
        version: 1,
        particulars: aFrame({ 'setup.allowance': 1.5 }),
      }),
      200,
    );
    expect((await visitor.get(path)).bytes).toEqual(first.bytes);
  });

  it('When a profile is asked for, then the files follow it; without one they follow the default of the shop', async () => {
    const { visitor, frame } = await openShopWithFrame(server);
    await releaseFrame(visitor, frame);
    const path = `/api/frames/${frame.id}/revisions/A/layer-set.zip`;
    const dxf = async (query = '') => {
      const files = await filesIn(expectStatus(await visitor.get(`${path}${query}`), 200));
      return new TextDecoder().decode([...files].find(([name]) => name.endsWith('_back.dxf'))![1]);
    };
    // DXF Reference, HEADER section: $ACADVER is AC1021 for R2007 and AC1009 for R12.
    expect(await dxf()).toContain('AC1021');
    expect(await dxf('?profile=r12')).toContain('AC1009');
    expectStatus(await visitor.patch('/api/shop', { defaultProfileId: 'r12' }), 200);
    expect(await dxf()).toContain('AC1009');
    expect((await visitor.get(`${path}?profile=nonsense`)).status).toBe(404);
  });

  it('When the name is in another script, then the header is safe and readable all the same', async () => {
    const { visitor, frame } = await openShopWithFrame(server, aFrame({ name: 'Küche "links" / 厨房' }));
    const answer = await visitor.get(`/api/frames/${frame.id}/draft/frame-file`);
    expect(answer.headers.get('content-disposition')).toMatch(
      /^attachment; filename="[\x20-\x7e]+_draft\.frame\.json"$/,
    );
    expect(parseFrameFile(new TextDecoder().decode(answer.bytes))).toEqual({
      ok: true,
      particulars: frame.particulars,
    });
  });

  it('When the draft has a stop, then its setup sheet is still there to look at', async () => {
    const { visitor, frame } = await openShopWithFrame(server, aFrameWithStop());
    const answer = expectStatus(await visitor.get(`/api/frames/${frame.id}/draft/setup-sheet.pdf`), 200);
    expect(isPdf(answer)).toBe(true);
  });

  it('When nothing was released, then there is no layer set', async () => {
    const { visitor, frame, job } = await openShopWithFrame(server);
    expect((await visitor.get(`/api/frames/${frame.id}/revisions/A/layer-set.zip`)).status).toBe(404);
    const whole = await visitor.get(`/api/jobs/${job.id}/layer-sets.zip`);
    expect(whole.status).toBe(404);
    expect(whole.json().message).toContain('released');
  });

  it('When a whole job is downloaded, then each released frame has its folder, with the newest revision', async () => {
    const { visitor } = await openShop(server);
    const job = await addJob(visitor, 'Kitchen');
    const one = await addFrame(visitor, job.id, aFrame({ name: 'One' }));
    const two = await addFrame(visitor, job.id, aFrame({ name: 'Two', 'setup.allowance': 1.25 }));
    await addFrame(visitor, job.id, aFrame({ name: 'Draft only' }));
    const away = await addFrame(visitor, job.id, aFrame({ name: 'Put away' }));
    for (const frame of [one, two, away]) await releaseFrame(visitor, frame);
    expectStatus(await visitor.patch(`/api/frames/${away.id}`, { removed: true }), 200);
    expectStatus(
      await visitor.put(`/api/frames/${two.id}/draft`, {
        version: 1,
        particulars: aFrame({ name: 'Two', 'setup.allowance': 1.5 }),
      }),
      200,
    );
    await releaseFrame(visitor, { id: two.id, version: 2 });

    const files = await filesIn(expectStatus(await visitor.get(`/api/jobs/${job.id}/layer-sets.zip`), 200));
    const names = [...files.keys()];
    expect(
      names
        .filter((n) => n.endsWith('_back.dxf'))
        .map((n) => n.split('/').pop())
        .sort(),
    ).toEqual(['One_rev-A_back.dxf', 'Two_rev-B_back.dxf']);
    expect(names.some((n) => !n.includes('/') && n.endsWith('.pdf'))).toBe(true);
  });
});

describe('While files are made', () => {
  it('When twenty layer sets are asked for at once, then other requests are answered meanwhile', async () => {
    const { visitor, frame } = await openShopWithFrame(server);
    await releaseFrame(visitor, frame);
    const began = performance.now();
    let done = false;
    const downloads = Promise.all(
      Array.from({ length: 20 }, () => visitor.get(`/api/frames/${frame.id}/revisions/A/layer-set.zip`)),
    ).finally(() => (done = true));
    const waits: number[] = [];
    while (!done) {
      const asked = performance.now();
      expect((await visitor.get('/healthz')).status).toBe(200);
      waits.push(performance.now() - asked);
    }
    const whole = performance.now() - began;
    expect((await downloads).map((a) => a.status)).toEqual(Array(20).fill(200));
    // If the files were made on the thread that answers, the first of these would have waited for all of them.
    expect(waits.length).toBeGreaterThan(5);
    expect(Math.max(...waits)).toBeLessThan(whole / 2);
  });

  it('When more is asked for than can wait, then the rest is told to come back', async () => {
    const { visitor, frame } = await openShopWithFrame(server);
    await releaseFrame(visitor, frame);
    const answers = await Promise.all(
      Array.from({ length: 80 }, () => visitor.get(`/api/frames/${frame.id}/draft/setup-sheet.pdf`)),
    );
    const counts = {
      made: answers.filter((a) => a.status === 200).length,
      later: answers.filter((a) => a.status === 429).length,
    };
    expect(counts.made + counts.later).toBe(80);
    expect(counts.later).toBeGreaterThan(0);
    expect(counts.made).toBeGreaterThanOrEqual(64);
  });
});
