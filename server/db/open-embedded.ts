import { closeSync, existsSync, fsyncSync, mkdirSync, openSync, renameSync } from 'node:fs';
import { join } from 'node:path';
import { PGlite } from '@electric-sql/pglite';
import { drizzle } from 'drizzle-orm/pglite';
import { migrate } from 'drizzle-orm/pglite/migrator';
import { guardDatabase, type Database, type Queries } from './database.ts';
import { DurableNodeFs } from './durable-node-fs.ts';
import { lockFolder } from './folder-lock.ts';
import { keepTidy } from './keep-tidy.ts';
import * as schema from './schema.ts';

/** -F would switch fsync off; fdatasync, the default method, is a stub in the build for WebAssembly. */
const DURABLE = [...PGlite.defaultStartParams.filter((p) => p !== '-F'), '-c', 'wal_sync_method=fsync'];

/** Moves its tables up to date. */
async function migrated(client: PGlite, migrationsFolder: string, close: () => Promise<void>): Promise<Database> {
  const db = drizzle(client, { schema });
  await migrate(db, { migrationsFolder });
  return guardDatabase(db as unknown as Queries, close);
}

/**
 * Opens the database in `dataDir`, making it when there is none. Throws FolderInUse when another process has it.
 * A folder whose making was cut short holds nothing confirmed; it is set aside and made anew.
 */
export async function openEmbedded(
  dataDir: string,
  migrationsFolder: string,
  say: (line: string) => void,
): Promise<Database> {
  mkdirSync(dataDir, { recursive: true });
  const lock = lockFolder(dataDir);
  const folder = join(dataDir, 'database');
  const made = join(dataDir, 'database.made');
  try {
    if (existsSync(folder) && !existsSync(made)) {
      const aside = `${folder}.unfinished-${Date.now()}`;
      renameSync(folder, aside);
      say(`The database was not finished when it was first made. It is set aside as ${aside} and made anew.`);
    }
    say(
      existsSync(made)
        ? `Opening the database in ${dataDir} …`
        : `Making a new database in ${dataDir} (once, about 10 seconds) …`,
    );
    const client = await PGlite.create({ fs: new DurableNodeFs(folder), startParams: DURABLE });
    const tidy = keepTidy(client);
    const database = await migrated(client, migrationsFolder, async () => {
      tidy.stop();
      await client.close();
      lock.release();
    });
    if (!existsSync(made)) markMade(made);
    return database;
  } catch (error) {
    lock.release();
    throw error;
  }
}

function markMade(path: string): void {
  const handle = openSync(path, 'w');
  fsyncSync(handle);
  closeSync(handle);
}

/** A database in memory, from a dump of a migrated one or new: for tests and tools. */
export async function openInMemory(
  migrationsFolder: string,
  dump?: Blob,
): Promise<Database & { dump(): Promise<Blob> }> {
  const client = await PGlite.create(dump ? { loadDataDir: dump } : {});
  const database = await migrated(client, migrationsFolder, () => client.close());
  return Object.assign(database, { dump: () => client.dumpDataDir('none') });
}
