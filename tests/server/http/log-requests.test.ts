import { createServer } from 'node:http';
import type { AddressInfo } from 'node:net';
import express from 'express';
import { pino } from 'pino';
import { expect, it } from 'vitest';
import { logRequests } from '../../../server/http/log-requests.ts';

it('When mailed links are followed, then the log has the requests and not the tokens', async () => {
  const lines: { url: string }[] = [];
  const log = pino({ level: 'info' }, { write: (line: string) => void lines.push(JSON.parse(line)) });
  const app = express();
  app.use(logRequests(log));
  app.use((_req, res) => void res.end());
  const server = createServer(app);
  await new Promise<void>((resolve) => server.listen(0, '127.0.0.1', resolve));
  const { port } = server.address() as AddressInfo;
  for (const path of ['/join/SECRET', '/api/join/SECRET?x=1', '/reset-password/SECRET', '/jobs/a'])
    await (await fetch(`http://127.0.0.1:${port}${path}`)).text();
  await new Promise<void>((resolve) => {
    server.close(() => resolve());
    server.closeAllConnections();
  });
  expect(lines.map(({ url }) => url)).toEqual(['/join/…', '/api/join/…?x=1', '/reset-password/…', '/jobs/a']);
});
