import { fileURLToPath } from 'node:url';
import { readConfig, WrongConfig } from './config.ts';
import { FolderInUse } from './db/folder-lock.ts';
import { serveBuiltClient, serveClientSources } from './http/serve-client.ts';
import { startServer } from './start-server.ts';

// Run from its sources this file lies in server/, built in dist/server/; everything else is found from there.
const here = import.meta.url;
const fromSources = here.endsWith('.ts');
const root = new URL(fromSources ? '../' : '../../', here);
const place = (path: string): string => fileURLToPath(new URL(path, root));

const say = (line: string): void => console.log(line);

async function run(): Promise<void> {
  const config = readConfig(process.env);
  const useSources = fromSources && !config.production;
  const client = {
    fromSources: useSources,
    serve: useSources ? serveClientSources(place('.')) : serveBuiltClient(place('dist/client')),
  };
  const worker = new URL(fromSources ? './workers/make.ts' : './workers/make.js', here);
  const running = await startServer(
    config,
    { migrations: place('drizzle'), samples: place('samples'), worker },
    client,
    say,
  );
  say(`Stilepost is ready: ${running.url}`);

  let stopping = false;
  const stop = (): void => {
    // Asked twice, somebody is in a hurry.
    if (stopping) process.exit(1);
    stopping = true;
    say('Stopping …');
    running.close().then(
      () => process.exit(0),
      (error: unknown) => fail(error),
    );
  };
  process.on('SIGINT', stop);
  process.on('SIGTERM', stop);
}

function fail(error: unknown): void {
  const known = error instanceof FolderInUse || error instanceof WrongConfig;
  const inUse = error instanceof Error && 'code' in error && error.code === 'EADDRINUSE';
  if (inUse) console.error(`${error.message}. Another program has this port: start with another PORT.`);
  else console.error(known ? error.message : error);
  process.exit(1);
}

run().catch(fail);
