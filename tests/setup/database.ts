import { mkdtemp, rm, writeFile } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import type { TestProject } from 'vitest/node';
import { openInMemory } from '../../server/db/open-embedded.ts';

declare module 'vitest' {
  interface ProvidedContext {
    /** Path of a dump of a migrated, empty database. */
    migratedDatabase: string;
  }
}

/** One migrated database for all test files: making one takes seconds, loading a dump of it much less. */
export async function setup(project: TestProject): Promise<() => Promise<void>> {
  const folder = await mkdtemp(join(tmpdir(), 'stilepost-tests-'));
  const path = join(folder, 'migrated.tar');
  const database = await openInMemory(join(import.meta.dirname, '../../drizzle'));
  await writeFile(path, Buffer.from(await (await database.dump()).arrayBuffer()));
  await database.close();
  project.provide('migratedDatabase', path);
  return () => rm(folder, { recursive: true, force: true });
}
