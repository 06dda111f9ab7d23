import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { openShop, type SignedInVisitor } from '../../builders/shops.ts';
import { allowSlowMachine } from '../../setup/slow-machine.ts';
import { startTestServer, type TestServer } from '../../setup/test-server.ts';

allowSlowMachine();

let server: TestServer;
let shop: SignedInVisitor;
beforeAll(async () => {
  server = await startTestServer();
  shop = await openShop(server);
});
afterAll(() => server.close());

const addJob = (headers: Record<string, string>) =>
  shop.visitor.send('POST', '/api/jobs', { body: { name: 'Job' }, headers });

describe("Requests from another site's page", () => {
  it.each(['cross-site', 'same-site'])('When Sec-Fetch-Site says %s, then a change is refused', async (site) => {
    const answer = await addJob({ 'Sec-Fetch-Site': site });
    expect(answer.status).toBe(403);
    expect(answer.json().code).toBe('cross-site');
  });

  it.each(['same-origin', 'none'])('When Sec-Fetch-Site says %s, then a change is made', async (site) => {
    expect((await addJob({ 'Sec-Fetch-Site': site })).status).toBe(201);
  });

  it.each(['https://elsewhere.example', 'null', 'http://127.0.0.1:1'])(
    'When only Origin is sent and says %s, then a change is refused',
    async (origin) => {
      expect((await addJob({ Origin: origin })).status).toBe(403);
    },
  );

  it('When Origin is this server, then a change is made', async () => {
    expect((await addJob({ Origin: shop.visitor.url })).status).toBe(201);
  });

  it('When neither is sent, as by a program, then a change is made', async () => {
    expect((await addJob({})).status).toBe(201);
  });

  it('When another site only reads, then the browser keeps the answer from it, and the server need not', async () => {
    expect((await shop.visitor.get('/api/jobs', { 'Sec-Fetch-Site': 'cross-site' })).status).toBe(200);
  });

  it('When the session cookie is set, then scripts cannot read it and other sites cannot send it', async () => {
    const answer = await server
      .visitor()
      .post('/api/sign-up', { shopName: 'S', name: 'N', email: 'cookie@shop.example', password: '0123456789' });
    expect(answer.headers.getSetCookie()).toEqual([expect.stringMatching(/^stilepost=.*HttpOnly.*SameSite=Lax/)]);
  });
});
