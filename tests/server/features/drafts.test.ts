import { afterAll, beforeAll, describe, expect, it, vi } from 'vitest';
import {
  draftSaved,
  frame as frameContract,
  staleDraft,
  type DraftSaved,
  type Frame,
  type StaleDraft,
} from '../../../shared/contracts/frames.ts';
import { jobList, jobPage } from '../../../shared/contracts/jobs.ts';
import type { Particulars } from '../../../shared/kernel/particulars/particulars.ts';
import { aFrame, aFrameWithCaution, aFrameWithStop } from '../../builders/particulars.ts';
import { addFrame, addJob, addPerson, expectStatus, openShop, openShopWithFrame } from '../../builders/shops.ts';
import type { HttpClient } from '../../setup/http-client.ts';
import { allowSlowMachine } from '../../setup/slow-machine.ts';
import { startTestServer, type TestServer } from '../../setup/test-server.ts';

allowSlowMachine();

let server: TestServer;
beforeAll(async () => void (server = await startTestServer()));
afterAll(() => server.close());

const save = (visitor: HttpClient, id: string, version: number, particulars: Particulars) =>
  visitor.put(`/api/frames/${id}/draft`, { version, particulars });
const saved = async (...args: Parameters<typeof save>): Promise<DraftSaved> =>
  draftSaved.parse(expectStatus(await save(...args), 200).json());
const read = async (visitor: HttpClient, id: string): Promise<Frame> =>
  frameContract.parse((await visitor.get(`/api/frames/${id}`)).json());

describe('Saving a draft', () => {
  it('When a draft is saved, then it comes back as entered, one version on, with who and when', async () => {
    const { visitor, frame, session } = await openShopWithFrame(server);
    server.wait(60);
    const particulars = aFrame({ 'outline.width': 23.5, 'dados.1.at': 22.5, name: 'Küche, “links”' });
    expect(await saved(visitor, frame.id, 1, particulars)).toMatchObject({ version: 2, draftChanged: true });
    const now = await read(visitor, frame.id);
    expect(now.particulars).toEqual(particulars);
    expect(now).toMatchObject({ version: 2, changedBy: session.user.name });
    expect(Date.parse(now.changedAt) - Date.parse(frame.changedAt)).toBe(60_000);
  });

  it('When a number is saved, then every digit of it comes back', async () => {
    const { visitor, frame } = await openShopWithFrame(server);
    const width = 33.123456789012345;
    await saved(visitor, frame.id, 1, aFrame({ 'outline.width': width }));
    expect((await read(visitor, frame.id)).particulars.outline).toMatchObject({ width });
  });

  it('When nothing is changed, then no version is made', async () => {
    const { visitor, frame } = await openShopWithFrame(server);
    expect(await saved(visitor, frame.id, 1, aFrame())).toMatchObject({ version: 1 });
  });

  it('When the answer to a save was lost and it is sent again, then it is taken as saved', async () => {
    const { visitor, frame } = await openShopWithFrame(server);
    const particulars = aFrame({ 'outline.width': 40 });
    const first = await saved(visitor, frame.id, 1, particulars);
    expect(await saved(visitor, frame.id, 1, particulars)).toEqual(first);
  });

  it('When a frame with a stop is saved, then it is kept as a draft and counted', async () => {
    const { visitor, frame, job } = await openShopWithFrame(server);
    await saved(visitor, frame.id, 1, aFrameWithStop());
    const page = jobPage.parse((await visitor.get(`/api/jobs/${job.id}`)).json());
    expect(page.frames[0]).toMatchObject({
      id: frame.id,
      findings: { stops: 1 },
      width: 33,
      height: 30.5,
      openings: 2,
      revision: '',
      draftChanged: true,
    });
  });
});

describe('Working out a large tracing', () => {
  const ring = (count: number, radius: number) =>
    Array.from({ length: count }, (_, i): [number, number] => {
      const angle = (2 * Math.PI * i) / count;
      return [30 + radius * Math.cos(angle), 30 + radius * Math.sin(angle)];
    });
  const traced = (count: number): Particulars => ({
    ...aFrame(),
    outline: { kind: 'traced', perimeter: ring(count, 24), openings: [ring(count, 10)] },
    dados: [],
  });

  it('When it has many vertices, then a worker does it and not the thread that answers; a small one is done on the spot', async () => {
    const { visitor, frame } = await openShopWithFrame(server);
    const make = vi.spyOn(server.makers, 'make');
    await saved(visitor, frame.id, 1, traced(20));
    expect(make).not.toHaveBeenCalled();
    await saved(visitor, frame.id, 2, traced(2000));
    expect(make).toHaveBeenCalledExactlyOnceWith('summary', traced(2000));
    make.mockRestore();
  });
});

describe('Two people on one draft', () => {
  async function meet() {
    const { visitor: first, frame, session } = await openShopWithFrame(server);
    const { visitor: second } = await addPerson(server, session.shop.id, 'designer', 'Second');
    return { first, second, frame };
  }
  const refused = async (...args: Parameters<typeof save>): Promise<StaleDraft> => {
    const answer = expectStatus(await save(...args), 409).json<{ code: string; details: unknown }>();
    expect(answer.code).toBe('stale-draft');
    return staleDraft.parse(answer.details);
  };

  it('When the second saves, then they are told what was changed, by whom, and nothing of the first is lost', async () => {
    const { first, second, frame } = await meet();
    await saved(second, frame.id, 1, aFrame({ 'outline.width': 36 }));
    const details = await refused(first, frame.id, 1, aFrame({ 'outline.width': 30, thickness: 1 }));
    expect(details).toMatchObject({ version: 2, changedBy: 'Second' });
    expect(details.changes).toEqual([{ path: 'outline.width', was: '33', theirs: '36', yours: '30' }]);
    expect(details.particulars).toEqual(aFrame({ 'outline.width': 36 }));
    expect((await read(first, frame.id)).particulars).toEqual(aFrame({ 'outline.width': 36 }));
  });

  it('When the first has changed another entry, then only what the second changed is told', async () => {
    const { first, second, frame } = await meet();
    await saved(second, frame.id, 1, aFrame({ 'dados.2.depth': 0.2 }));
    await saved(second, frame.id, 2, aFrame({ 'dados.2.depth': 0.2, 'edge.sizeHeldAt': 'back' }));
    const { changes } = await refused(first, frame.id, 1, aFrame({ 'outline.width': 30 }));
    expect(changes.map((c) => [c.path, c.was, c.theirs, c.yours])).toEqual([
      ['edge.sizeHeldAt', 'face', 'back', 'face'],
      ['dados.2.depth', '0.25', '0.2', '0.25'],
    ]);
  });

  it('When the version began with is no longer kept, then the two drafts are held against each other', async () => {
    const { first, frame } = await meet();
    for (let version = 1; version <= 201; version++)
      await saved(first, frame.id, version, aFrame({ 'outline.width': 33 + version / 64 }));
    const { changes } = await refused(first, frame.id, 1, aFrame());
    expect(changes).toEqual([{ path: 'outline.width', yours: '33', theirs: String(33 + 201 / 64) }]);
  });

  it('When both save at the same moment, then one is saved and the other told', async () => {
    const { first, second, frame } = await meet();
    const answers = await Promise.all([
      save(first, frame.id, 1, aFrame({ 'outline.width': 30 })),
      save(second, frame.id, 1, aFrame({ 'outline.width': 36 })),
    ]);
    expect(answers.map((a) => a.status).sort()).toEqual([200, 409]);
    expect((await read(first, frame.id)).version).toBe(2);
  });

  it('When somebody saves from a version that never was, then they are told and nothing is saved', async () => {
    const { first, frame } = await meet();
    expect((await save(first, frame.id, 7, aFrame({ 'outline.width': 30 }))).status).toBe(409);
    expect((await read(first, frame.id)).version).toBe(1);
  });
});

describe('Jobs', () => {
  it('When a job has frames, then the list counts them, those released and those with stops', async () => {
    const { visitor } = await openShop(server);
    const job = await addJob(visitor, 'Kitchen');
    await addFrame(visitor, job.id);
    await addFrame(visitor, job.id, aFrameWithStop());
    await addFrame(visitor, job.id, aFrameWithCaution());
    await addJob(visitor, 'Empty');
    const { jobs } = jobList.parse((await visitor.get('/api/jobs')).json());
    expect(jobs.map(({ name, frames, released, withStops }) => [name, frames, released, withStops]).sort()).toEqual([
      ['Empty', 0, 0, 0],
      ['Kitchen', 3, 0, 1],
    ]);
  });

  it('When frames are added, then the table keeps their order', async () => {
    const { visitor } = await openShop(server);
    const job = await addJob(visitor);
    for (const name of ['C', 'A', 'B']) await addFrame(visitor, job.id, aFrame({ name }));
    const page = jobPage.parse((await visitor.get(`/api/jobs/${job.id}`)).json());
    expect(page.frames.map((f) => f.name)).toEqual(['C', 'A', 'B']);
  });

  it('When a frame is worked on, then its job comes first in the list', async () => {
    const { visitor } = await openShop(server);
    const older = await addJob(visitor, 'Older');
    server.wait(10);
    await addJob(visitor, 'Newer');
    server.wait(10);
    await addFrame(visitor, older.id);
    const { jobs } = jobList.parse((await visitor.get('/api/jobs')).json());
    expect(jobs.map((j) => j.name)).toEqual(['Older', 'Newer']);
  });

  it('When a job or a frame is put away, then it leaves the list, can be listed apart, and be brought back', async () => {
    const { visitor, job, frame } = await openShopWithFrame(server);
    const frames = async (query = '') =>
      jobPage.parse((await visitor.get(`/api/jobs/${job.id}${query}`)).json()).frames.map((f) => f.id);
    const jobs = async (query = '') =>
      jobList.parse((await visitor.get(`/api/jobs${query}`)).json()).jobs.map((j) => j.id);

    expectStatus(await visitor.patch(`/api/frames/${frame.id}`, { removed: true }), 200);
    expect([await frames(), await frames('?removed=true')]).toEqual([[], [frame.id]]);
    expectStatus(await visitor.patch(`/api/frames/${frame.id}`, { removed: false }), 200);
    expect(await frames()).toEqual([frame.id]);

    expectStatus(await visitor.patch(`/api/jobs/${job.id}`, { removed: true }), 200);
    expect([await jobs(), await jobs('?removed=true')]).toEqual([[], [job.id]]);
    expectStatus(await visitor.patch(`/api/jobs/${job.id}`, { removed: false, name: 'Back again' }), 200);
    expect(await jobs()).toEqual([job.id]);
  });
});
