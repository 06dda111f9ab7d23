import { readdirSync } from 'node:fs';
import { join } from 'node:path';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { frame as frameContract, type Frame } from '../../../shared/contracts/frames.ts';
import { jobList, jobPage } from '../../../shared/contracts/jobs.ts';
import { role as roles } from '../../../shared/contracts/roles.ts';
import { session as sessionContract } from '../../../shared/contracts/session.ts';
import { workFrame } from '../../../shared/kernel/work-frame.ts';
import { startDemo } from '../../../server/start-demo.ts';
import { DEMO_FRAMES, DEMO_PEOPLE } from '../../../server/features/demo/demo-scenario.ts';
import { readConfig } from '../../../server/config.ts';
import { expectStatus, openShop } from '../../builders/shops.ts';
import type { HttpClient } from '../../setup/http-client.ts';
import { allowSlowMachine } from '../../setup/slow-machine.ts';
import { startTestServer, type TestServer } from '../../setup/test-server.ts';

allowSlowMachine();

const samples = join(import.meta.dirname, '../../../samples');
const said: string[] = [];
const make = (server: TestServer) => startDemo(server.database, server.services, samples, (line) => said.push(line));

let server: TestServer;
let visitor: HttpClient;
let frames: Frame[];
beforeAll(async () => {
  server = await startTestServer();
  expect(await make(server)).toBe(true);
  visitor = server.visitor();
  expectStatus(await visitor.post('/api/demo-sign-in', { role: 'designer' }), 200);
  const { jobs } = jobList.parse((await visitor.get('/api/jobs')).json());
  const page = jobPage.parse((await visitor.get(`/api/jobs/${jobs[0]!.id}`)).json());
  frames = await Promise.all(
    page.frames.map(async (f) => frameContract.parse((await visitor.get(`/api/frames/${f.id}`)).json())),
  );
});
afterAll(() => server.close());

const findingsOf = (frame: Frame) => workFrame(frame.particulars).findings;

describe('The demo scenario', () => {
  it('When it is made, then a newcomer is told', () => {
    expect(said).toEqual([expect.stringContaining('demo shop')]);
  });

  it('When somebody enters it, then there is one job with at least six quite different frames', async () => {
    const { jobs } = jobList.parse((await visitor.get('/api/jobs')).json());
    expect(jobs.map((j) => j.name)).toEqual(['Fenwick Lane kitchen']);
    expect(frames.length).toBeGreaterThanOrEqual(6);
    const all = frames.map((f) => f.particulars);
    const text = JSON.stringify(all);
    for (const part of [
      '"rows"',
      '"arch"',
      '"traced"',
      '"all-edges"',
      '"end-over-end"',
      '"mm"',
      '"tapered"',
      '"stopped"',
    ])
      expect(text).toContain(part);
    expect(all.some((p) => p.outline.kind === 'members' && p.outline.feet > 0)).toBe(true);
    expect(
      all.some(
        (p) => p.outline.kind === 'members' && 'columns' in p.outline.layout && p.outline.layout.columns.length === 3,
      ),
    ).toBe(true);
    expect(all.some((p) => p.outline.kind === 'traced' && p.outline.perimeter.some((v) => (v[2] ?? 0) !== 0))).toBe(
      true,
    );
    expect(all.some((p) => p.cutters.opening.kind === 'straight')).toBe(true);
  });

  it('When its frames are looked at, then some are released as A, one of those with a caution, and one draft has a stop', () => {
    const released = frames.filter((f) => f.revisions.length > 0);
    expect(released.length).toBeGreaterThanOrEqual(4);
    expect(released.every((f) => f.revisions[0]!.letter === 'A')).toBe(true);
    expect(released.some((f) => findingsOf(f).some((x) => x.level === 'caution'))).toBe(true);
    expect(frames.filter((f) => findingsOf(f).some((x) => x.level === 'stop')).map((f) => f.revisions.length)).toEqual([
      0,
    ]);
  });

  it.each(roles.options)('When somebody enters as %s, then they are the demo person of that role', async (role) => {
    const guest = server.visitor();
    const answer = sessionContract.parse(expectStatus(await guest.post('/api/demo-sign-in', { role }), 200).json());
    expect(answer.user).toMatchObject(DEMO_PEOPLE.find((p) => p.role === role)!);
    expect(answer.shop).toMatchObject({ name: 'Tern & Alder Joinery' });
    expect(answer.demoAvailable).toBe(true);
  });

  it('When somebody tries a demo person with a password, then they do not get in', async () => {
    for (const password of ['null', 'password', ' ']) {
      expect((await server.visitor().post('/api/sign-in', { email: DEMO_PEOPLE[0]!.email, password })).status).toBe(
        401,
      );
    }
  });

  it('When it is made once, then it is not made again', async () => {
    expect(await make(server)).toBe(false);
  });

  it('When a shop has been opened already, then it is not made', async () => {
    const other = await startTestServer();
    await openShop(other);
    expect(await make(other)).toBe(false);
    expect(await other.services.session.describe(undefined)).toMatchObject({ demoAvailable: false });
    await other.close();
  });

  it('When DATABASE_URL is set, then it is never made', () => {
    expect(readConfig({}).demo).toBe(true);
    expect(readConfig({ DATABASE_URL: 'postgres://a@b/c' }).demo).toBe(false);
    expect(readConfig({ DATABASE_URL: 'postgres://a@b/c', DEMO: 'on' }).demo).toBe(false);
    expect(readConfig({ DEMO: 'off' }).demo).toBe(false);
  });

  it('When samples are listed, then each one is a frame of the demo', () => {
    const files = readdirSync(samples).filter((name) => name.endsWith('.frame.json'));
    expect(files.sort()).toEqual(DEMO_FRAMES.map((f) => `${f.file}.frame.json`).sort());
  });
});
