import { createHash } from 'node:crypto';
import { eq, sql } from 'drizzle-orm';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { frame as frameContract, releaseRefused, revisionPage, type Frame } from '../../../shared/contracts/frames.ts';
import { frames, revisions } from '../../../server/db/schema.ts';
import { aFrame, aFrameWithCaution, aFrameWithStop } from '../../builders/particulars.ts';
import { addPerson, expectStatus, openShopWithFrame, releaseFrame } from '../../builders/shops.ts';
import type { HttpClient } from '../../setup/http-client.ts';
import { allowSlowMachine } from '../../setup/slow-machine.ts';
import { startTestServer, type TestServer } from '../../setup/test-server.ts';

allowSlowMachine();

let server: TestServer;
beforeAll(async () => void (server = await startTestServer()));
afterAll(() => server.close());

const release = (visitor: HttpClient, frame: Pick<Frame, 'id' | 'version'>, more: object = {}) =>
  visitor.post(`/api/frames/${frame.id}/revisions`, { version: frame.version, note: '', ...more });
const codeOf = (answer: { json<T>(): T }) => answer.json<{ code: string }>().code;

/** A change that makes no finding: 1 in is what the frame has. */
async function change(visitor: HttpClient, frame: Frame, allowance: number): Promise<Frame> {
  expectStatus(
    await visitor.put(`/api/frames/${frame.id}/draft`, {
      version: frame.version,
      particulars: aFrame({ 'setup.allowance': allowance }),
    }),
    200,
  );
  return frameContract.parse((await visitor.get(`/api/frames/${frame.id}`)).json());
}

describe('Releasing a revision', () => {
  it('When a draft is released, then it is A, with author, time, note and the SHA-256 of its file', async () => {
    const { visitor, frame, session, job } = await openShopWithFrame(server);
    const answer = expectStatus(await release(visitor, frame, { note: 'First issue' }), 201);
    const after = frameContract.parse(answer.json());
    expect(after).toMatchObject({ draftChanged: false, version: 1 });
    expect(after.revisions).toMatchObject([{ letter: 'A', note: 'First issue', author: session.user.name }]);
    const page = revisionPage.parse((await visitor.get(`/api/frames/${frame.id}/revisions/A`)).json());
    expect(page).toMatchObject({ frameId: frame.id, jobName: job.name, particulars: frame.particulars });
    const file = await visitor.get(`/api/frames/${frame.id}/revisions/A/frame-file`);
    expect(createHash('sha256').update(file.bytes).digest('hex')).toBe(page.sha256);
  });

  it('When the draft goes on, then the revision stays, and the next is B', async () => {
    const { visitor, frame } = await openShopWithFrame(server);
    await releaseFrame(visitor, frame);
    const changed = await change(visitor, frame, 1.5);
    expect(changed.draftChanged).toBe(true);
    const second = await releaseFrame(visitor, changed);
    expect(second.revisions.map((r) => r.letter)).toEqual(['B', 'A']);
    const first = revisionPage.parse((await visitor.get(`/api/frames/${frame.id}/revisions/A`)).json());
    expect(first.particulars).toEqual(frame.particulars);
  });

  it('When the draft is changed back to what was released, then it says so, and cannot be released again', async () => {
    const { visitor, frame } = await openShopWithFrame(server);
    await releaseFrame(visitor, frame);
    const there = await change(visitor, frame, 1.5);
    const back = await change(visitor, there, 1);
    expect(back.draftChanged).toBe(false);
    expect(codeOf(expectStatus(await release(visitor, back), 422))).toBe('nothing-changed');
  });

  it('When nine revisions are released, then the letters skip I (ASME Y14.35, from memory)', async () => {
    const { visitor, frame } = await openShopWithFrame(server);
    let now = await releaseFrame(visitor, frame);
    for (let i = 1; i < 9; i++) now = await releaseFrame(visitor, await change(visitor, now, 1 + i / 8));
    expect(now.revisions.map((r) => r.letter)).toEqual(['J', 'H', 'G', 'F', 'E', 'D', 'C', 'B', 'A']);
  });

  it('When there is a stop, then nothing is released and the stops are told', async () => {
    const { visitor, frame } = await openShopWithFrame(server, aFrameWithStop());
    const answer = expectStatus(await release(visitor, frame, { acknowledged: ['dado-too-deep'] }), 422);
    expect(codeOf(answer)).toBe('frame-has-stops');
    expect(releaseRefused.parse(answer.json<{ details: unknown }>().details).findings.map((f) => f.code)).toEqual([
      'dado-too-deep',
    ]);
    expect(frameContract.parse((await visitor.get(`/api/frames/${frame.id}`)).json()).revisions).toEqual([]);
  });

  it('When there is a caution, then it must be acknowledged by its code', async () => {
    const { visitor, frame } = await openShopWithFrame(server, aFrameWithCaution());
    const answer = expectStatus(await release(visitor, frame, { acknowledged: ['slender-member'] }), 422);
    expect(codeOf(answer)).toBe('cautions-not-acknowledged');
    const { findings } = releaseRefused.parse(answer.json<{ details: unknown }>().details);
    expect(new Set(findings.map((f) => f.code))).toEqual(new Set(['thin-wall']));
    expectStatus(await release(visitor, frame, { acknowledged: ['thin-wall'] }), 201);
  });

  it('When the draft was changed meanwhile, then the release is refused and tells what was changed', async () => {
    const { visitor, frame, session } = await openShopWithFrame(server);
    const { visitor: other } = await addPerson(server, session.shop.id, 'designer');
    await change(other, frame, 1.25);
    const answer = expectStatus(await release(visitor, frame), 409);
    expect(answer.json<{ details: { changes: unknown[] } }>().details.changes).toEqual([
      { path: 'setup.allowance', was: '1', theirs: '1.25', yours: '1' },
    ]);
  });

  it('When two release at the same moment, then there is one revision', async () => {
    const { visitor, frame } = await openShopWithFrame(server);
    const answers = await Promise.all([release(visitor, frame), release(visitor, frame)]);
    expect(answers.map((a) => a.status).sort()).toEqual([201, 422]);
    expect(codeOf(answers.find((a) => a.status === 422)!)).toBe('nothing-changed');
    expect(frameContract.parse((await visitor.get(`/api/frames/${frame.id}`)).json()).revisions).toHaveLength(1);
  });

  it('When the draft is saved while it is being proved, then what was proved is not released under it', async () => {
    const { visitor, frame } = await openShopWithFrame(server);
    const [released] = await Promise.all([release(visitor, frame), change(visitor, frame, 1.25)]);
    const after = frameContract.parse((await visitor.get(`/api/frames/${frame.id}`)).json());
    // Either order is right; a revision that holds what was not proved is not.
    if (released.status === 409) expect(after.revisions).toEqual([]);
    else {
      expect(released.status).toBe(201);
      const page = revisionPage.parse((await visitor.get(`/api/frames/${frame.id}/revisions/A`)).json());
      expect(page.particulars).toEqual(frame.particulars);
      expect(after.draftChanged).toBe(true);
    }
  });
});

describe('A released revision', () => {
  it.each([
    [
      'changed',
      (id: string) => server.database.queries.update(revisions).set({ note: 'other' }).where(eq(revisions.frameId, id)),
    ],
    ['removed', (id: string) => server.database.queries.delete(revisions).where(eq(revisions.frameId, id))],
    ['emptied', () => server.database.queries.execute(sql`truncate revisions`)],
    ['removed with its frame', (id: string) => server.database.queries.delete(frames).where(eq(frames.id, id))],
  ])('When it is to be %s, even by hand in the database, then the database refuses', async (_how, act) => {
    const { visitor, frame } = await openShopWithFrame(server);
    await releaseFrame(visitor, frame);
    const before = await server.database.queries.select().from(revisions).where(eq(revisions.frameId, frame.id));
    await expect(act(frame.id)).rejects.toThrow();
    expect(await server.database.queries.select().from(revisions).where(eq(revisions.frameId, frame.id))).toEqual(
      before,
    );
  });

  it('When its shop and its job are renamed, then it keeps the names it was released under', async () => {
    const { visitor, frame, job } = await openShopWithFrame(server);
    await releaseFrame(visitor, frame);
    expectStatus(await visitor.patch(`/api/jobs/${job.id}`, { name: 'Renamed' }), 200);
    expectStatus(await visitor.patch('/api/shop', { name: 'Renamed' }), 200);
    expect((await visitor.get(`/api/frames/${frame.id}/revisions/A`)).json()).toMatchObject({ jobName: job.name });
  });

  it('When its bytes were tampered with past the database’s guard, then it is not handed out', async () => {
    const { visitor, frame } = await openShopWithFrame(server);
    await releaseFrame(visitor, frame);
    await server.database.queries.execute(sql`alter table revisions disable trigger revisions_never_change`);
    await server.database.queries
      .update(revisions)
      .set({ file: new TextEncoder().encode('{}') })
      .where(eq(revisions.frameId, frame.id));
    await server.database.queries.execute(sql`alter table revisions enable trigger revisions_never_change`);
    expect((await visitor.get(`/api/frames/${frame.id}/revisions/A/frame-file`)).status).toBe(500);
    expect((await visitor.get(`/api/frames/${frame.id}/revisions/A/layer-set.zip`)).status).toBe(500);
  });

  it('When a letter has not been released, then it answers 404', async () => {
    const { visitor, frame } = await openShopWithFrame(server);
    expect((await visitor.get(`/api/frames/${frame.id}/revisions/A`)).status).toBe(404);
  });
});
