import { mkdtempSync, rmSync } from 'node:fs';
import { readFile } from 'node:fs/promises';
import { createServer } from 'node:http';
import type { AddressInfo } from 'node:net';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import type { Express } from 'express';
import { pino } from 'pino';
import { inject } from 'vitest';
import { createApp, finishApp } from '../../server/app.ts';
import type { Database } from '../../server/db/database.ts';
import { openInMemory } from '../../server/db/open-embedded.ts';
import { openDiskStore } from '../../server/files/open-disk-store.ts';
import { DatabaseSessions } from '../../server/http/sessions.store.ts';
import { DRAWING_CAPS, startMakers, type Caps } from '../../server/making/start-makers.ts';
import type { Makers } from '../../server/making/tasks.ts';
import { wireServices, type Services } from '../../server/services.ts';
import { HttpClient } from './http-client.ts';

export interface TestServer {
  readonly app: Express;
  readonly database: Database;
  readonly services: Services;
  readonly makers: Makers;
  /** A visitor with a cookie jar of their own. */
  visitor(): HttpClient;
  /** Moves the server's clock on. */
  wait(seconds: number): void;
  close(): Promise<void>;
}

interface Options {
  readonly signUpsPerHour?: number;
  readonly requestsPerMinute?: number;
  readonly trustProxy?: number;
  readonly publicUrl?: string;
  readonly invitationsPerHour?: number;
  readonly mail?: { url: string; from: string };
  readonly drawingCaps?: Caps;
}

/** The whole server on a port of its own, on a database that is a copy of the migrated one. Its clock starts on 31 March 2026, 9:00 UTC, and stands. `beside`: on the database of that server. */
export async function startTestServer(options: Options = {}, beside?: TestServer): Promise<TestServer> {
  const root = join(import.meta.dirname, '../..');
  const database =
    beside?.database ??
    (await openInMemory(join(root, 'drizzle'), new Blob([await readFile(inject('migratedDatabase'))])));
  const worker = new URL('../../server/workers/make.ts', import.meta.url);
  const makers = startMakers(worker, 1);
  const tracers = startMakers(worker, 1, options.drawingCaps ?? DRAWING_CAPS);
  const fileFolder = mkdtempSync(join(tmpdir(), 'stilepost-files-'));
  let clock = Date.UTC(2026, 2, 31, 9);
  const now = () => new Date(clock);
  const services = wireServices(database, makers, now);
  const log = pino({ level: 'error' });
  const { drawingCaps: _, ...limits } = options;
  const config = {
    trustProxy: 0,
    publicUrl: undefined,
    mail: undefined,
    signUpsPerHour: 1000,
    invitationsPerHour: 1000,
    requestsPerMinute: 100_000,
    ...limits,
  };
  const sessions = new DatabaseSessions(database, now);
  const app = createApp({
    config,
    sessionSecret: 'a secret for tests, at least 32 long',
    database,
    sessions,
    services,
    makers,
    tracers,
    files: openDiskStore(fileFolder),
    now,
    log,
    fromSources: false,
  });
  finishApp(app, log);
  const server = createServer(app);
  await new Promise<void>((resolve) => server.listen(0, '127.0.0.1', resolve));
  const url = `http://127.0.0.1:${(server.address() as AddressInfo).port}`;
  return {
    app,
    database,
    services,
    makers,
    visitor: () => new HttpClient(url),
    wait: (seconds) => void (clock += seconds * 1000),
    async close() {
      await new Promise<void>((resolve) => {
        server.close(() => resolve());
        server.closeAllConnections();
      });
      await Promise.all([makers.close(), tracers.close()]);
      rmSync(fileFolder, { recursive: true, force: true });
      if (!beside) await database.close();
    },
  };
}
