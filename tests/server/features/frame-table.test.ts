import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { FRAME_TABLE_LIMITS, frameTableAdded } from '../../../shared/contracts/frame-table.ts';
import { frame as frameContract } from '../../../shared/contracts/frames.ts';
import { jobPage } from '../../../shared/contracts/jobs.ts';
import { parseFrameTable } from '../../../shared/contracts/parse-frame-table.ts';
import { sampleFrameTable } from '../../../shared/kernel/frame-table/sample-frame-table.ts';
import type { Particulars } from '../../../shared/kernel/particulars/particulars.ts';
import { framesStore } from '../../../server/features/frames/frames.store.ts';
import { aFrame } from '../../builders/particulars.ts';
import { addFrame, addJob, addPerson, expectStatus, openShop, type SignedInVisitor } from '../../builders/shops.ts';
import type { HttpClient } from '../../setup/http-client.ts';
import { allowSlowMachine } from '../../setup/slow-machine.ts';
import { startTestServer, type TestServer } from '../../setup/test-server.ts';

allowSlowMachine();

let server: TestServer;
let shop: SignedInVisitor;
let visitor: HttpClient;
beforeAll(async () => {
  server = await startTestServer();
  shop = await openShop(server);
  visitor = shop.visitor;
});
afterAll(() => server.close());

const kitchen = (unit: 'in' | 'mm' = 'in'): Particulars[] =>
  parseFrameTable(sampleFrameTable(unit)).rows.map(({ particulars }) => particulars!);
const add = (jobId: string, frames: readonly unknown[]) => visitor.post(`/api/jobs/${jobId}/frame-table`, { frames });
const rowsIn = async (jobId: string) => jobPage.parse((await visitor.get(`/api/jobs/${jobId}`)).json()).frames;
const csvOf = async (jobId: string, by = visitor) => {
  const answer = expectStatus(await by.get(`/api/jobs/${jobId}/frames.csv`), 200);
  return { answer, text: new TextDecoder('utf-8', { ignoreBOM: true }).decode(answer.bytes) };
};

describe('Adding the frames of a table', () => {
  it('When all are good, then they stand in the job in the order of the table, exactly as sent', async () => {
    const { id } = await addJob(visitor);
    const frames = kitchen();
    const added = frameTableAdded.parse(expectStatus(await add(id, frames), 201).json());
    expect(added.frames.map(({ name }) => name)).toEqual(frames.map(({ name }) => name));
    const rows = await rowsIn(id);
    expect(rows.map((row) => row.id)).toEqual(added.frames.map((frame) => frame.id));
    expect(rows[2]).toMatchObject({ name: 'B36 doors and drawers', width: 36, height: 30.5, openings: 4 });
    for (const [i, row] of rows.entries()) {
      const frame = frameContract.parse((await visitor.get(`/api/frames/${row.id}`)).json());
      expect(frame.particulars).toEqual(frames[i]);
      expect(frame).toMatchObject({ version: 1, changedBy: 'Owner', draftChanged: true, revisions: [] });
    }
  });

  it('When one of them is wrong, then it is named by its place and none is added', async () => {
    const { id } = await addJob(visitor);
    const answer = await add(id, [aFrame(), { ...aFrame(), thickness: -1 }, aFrame()]);
    expect(answer.status).toBe(400);
    expect(answer.json()).toMatchObject({ code: 'invalid-input', fields: [{ path: 'frames.1.thickness', got: '-1' }] });
    expect(await rowsIn(id)).toEqual([]);
  });

  it('When the database refuses the last of them, then none of those before it stays', async () => {
    const { id: jobId } = await addJob(visitor);
    const shopId = shop.session.shop.id;
    const drafts = ['first', 'second', 'first'].map((id) => ({
      frame: { id, shopId, jobId },
      draft: {
        particulars: aFrame(),
        figures: { width: 33, height: 30.5, openings: 2, stops: 0, cautions: 0, notes: 0 },
        draftChanged: true,
        changedAt: new Date(0),
        changedBy: 'Owner',
      },
    }));
    await expect(framesStore(server.database).addAll(drafts)).rejects.toThrow();
    expect(await rowsIn(jobId)).toEqual([]);
    await framesStore(server.database).addAll(drafts.slice(0, 2));
    expect((await rowsIn(jobId)).map(({ id }) => id)).toEqual(['first', 'second']);
  });

  it('When a name is in the job already, then the frame is added beside it, as a single frame is', async () => {
    const { id } = await addJob(visitor);
    await addFrame(visitor, id, aFrame({ name: 'B33' }));
    expectStatus(await add(id, [aFrame({ name: 'B33' })]), 201);
    expect((await rowsIn(id)).map(({ name }) => name)).toEqual(['B33', 'B33']);
  });

  it('When there are none, or more than a table takes, then it says how many it takes', async () => {
    const { id } = await addJob(visitor);
    const none = (await add(id, [])).json<{ fields: object[] }>();
    expect(none.fields).toMatchObject([{ path: 'frames', takes: 'at least one frame' }]);
    const most = FRAME_TABLE_LIMITS.frames;
    const many = (await add(id, Array(most + 1).fill(aFrame()))).json<{ fields: object[] }>();
    expect(many.fields).toMatchObject([{ path: 'frames', takes: `at most ${most} frames` }]);
    expectStatus(await add(id, Array(most).fill(kitchen()[6])), 201);
    expect(await rowsIn(id)).toHaveLength(most);
  });
});

describe('Downloading the table of a job', () => {
  it('When it is read again, then it gives the same frames, in the order of the job', async () => {
    const { id } = await addJob(visitor, 'Fenwick Lane ½');
    const frames = [...kitchen('in'), ...kitchen('mm')];
    expectStatus(await add(id, frames), 201);
    const { answer, text } = await csvOf(id);
    expect(answer.headers.get('content-type')).toBe('text/csv; charset=utf-8');
    expect(answer.headers.get('content-disposition')).toContain('Fenwick-Lane-1-2_frames.csv');
    // A byte order mark: without it spreadsheets take UTF-8 for another code page (common practice, no source).
    expect(text.startsWith('\uFEFFname,unit,width,height,')).toBe(true);
    expect(parseFrameTable(text).rows.map(({ particulars }) => particulars)).toEqual(frames);
  });

  it('When a frame was put away, then it is not in it; the draft is, not the revision', async () => {
    const { id } = await addJob(visitor);
    const [first, second] = [await addFrame(visitor, id), await addFrame(visitor, id, aFrame({ name: 'Second' }))];
    await visitor.send('PATCH', `/api/frames/${first.id}`, { body: { removed: true } });
    const change = { version: 1, particulars: aFrame({ name: 'Second', 'outline.width': 35 }) };
    expectStatus(await visitor.send('PUT', `/api/frames/${second.id}/draft`, { body: change }), 200);
    const lines = (await csvOf(id)).text.trim().split('\r\n');
    expect(lines).toHaveLength(2);
    expect(lines[1]).toMatch(/^Second,in,35,/);
  });

  it('When the job is empty, then there is a header row to fill in below', async () => {
    const { id } = await addJob(visitor);
    expect((await csvOf(id)).text).toMatch(/^\uFEFFname,unit,[^\n]*remark\r\n$/);
  });

  it('When an operator asks, then they may have it', async () => {
    const { id } = await addJob(visitor);
    const operator = await addPerson(server, shop.session.shop.id, 'operator');
    expect((await csvOf(id, operator.visitor)).text).toContain('name,unit');
  });
});
