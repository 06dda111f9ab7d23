import { join } from 'node:path';
import { readConfig } from '../../server/config.ts';
import { startServer } from '../../server/start-server.ts';

// The server in a process of its own without the client, which takes longer to start than all the rest.
const root = join(import.meta.dirname, '../..');
const places = {
  migrations: join(root, 'drizzle'),
  samples: join(root, 'samples'),
  worker: new URL('../../server/workers/make.ts', import.meta.url),
};
const { url } = await startServer(
  readConfig(process.env),
  places,
  { serve: async () => undefined, fromSources: false },
  console.log,
);
console.log(`ready: ${url}`);
