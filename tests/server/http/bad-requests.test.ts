import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { ERROR_CODES, errorBody, type ErrorBody } from '../../../shared/contracts/error-codes.ts';
import { LIMITS } from '../../../shared/contracts/limits.ts';
import { AppError, statusOf } from '../../../server/errors.ts';
import { aFrame } from '../../builders/particulars.ts';
import { openShopWithFrame } from '../../builders/shops.ts';
import type { Answer, HttpClient } from '../../setup/http-client.ts';
import { allowSlowMachine } from '../../setup/slow-machine.ts';
import { startTestServer, type TestServer } from '../../setup/test-server.ts';

allowSlowMachine();

let server: TestServer;
let visitor: HttpClient;
let jobId: string;
beforeAll(async () => {
  server = await startTestServer();
  const shop = await openShopWithFrame(server);
  visitor = shop.visitor;
  jobId = shop.job.id;
});
afterAll(() => server.close());

/** The error, once it fits the contract that the client decodes with. */
const errorOf = (answer: Answer): ErrorBody => errorBody.parse(answer.json());

describe('Bad requests', () => {
  it('When the body is no JSON, then the answer is JSON and says what is wrong with it', async () => {
    const answer = await visitor.send('POST', '/api/jobs', { body: '{"name": ' });
    expect(answer.status).toBe(400);
    expect(errorOf(answer)).toMatchObject({
      code: 'invalid-input',
      message: expect.stringContaining('not valid JSON') as string,
    });
  });

  it('When the body is larger than allowed, then it is refused with the limit', async () => {
    const answer = await visitor.send('POST', '/api/jobs', { body: `{"name": "${'x'.repeat(LIMITS.jsonBodyBytes)}"}` });
    expect(answer.status).toBe(413);
    expect(errorOf(answer).message).toContain(String(LIMITS.jsonBodyBytes));
  });

  it('When fields of a frame are wrong, then each is named by its path with what it got and takes', async () => {
    const particulars = { ...aFrame({ 'dados.0.depth': -1, 'cutters.opening.kind': 'laser' }), colour: 'white' };
    const answer = await visitor.post(`/api/jobs/${jobId}/frames`, { particulars });
    expect(answer.status).toBe(400);
    const { fields = [] } = errorOf(answer);
    expect(fields.map((f) => f.path).sort()).toEqual([
      'particulars.colour',
      'particulars.cutters.opening.kind',
      'particulars.dados.0.depth',
    ]);
    expect(fields.find((f) => f.path === 'particulars.dados.0.depth')).toMatchObject({
      got: '-1',
      takes: 'a length above 0',
    });
    for (const field of fields) expect(field.message).toContain(field.takes);
  });

  it('When the body is missing, then the fields that are needed are named', async () => {
    const answer = await visitor.post('/api/jobs');
    expect(answer.status).toBe(400);
    expect(errorOf(answer).fields).toMatchObject([{ path: 'name', got: 'nothing' }]);
  });

  it.each(['\u0000', 'line\nbreak', '   ', ''])('When a name is %j, then it is refused', async (name) => {
    expect((await visitor.post('/api/jobs', { name })).status).toBe(400);
  });

  it('When a query is not known, then it is named', async () => {
    const answer = await visitor.get('/api/jobs?sort=name');
    expect(answer.status).toBe(400);
    expect(errorOf(answer).fields).toMatchObject([{ path: 'sort' }]);
  });

  it.each([
    '/api/nothing',
    '/api/frames/%E0%A4%A',
    '/api/frames/%00',
    '/api/frames/..%2f..%2fetc%2fpasswd',
    '/api/frames/a%27%20or%201=1',
  ])('When the path is %s, then it answers 404 as JSON', async (path) => {
    const answer = await visitor.get(path);
    expect(answer.status).toBe(404);
    expect(errorOf(answer).code).toBe('not-found');
  });

  it('When a body is not UTF-8 or of an unknown encoding, then it is refused and the server goes on', async () => {
    const answer = await visitor.send('POST', '/api/jobs', { body: '{}', headers: { 'Content-Encoding': 'sausage' } });
    expect(answer.status).toBe(400);
    expect((await visitor.get('/healthz')).status).toBe(200);
  });

  it('When something nobody foresaw goes wrong, then the answer tells nothing of the inside', () => {
    expect(new AppError('internal', 'secret detail').userMessage).not.toContain('secret');
    expect(statusOf('internal')).toBe(500);
  });

  it('When codes are listed, then each has a status of an error and a sentence', () => {
    for (const code of ERROR_CODES) {
      expect(statusOf(code)).toBeGreaterThanOrEqual(400);
      expect(new AppError(code, '').userMessage).toMatch(/^[A-Z].*\.$/);
    }
  });

  it('When any answer is sent, then it carries the security headers, and those of HTTPS under HTTPS only', async () => {
    const { headers } = await visitor.get('/healthz');
    const policy = headers.get('content-security-policy') ?? '';
    expect(policy).toContain("script-src 'self';");
    expect(policy).toContain("style-src 'self';");
    expect(policy).not.toContain('unsafe');
    expect(headers.get('strict-transport-security')).toBeNull();
    expect(headers.get('x-powered-by')).toBeNull();
    expect((await visitor.get('/api/session')).headers.get('cache-control')).toContain('private');
  });

  it('When a trusted proxy says HTTPS, then the headers of HTTPS are sent and the cookie is for HTTPS only', async () => {
    const behind = await startTestServer({ trustProxy: 1 }, server);
    const headers = { 'X-Forwarded-Proto': 'https', 'X-Forwarded-For': '203.0.113.7' };
    const body = { shopName: 'S', name: 'N', email: 'proxy@shop.example', password: '0123456789' };
    const answer = await behind.visitor().send('POST', '/api/sign-up', { body, headers });
    expect(answer.headers.get('strict-transport-security')).toContain('max-age');
    expect(answer.headers.getSetCookie()[0]).toContain('Secure');
    await behind.close();
  });

  it('When one address asks too often, then it is told to wait', async () => {
    const busy = await startTestServer({ requestsPerMinute: 3 }, server);
    const hasty = busy.visitor();
    for (let i = 0; i < 3; i++) expect((await hasty.get('/api/session')).status).toBe(200);
    const answer = await hasty.get('/api/session');
    expect(answer.status).toBe(429);
    expect(errorOf(answer).code).toBe('too-many-requests');
    expect(Number(answer.headers.get('retry-after'))).toBeGreaterThan(0);
    await busy.close();
  });
});
