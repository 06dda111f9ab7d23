import { createServer, type Server } from 'node:http';
import type { AddressInfo } from 'node:net';
import { join } from 'node:path';
import { pino } from 'pino';
import { createApp, finishApp } from './app.ts';
import type { Config } from './config.ts';
import { openDatabase } from './db/open-database.ts';
import type { ServeClient } from './http/serve-client.ts';
import { DatabaseSessions } from './http/sessions.store.ts';
import { openDiskStore } from './files/open-disk-store.ts';
import { openSmtp } from './mail/open-smtp.ts';
import { startMailer } from './mail/start-mailer.ts';
import { DRAWING_CAPS, startMakers } from './making/start-makers.ts';
import { wireServices } from './services.ts';
import { sessionSecret } from './session-secret.ts';
import { startDemo } from './start-demo.ts';

const HOUR = 60 * 60_000;
/** Requests under way get this long to end when the server is asked to stop. */
const LAST_ORDERS_MS = 5_000;

export interface Places {
  readonly migrations: string;
  readonly samples: string;
  /** Entry of the worker threads. */
  readonly worker: URL;
}

export interface RunningServer {
  readonly url: string;
  close(): Promise<void>;
}

/** Opens the database, makes the demo where that is due, and listens. `say` gets a line a step, for a newcomer. */
export async function startServer(
  config: Config,
  places: Places,
  client: { serve: ServeClient; fromSources: boolean },
  say: (line: string) => void,
): Promise<RunningServer> {
  const log = pino({ level: config.logLevel });
  const now = () => new Date();
  const database = await openDatabase(config, places.migrations, say);
  const makers = startMakers(places.worker, config.makers);
  const tracers = startMakers(places.worker, config.tracers, DRAWING_CAPS);
  const shutDown = async () => {
    await Promise.all([makers.close(), tracers.close()]);
    await database.close();
  };
  try {
    const services = wireServices(database, makers, now);
    if (config.demo) await startDemo(database, services, places.samples, say);
    const sessions = new DatabaseSessions(database, now);
    const sweep = setInterval(
      () => void sessions.sweep().catch((error: unknown) => log.error({ err: error }, 'sessions could not be swept')),
      HOUR,
    );
    sweep.unref();
    const secret = config.sessionSecret ?? sessionSecret(config.dataDir);
    const app = createApp({
      config,
      sessionSecret: secret,
      database,
      sessions,
      services,
      makers,
      tracers,
      files: openDiskStore(join(config.dataDir, 'files')),
      now,
      log,
      fromSources: client.fromSources,
    });
    const server = createServer(app);
    await client.serve(app, server);
    finishApp(app, log);
    const url = await listen(server, config);
    const mailer = startMailer(database, config.mail && openSmtp(config.mail), now, log);
    return {
      url,
      async close() {
        clearInterval(sweep);
        await stopListening(server);
        await mailer.close();
        await shutDown();
      },
    };
  } catch (error) {
    await shutDown();
    throw error;
  }
}

function listen(server: Server, { host, port }: Config): Promise<string> {
  return new Promise((resolve, reject) => {
    server.once('error', reject);
    server.listen(port, host, () => {
      const { port: taken } = server.address() as AddressInfo;
      const name = host === '0.0.0.0' || host === '::' ? 'localhost' : host.includes(':') ? `[${host}]` : host;
      resolve(`http://${name}:${taken}`);
    });
  });
}

function stopListening(server: Server): Promise<void> {
  return new Promise((resolve) => {
    const cut = setTimeout(() => server.closeAllConnections(), LAST_ORDERS_MS);
    server.close(() => {
      clearTimeout(cut);
      resolve();
    });
    server.closeIdleConnections();
  });
}
