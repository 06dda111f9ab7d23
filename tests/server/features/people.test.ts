import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import type { Invitation, People } from '../../../shared/contracts/people.ts';
import type { Role } from '../../../shared/contracts/roles.ts';
import { session as sessionContract } from '../../../shared/contracts/session.ts';
import { invitations, mails, sessions, users } from '../../../server/db/schema.ts';
import { DEMO_PEOPLE, DEMO_SHOP } from '../../../server/features/demo/demo-scenario.ts';
import { addPerson, anAddress, expectStatus, openShop, PASSWORD } from '../../builders/shops.ts';
import type { Answer, HttpClient } from '../../setup/http-client.ts';
import { allowSlowMachine } from '../../setup/slow-machine.ts';
import { startTestServer, type TestServer } from '../../setup/test-server.ts';

allowSlowMachine();

const DAY = 24 * 60 * 60;

let server: TestServer;
beforeAll(async () => void (server = await startTestServer()));
afterAll(() => server.close());

/** What was queued for an address, the newest last. */
async function mailsTo(email: string) {
  const rows = await server.database.queries.select().from(mails);
  return rows.filter(({ to }) => to === email).sort((a, b) => a.ordinal - b.ordinal);
}

async function tokenFor(email: string): Promise<string> {
  const link = /\/join\/(\S+)/.exec((await mailsTo(email)).at(-1)?.text ?? '');
  if (!link) throw new Error(`no invitation for ${email}`);
  return link[1]!;
}

async function invite(owner: HttpClient, email = anAddress(), role: Role = 'designer') {
  const answer = expectStatus(await owner.post('/api/invitations', { email, role }), 201);
  return { invitation: answer.json<Invitation>(), email, token: await tokenFor(email) };
}

const join = (visitor: HttpClient, token: string, name = 'New one') =>
  visitor.post('/api/join', { token, name, password: PASSWORD });
const listOf = async (owner: HttpClient) => expectStatus(await owner.get('/api/people'), 200).json<People>();
const isIn = async (visitor: HttpClient) =>
  sessionContract.parse((await visitor.get('/api/session')).json()).user !== null;

/** The one answer of a link that does not work. */
const expectDead = (answer: Answer) => {
  expect(answer.status).toBe(404);
  expect(answer.json()).toEqual({ code: 'not-found', message: 'There is nothing here, or it is not yours to see.' });
};

describe('Inviting', () => {
  it('When somebody is invited and follows the link, then they are in the shop, in that role, and signed in', async () => {
    const { visitor: owner, session } = await openShop(server, { shopName: 'Oak & Ash', name: 'Robin' });
    const { token, email } = await invite(owner, anAddress(), 'programmer');
    const newcomer = server.visitor();
    const offer = expectStatus(await newcomer.get(`/api/join/${token}`), 200);
    expect(offer.json()).toEqual({ shopName: 'Oak & Ash', role: 'programmer', email });
    server.wait(60);
    const joined = expectStatus(await join(newcomer, token, 'Kim'), 201);
    expect(joined.json()).toMatchObject({ user: { name: 'Kim', email, role: 'programmer' }, shop: session.shop });
    expect(await isIn(newcomer)).toBe(true);
    expectStatus(await server.visitor().post('/api/sign-in', { email, password: PASSWORD }), 200);
    const { people, invitations: open } = await listOf(owner);
    expect(people.map((p) => [p.name, p.role])).toEqual([
      ['Robin', 'owner'],
      ['Kim', 'programmer'],
    ]);
    expect(people[1]!.lastSignInAt).toBe('2026-03-31T09:01:00.000Z');
    expect(open).toEqual([]);
  });

  it('When an invitation is mailed, then the mail leads to this server and escapes what people typed', async () => {
    const { visitor: owner, session } = await openShop(server, { shopName: 'A <b>bold</b> & Co', name: '"Q"' });
    const { token, email } = await invite(owner);
    const [mail] = await mailsTo(email);
    expect(mail).toMatchObject({ shopId: session.shop.id, subject: 'Join A <b>bold</b> & Co on Stilepost' });
    expect(mail!.text).toContain(`${owner.url}/join/${token}`);
    expect(mail!.html).toContain(`<a href="${owner.url}/join/${token}">`);
    expect(mail!.html).toContain('&quot;Q&quot; invites you to A &lt;b&gt;bold&lt;/b&gt; &amp; Co');
    expect(mail!.html).not.toContain('<b>');
  });

  it('When the public address is configured, then links lead there, whatever host a request names', async () => {
    const named = await startTestServer({ publicUrl: 'https://frames.example.com' }, server);
    const { visitor: owner } = await openShop(named);
    const { email } = await invite(owner);
    expect((await mailsTo(email))[0]!.text).toContain('https://frames.example.com/join/');
    await named.close();
  });

  it('When one place sends more invitations than it may, then the next one is held back', async () => {
    const held = await startTestServer({ invitationsPerHour: 2 }, server);
    const { visitor: owner } = await openShop(held);
    const { invitation } = await invite(owner);
    expectStatus(await owner.post(`/api/invitations/${invitation.id}/resend`), 200);
    expect((await owner.post('/api/invitations', { email: anAddress(), role: 'designer' })).status).toBe(429);
    await held.close();
  });

  it('When the table of invitations is read, then it holds no token, and each token has 256 bits', async () => {
    const { visitor: owner } = await openShop(server);
    const { token } = await invite(owner);
    expect(Buffer.from(token, 'base64url')).toHaveLength(32);
    expect(JSON.stringify(await server.database.queries.select().from(invitations))).not.toContain(token);
  });

  it('When the address has an account, in this shop or another, then it is refused and no mail goes', async () => {
    const { visitor: owner } = await openShop(server);
    const other = await openShop(server);
    const { email } = other.session.user;
    const answer = await owner.post('/api/invitations', { email: email.toUpperCase(), role: 'designer' });
    expect([answer.status, answer.json().code]).toEqual([409, 'email-taken']);
    expect(await mailsTo(email)).toEqual([]);
  });

  it('When an address is invited again, then the first link ends and one invitation is open', async () => {
    const { visitor: owner } = await openShop(server);
    const { email, token } = await invite(owner, anAddress(), 'designer');
    const second = await invite(owner, email, 'operator');
    expectDead(await server.visitor().get(`/api/join/${token}`));
    expect((await listOf(owner)).invitations.map(({ role }) => role)).toEqual(['operator']);
    expectStatus(await server.visitor().get(`/api/join/${second.token}`), 200);
  });

  it('When two shops invite one address, then the one joined first has them, and the other link is refused', async () => {
    const [one, two] = [await openShop(server), await openShop(server)];
    const first = await invite(one.visitor);
    const second = await invite(two.visitor, first.email);
    expectStatus(await join(server.visitor(), first.token), 201);
    const late = await join(server.visitor(), second.token);
    expect([late.status, late.json().code]).toEqual([409, 'email-taken']);
    expect((await listOf(two.visitor)).people).toHaveLength(1);
  });
});

describe('Links into a shop', () => {
  it('When a link is unknown, used, revoked or past its time, then the answers are one and the same', async () => {
    const { visitor: owner } = await openShop(server);
    const used = await invite(owner);
    expectStatus(await join(server.visitor(), used.token), 201);
    const revoked = await invite(owner);
    expectStatus(await owner.delete(`/api/invitations/${revoked.invitation.id}`), 204);
    const late = await invite(owner);
    server.wait(7 * DAY);
    for (const token of ['no-such-link', used.token, revoked.token, late.token]) {
      expectDead(await server.visitor().get(`/api/join/${token}`));
      expectDead(await join(server.visitor(), token));
    }
    expect((await listOf(owner)).invitations).toMatchObject([{ email: late.email, expired: true }]);
  });

  it('When a second is left of the seven days, then the link still works', async () => {
    const { visitor: owner } = await openShop(server);
    const { token } = await invite(owner);
    server.wait(7 * DAY - 1);
    expectStatus(await join(server.visitor(), token), 201);
  });

  it('When one link is followed many times at once, then one person comes of it', async () => {
    const { visitor: owner } = await openShop(server);
    const { token } = await invite(owner);
    const answers = await Promise.all(Array.from({ length: 5 }, () => join(server.visitor(), token)));
    expect(answers.map(({ status }) => status).sort()).toEqual([201, 404, 404, 404, 404]);
    expect((await listOf(owner)).people).toHaveLength(2);
  });

  it('When an invitation is sent anew, then a new link works for seven days and the old one does not', async () => {
    const { visitor: owner } = await openShop(server);
    const { invitation, email, token } = await invite(owner);
    server.wait(8 * DAY);
    expectStatus(await owner.post(`/api/invitations/${invitation.id}/resend`), 200);
    expect(await mailsTo(email)).toHaveLength(2);
    expectDead(await join(server.visitor(), token));
    expectStatus(await join(server.visitor(), await tokenFor(email)), 201);
    expect((await owner.post(`/api/invitations/${invitation.id}/resend`)).status).toBe(404);
    expect((await owner.delete(`/api/invitations/${invitation.id}`)).status).toBe(404);
  });

  it('When name or password are wrong, then each is named and the link is not used up', async () => {
    const { visitor: owner } = await openShop(server);
    const { token } = await invite(owner);
    const answer = await server.visitor().post('/api/join', { token, name: ' ', password: 'short' });
    expect(answer.status).toBe(400);
    expect(answer.json<{ fields: { path: string }[] }>().fields.map(({ path }) => path)).toEqual(['name', 'password']);
    expectStatus(await join(server.visitor(), token), 201);
  });
});

describe('Roles and access', () => {
  const change = (owner: HttpClient, id: string, body: unknown) => owner.patch(`/api/people/${id}`, body);

  it('When a role is changed, then it holds at the next request', async () => {
    const { visitor: owner, session } = await openShop(server);
    const operator = await addPerson(server, session.shop.id, 'operator');
    expect((await operator.visitor.post('/api/jobs', { name: 'Job' })).status).toBe(403);
    expectStatus(await change(owner, operator.session.user.id, { role: 'designer' }), 204);
    expectStatus(await operator.visitor.post('/api/jobs', { name: 'Job' }), 201);
  });

  it('When access is taken away, then sessions end at once, and signing in is refused like a wrong password', async () => {
    const { visitor: owner, session } = await openShop(server);
    const { visitor, session: theirs } = await addPerson(server, session.shop.id, 'designer');
    const { id, email } = theirs.user;
    expectStatus(await change(owner, id, { disabled: true }), 204);
    expect((await visitor.get('/api/jobs')).status).toBe(401);
    const rows = await server.database.queries.select().from(sessions);
    expect(rows.filter(({ userId }) => userId === id)).toEqual([]);
    const refused = await server.visitor().post('/api/sign-in', { email, password: PASSWORD });
    const wrong = await server.visitor().post('/api/sign-in', { email, password: 'not the password' });
    expect(refused.status).toBe(401);
    expect(refused.json()).toEqual(wrong.json());
    expect((await listOf(owner)).people.map(({ disabled }) => disabled)).toContain(true);
    expectStatus(await change(owner, id, { disabled: false }), 204);
    expectStatus(await server.visitor().post('/api/sign-in', { email, password: PASSWORD }), 200);
  });

  it('When the last owner would go, then that is refused in clear words', async () => {
    const { visitor: owner, session } = await openShop(server);
    const answer = await change(owner, session.user.id, { disabled: true });
    expect(answer.status).toBe(409);
    expect(answer.json()).toEqual({
      code: 'last-owner',
      message: 'A shop needs an owner. Make somebody else an owner first.',
    });
    expect(await isIn(owner)).toBe(true);
  });

  it('When an owner without access is the only other one, then the last with access still cannot go', async () => {
    const { visitor: owner, session } = await openShop(server);
    const other = await addPerson(server, session.shop.id, 'owner');
    expectStatus(await change(owner, other.session.user.id, { disabled: true }), 204);
    expect((await change(owner, session.user.id, { disabled: true })).json().code).toBe('last-owner');
  });

  it('When two owners put each other out at once, then one stays', async () => {
    const { visitor: one, session } = await openShop(server);
    const { visitor: two, session: other } = await addPerson(server, session.shop.id, 'owner');
    await Promise.all([
      change(one, other.user.id, { disabled: true }),
      change(two, session.user.id, { role: 'operator' }),
    ]);
    const rows = await server.database.queries.select().from(users);
    const owners = rows.filter((u) => u.shopId === session.shop.id && u.role === 'owner' && !u.disabled);
    expect(owners).toHaveLength(1);
  });

  it('When somebody changes their own role, then that is refused', async () => {
    const { visitor: owner, session } = await openShop(server);
    await addPerson(server, session.shop.id, 'owner');
    const answer = await change(owner, session.user.id, { role: 'designer' });
    expect([answer.status, answer.json().code]).toEqual([409, 'own-role']);
    expect((await listOf(owner)).people.find(({ id }) => id === session.user.id)?.role).toBe('owner');
  });

  it('When a change says both or neither, then it is refused', async () => {
    const { visitor: owner, session } = await openShop(server);
    const { id } = (await addPerson(server, session.shop.id, 'designer')).session.user;
    for (const body of [{}, { role: 'operator', disabled: true }, { role: 'king' }])
      expect((await change(owner, id, body)).status).toBe(400);
  });
});

describe('The demo shop', () => {
  it('When somebody joins it, then nobody else enters as them, and its own people stay as they are', async () => {
    const demo = await startTestServer({}, server);
    await demo.services.session.openDemoShop(DEMO_SHOP, DEMO_PEOPLE);
    const owner = demo.visitor();
    expectStatus(await owner.post('/api/demo-sign-in', { role: 'owner' }), 200);
    const { token, email } = await invite(owner, anAddress(), 'designer');
    expectStatus(await join(demo.visitor(), token), 201);

    const entered = expectStatus(await demo.visitor().post('/api/demo-sign-in', { role: 'designer' }), 200);
    expect(entered.json()).toMatchObject({ user: { name: 'Joss Quillby' } });
    const { people } = await listOf(owner);
    expect(people.find((p) => p.email === email)?.demo).toBe(false);
    const joss = people.find(({ name }) => name === 'Joss Quillby')!;
    expect(joss.demo).toBe(true);
    for (const body of [{ disabled: true }, { role: 'operator' }]) {
      const answer = await owner.patch(`/api/people/${joss.id}`, body);
      expect([answer.status, answer.json().code]).toEqual([409, 'demo-person']);
    }
    await demo.close();
  });
});
