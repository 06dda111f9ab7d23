import { mkdirSync, mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { createServer } from 'node:http';
import type { AddressInfo } from 'node:net';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import express from 'express';
import { pino } from 'pino';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { finishApp } from '../../../server/app.ts';
import { serveBuiltClient } from '../../../server/http/serve-client.ts';
import { HttpClient } from '../../setup/http-client.ts';

const folder = mkdtempSync(join(tmpdir(), 'stilepost-client-'));
const server = createServer();
let visitor: HttpClient;

beforeAll(async () => {
  mkdirSync(join(folder, 'assets'));
  writeFileSync(join(folder, 'index.html'), '<!doctype html>the page');
  writeFileSync(join(folder, 'icon.svg'), '<svg/>');
  writeFileSync(join(folder, 'assets/main-1234.js'), 'run()');
  const app = express();
  await serveBuiltClient(folder)(app, server);
  finishApp(app, pino({ level: 'silent' }));
  server.on('request', app);
  await new Promise<void>((resolve) => server.listen(0, '127.0.0.1', resolve));
  visitor = new HttpClient(`http://127.0.0.1:${(server.address() as AddressInfo).port}`);
});
afterAll(() => {
  server.close();
  server.closeAllConnections();
  rmSync(folder, { recursive: true });
});

const text = async (path: string) => new TextDecoder().decode((await visitor.get(path)).bytes);

describe('Serving the built client', () => {
  it.each(['/', '/jobs', '/jobs/1/frames/2', '/sign-in?from=%2Fjobs'])(
    'When the address is %s, then the page comes, fresh each time',
    async (path) => {
      const answer = await visitor.get(path);
      expect(answer.headers.get('content-type')).toContain('text/html');
      expect(answer.headers.get('cache-control')).toBe('no-cache');
      expect(await text(path)).toContain('the page');
    },
  );

  it('When a chunk is asked for, then it may be kept for ever', async () => {
    const answer = await visitor.get('/assets/main-1234.js');
    expect(answer.headers.get('content-type')).toContain('javascript');
    expect(answer.headers.get('cache-control')).toContain('immutable');
  });

  it('When a chunk of an older build is asked for, then that is 404 and not the page', async () => {
    expect((await visitor.get('/assets/main-0000.js')).status).toBe(404);
  });

  it('When another file of the client is asked for, then it comes', async () => {
    expect(await text('/icon.svg')).toBe('<svg/>');
  });

  it('When the address climbs out of the folder, then nothing of the machine comes', async () => {
    for (const path of ['/assets/..%2f..%2f..%2fetc%2fpasswd', '/..%2f..%2fetc%2fpasswd'])
      expect(await text(path)).not.toContain('root:');
  });

  it('When there is no built client, then it says what to do', () => {
    expect(() => serveBuiltClient(join(folder, 'nowhere'))).toThrow('npm run build');
  });
});
