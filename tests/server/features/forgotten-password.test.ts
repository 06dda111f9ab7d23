import { afterAll, beforeAll, describe, expect, it, vi } from 'vitest';
import { mails, passwordResets } from '../../../server/db/schema.ts';
import { addPerson, anAddress, expectStatus, openShop, PASSWORD } from '../../builders/shops.ts';
import type { HttpClient } from '../../setup/http-client.ts';
import { allowSlowMachine } from '../../setup/slow-machine.ts';
import { startTestServer, type TestServer } from '../../setup/test-server.ts';

allowSlowMachine();

const HOUR = 60 * 60;
const NEW_PASSWORD = 'another horse battery';

let server: TestServer;
beforeAll(async () => void (server = await startTestServer()));
afterAll(() => server.close());

async function tokensFor(email: string): Promise<string[]> {
  const rows = await server.database.queries.select().from(mails);
  return rows
    .filter(({ to }) => to === email)
    .sort((a, b) => a.ordinal - b.ordinal)
    .map(({ text }) => /\/reset-password\/(\S+)/.exec(text)![1]!);
}

const forget = async (email: string) =>
  expectStatus(await server.visitor().post('/api/forgot-password', { email }), 204);

/** Asks for a link, and waits for its mail: it is queued after the answer. */
async function linkFor(email: string): Promise<string> {
  const before = (await tokensFor(email)).length;
  await forget(email);
  return vi.waitFor(
    async () => {
      const tokens = await tokensFor(email);
      expect(tokens).toHaveLength(before + 1);
      return tokens.at(-1)!;
    },
    { timeout: 5_000 },
  );
}

/** Once this one's mail is queued, that of an earlier request would be too: the database takes one after the other. */
async function allQueued(): Promise<void> {
  const { session } = await openShop(server);
  await linkFor(session.user.email);
}

const reset = (token: string, password = NEW_PASSWORD) =>
  server.visitor().post('/api/reset-password', { token, password });
const signIn = async (email: string, password: string) =>
  (await server.visitor().post('/api/sign-in', { email, password })).status;
const jobs = async (visitor: HttpClient) => (await visitor.get('/api/jobs')).status;

describe('A forgotten password', () => {
  it('When the link is followed, then the new password holds, the old does not, and every session has ended', async () => {
    const { visitor, session } = await openShop(server);
    const { email } = session.user;
    const token = await linkFor(email);
    expectStatus(await reset(token), 204);
    expect(await jobs(visitor)).toBe(401);
    expect([await signIn(email, NEW_PASSWORD), await signIn(email, PASSWORD)]).toEqual([200, 401]);
  });

  it('When somebody else is signed in, then their session goes on', async () => {
    const { session } = await openShop(server);
    const colleague = await addPerson(server, session.shop.id, 'designer');
    expectStatus(await reset(await linkFor(session.user.email)), 204);
    expect(await jobs(colleague.visitor)).toBe(200);
  });

  it('When the address is unknown, then the answer is the same and no mail is queued', async () => {
    const { session } = await openShop(server);
    const unknown = anAddress();
    const [a, b] = [await forget(unknown), await forget(session.user.email)];
    expect([a.status, a.bytes.length]).toEqual([b.status, b.bytes.length]);
    await allQueued();
    expect(await tokensFor(unknown)).toEqual([]);
  });

  it('When access was taken away, then no mail is queued, and a link from before opens nothing', async () => {
    const { visitor: owner, session } = await openShop(server);
    const person = await addPerson(server, session.shop.id, 'designer');
    const { id, email } = person.session.user;
    const token = await linkFor(email);
    expectStatus(await owner.patch(`/api/people/${id}`, { disabled: true }), 204);
    await forget(email);
    await allQueued();
    expect(await tokensFor(email)).toHaveLength(1);
    expect((await reset(token)).status).toBe(404);
  });

  it('When one link is used, then every other of that person is used up too', async () => {
    const { session } = await openShop(server);
    const [first, second] = [await linkFor(session.user.email), await linkFor(session.user.email)];
    expectStatus(await reset(second), 204);
    for (const token of [first, second, 'no-such-link']) {
      const answer = await reset(token, 'a third horse battery');
      expect([answer.status, answer.json().code]).toEqual([404, 'not-found']);
    }
    expect(await signIn(session.user.email, NEW_PASSWORD)).toBe(200);
  });

  it('When an hour has passed, then the link opens nothing; a second before, it does', async () => {
    const { session } = await openShop(server);
    const late = await linkFor(session.user.email);
    server.wait(HOUR);
    expect((await reset(late)).status).toBe(404);
    const timely = await linkFor(session.user.email);
    server.wait(HOUR - 1);
    expectStatus(await reset(timely), 204);
  });

  it('When one link is used many times at once, then it sets one password', async () => {
    const { session } = await openShop(server);
    const token = await linkFor(session.user.email);
    const words = ['first horse battery', 'second horse battery', 'third horse battery'];
    const answers = await Promise.all(words.map((password) => reset(token, password)));
    expect(answers.map(({ status }) => status).sort()).toEqual([204, 404, 404]);
  });

  it('When the password is too short, then the link is not used up', async () => {
    const { session } = await openShop(server);
    const token = await linkFor(session.user.email);
    expect((await reset(token, 'short')).status).toBe(400);
    expectStatus(await reset(token), 204);
  });

  it('When the table of links is read, then it holds no token', async () => {
    const { session } = await openShop(server);
    const token = await linkFor(session.user.email);
    expect(JSON.stringify(await server.database.queries.select().from(passwordResets))).not.toContain(token);
  });

  it('When one address asks again and again, then it must wait, whether or not it has an account', async () => {
    const { session } = await openShop(server);
    for (const email of [session.user.email, anAddress()]) {
      for (let i = 0; i < 5; i++) await forget(email);
      const held = await server.visitor().post('/api/forgot-password', { email });
      expect([held.status, held.json().code]).toEqual([429, 'too-many-requests']);
    }
  });

  it('When five links of a person work, then no sixth is mailed', async () => {
    const { session } = await openShop(server);
    const { email } = session.user;
    for (let i = 0; i < 5; i++) await linkFor(email);
    server.wait(15 * 60);
    await forget(email);
    await allQueued();
    expect(await tokensFor(email)).toHaveLength(5);
  });

  it('When links are guessed, then the address is held back', async () => {
    const guesser = await startTestServer({}, server);
    const guess = (i: number) =>
      guesser.visitor().post('/api/reset-password', { token: `guess-${i}`, password: NEW_PASSWORD });
    const answers = [];
    for (let i = 0; i < 31; i++) answers.push((await guess(i)).status);
    expect(answers.slice(0, 30).every((status) => status === 404)).toBe(true);
    expect(answers[30]).toBe(429);
    await guesser.close();
  });
});
