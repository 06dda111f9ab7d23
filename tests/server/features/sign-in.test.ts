import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { session as sessionContract } from '../../../shared/contracts/session.ts';
import { sessions, users } from '../../../server/db/schema.ts';
import { addPerson, anAddress, expectStatus, openShop, PASSWORD } from '../../builders/shops.ts';
import type { HttpClient } from '../../setup/http-client.ts';
import { allowSlowMachine } from '../../setup/slow-machine.ts';
import { startTestServer, type TestServer } from '../../setup/test-server.ts';

allowSlowMachine();

let server: TestServer;
beforeAll(async () => void (server = await startTestServer()));
afterAll(() => server.close());

const signedIn = async (visitor: HttpClient) =>
  sessionContract.parse((await visitor.get('/api/session')).json()).user !== null;
const signIn = (visitor: HttpClient, email: string, password = PASSWORD) =>
  visitor.post('/api/sign-in', { email, password });

describe('Signing up', () => {
  it('When somebody signs up, then a shop is theirs, they are its owner and signed in', async () => {
    const { visitor, session } = await openShop(server, {
      shopName: 'Oak & Ash',
      name: 'Robin',
      email: ' Robin@Shop.Example ',
      unit: 'mm',
    });
    expect(session).toMatchObject({
      user: { name: 'Robin', email: 'robin@shop.example', role: 'owner' },
      shop: { name: 'Oak & Ash', unit: 'mm', paper: 'A4' },
      demoAvailable: false,
    });
    expect((await visitor.get('/api/session')).json()).toEqual(session);
  });

  it('When the address has been used, in whatever case, then it is refused and nothing is made', async () => {
    const email = anAddress();
    await openShop(server, { email });
    const before = await server.database.queries.$count(users);
    const answer = await server
      .visitor()
      .post('/api/sign-up', { shopName: 'S', name: 'N', email: email.toUpperCase(), password: PASSWORD });
    expect(answer.status).toBe(409);
    expect(answer.json().code).toBe('email-taken');
    expect(await server.database.queries.$count(users)).toBe(before);
  });

  it('When entries are wrong, then each is named', async () => {
    const answer = await server
      .visitor()
      .post('/api/sign-up', { shopName: '', name: 'N', email: 'nonsense', password: 'short' });
    expect(answer.status).toBe(400);
    const paths = answer.json<{ fields: { path: string }[] }>().fields.map((f) => f.path);
    expect(paths.sort()).toEqual(['email', 'password', 'shopName']);
  });

  it('When a password is stored, then as argon2id and not as itself', async () => {
    const rows = await server.database.queries.select().from(users);
    for (const { passwordHash } of rows) expect(passwordHash).toMatch(/^\$argon2id\$/);
  });
});

describe('Signing in and out', () => {
  it('When the password is right, then the person is in, and the session has a new id', async () => {
    const email = anAddress();
    const { visitor } = await openShop(server, { email });
    const first = visitor.cookie;
    expectStatus(await signIn(visitor, email.toUpperCase()), 200);
    expect(visitor.cookie).not.toBe(first);
    expect(await signedIn(visitor)).toBe(true);
  });

  it('When the address is unknown or the password wrong, then the answers are the same', async () => {
    const { session } = await openShop(server);
    const wrong = await signIn(server.visitor(), session.user.email, 'not the password');
    const unknown = await signIn(server.visitor(), anAddress(), 'not the password');
    expect([wrong.status, unknown.status]).toEqual([401, 401]);
    expect(wrong.json()).toEqual(unknown.json());
    expect(wrong.headers.getSetCookie()).toEqual([]);
  });

  it('When a person signs out, then the cookie opens nothing any more', async () => {
    const { visitor } = await openShop(server);
    const { cookie } = visitor;
    expectStatus(await visitor.post('/api/sign-out'), 204);
    const thief = server.visitor();
    thief.useCookie(cookie);
    expect(await signedIn(thief)).toBe(false);
  });

  it('When a person signs out everywhere, then every session of theirs ends, and nobody else’s', async () => {
    const email = anAddress();
    const desk = await openShop(server, { email });
    const tablet = server.visitor();
    expectStatus(await signIn(tablet, email), 200);
    const colleague = await addPerson(server, desk.session.shop.id, 'designer');
    expectStatus(await desk.visitor.post('/api/sign-out-everywhere'), 204);
    expect([await signedIn(desk.visitor), await signedIn(tablet), await signedIn(colleague.visitor)]).toEqual([
      false,
      false,
      true,
    ]);
  });

  it('When a cookie is forged, then it opens nothing', async () => {
    const { visitor } = await openShop(server);
    const forger = server.visitor();
    forger.useCookie(`${visitor.cookie.slice(0, -3)}abc`);
    expect(await signedIn(forger)).toBe(false);
  });

  it('When the table of sessions is read, then it holds no session id', async () => {
    const { visitor } = await openShop(server);
    const id = decodeURIComponent(visitor.cookie)
      .replace(/^stilepost=s:/, '')
      .split('.')[0]!;
    const rows = await server.database.queries.select().from(sessions);
    expect(rows.length).toBeGreaterThan(0);
    expect(JSON.stringify(rows)).not.toContain(id);
  });

  it('When a session is not used for 30 days, then it ends; when it is used, then it goes on', async () => {
    const idle = await openShop(server);
    const used = await openShop(server);
    for (let day = 0; day < 31; day++) {
      server.wait(24 * 60 * 60);
      expect(await signedIn(used.visitor)).toBe(true);
    }
    expect(await signedIn(idle.visitor)).toBe(false);
  });

  it('When there is no demo shop, then nobody gets in without a password', async () => {
    expect((await server.visitor().post('/api/demo-sign-in', { role: 'owner' })).status).toBe(404);
  });
});

describe('Guessing passwords', () => {
  it('When an account has had five wrong tries, then even the right password must wait, and waiting is enough', async () => {
    const { session } = await openShop(server);
    const { email } = session.user;
    for (let i = 0; i < 5; i++) expect((await signIn(server.visitor(), email, 'wrong guess')).status).toBe(401);
    const held = await signIn(server.visitor(), email);
    expect(held.status).toBe(429);
    server.wait(Number(held.headers.get('retry-after')));
    expect((await signIn(server.visitor(), email)).status).toBe(200);
  });

  it('When the address has no account, then it is held back just the same', async () => {
    const email = anAddress();
    for (let i = 0; i < 5; i++) expect((await signIn(server.visitor(), email, 'wrong guess')).status).toBe(401);
    expect((await signIn(server.visitor(), email, 'wrong guess')).status).toBe(429);
  });

  it('When guesses are sent all at once, then no more than five are looked at', async () => {
    const { session } = await openShop(server);
    const answers = await Promise.all(
      Array.from({ length: 12 }, () => signIn(server.visitor(), session.user.email, 'wrong guess')),
    );
    expect(answers.filter((a) => a.status === 401)).toHaveLength(5);
    expect(answers.filter((a) => a.status === 429)).toHaveLength(7);
  });

  it('When one address tries many accounts, then the address is held back, and a quarter of an hour later forgiven', async () => {
    const guesses = await startTestServer({}, server);
    const answers = [];
    for (let i = 0; i < 31; i++) answers.push((await signIn(guesses.visitor(), anAddress(), 'wrong guess')).status);
    expect(answers.slice(0, 30).every((status) => status === 401)).toBe(true);
    expect(answers[30]).toBe(429);
    guesses.wait(15 * 60);
    expect((await signIn(guesses.visitor(), anAddress(), 'wrong guess')).status).toBe(401);
    await guesses.close();
  });
});
