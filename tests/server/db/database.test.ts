import { readFileSync, rmSync, mkdtempSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { sql } from 'drizzle-orm';
import type { PGlite } from '@electric-sql/pglite';
import { afterAll, beforeAll, describe, expect, inject, it, vi } from 'vitest';
import type { Database } from '../../../server/db/database.ts';
import { DurableNodeFs } from '../../../server/db/durable-node-fs.ts';
import { openEmbedded, openInMemory } from '../../../server/db/open-embedded.ts';
import { shops } from '../../../server/db/schema.ts';

const migrations = join(import.meta.dirname, '../../../drizzle');

describe('A database in memory', () => {
  let database: Database;
  beforeAll(async () => {
    database = await openInMemory(migrations, new Blob([readFileSync(inject('migratedDatabase'))]));
  });
  afterAll(() => database.close());

  it('When it is queried beside its own open transaction, then that is an error and not a hang', async () => {
    const nested = database.transaction(async (tx) => {
      await tx.$count(shops);
      return database.queries.$count(shops);
    });
    await expect(nested).rejects.toThrow('inside its own transaction');
    await expect(database.transaction(() => database.transaction(async () => 1))).rejects.toThrow(
      'inside its own transaction',
    );
    expect(await database.queries.$count(shops)).toBe(0);
  });

  it('When a transaction throws, then nothing of it stays', async () => {
    const failing = database.transaction(async (tx) => {
      await tx
        .insert(shops)
        .values({ id: 's', name: 'S', unit: 'in', paper: 'A4', defaultProfileId: 'x', createdAt: new Date() });
      throw new Error('changed my mind');
    });
    await expect(failing).rejects.toThrow('changed my mind');
    expect(await database.queries.$count(shops)).toBe(0);
  });
});

describe('A database in a folder', () => {
  const folder = mkdtempSync(join(tmpdir(), 'stilepost-db-'));
  afterAll(() => rmSync(folder, { recursive: true, force: true }));

  it('When it is made, then every confirmed write has reached the disk, and a second opening is refused', async () => {
    const init = vi.spyOn(DurableNodeFs.prototype, 'init');
    const database = await openEmbedded(folder, migrations, () => undefined);
    const settings = await database.queries.execute(
      sql`select name, setting from pg_settings where name in ('fsync', 'wal_sync_method', 'synchronous_commit') order by name`,
    );
    expect(settings).toMatchObject({
      rows: [
        { name: 'fsync', setting: 'on' },
        { name: 'synchronous_commit', setting: 'on' },
        { name: 'wal_sync_method', setting: 'fsync' },
      ],
    });
    const client = init.mock.calls[0]![0] as PGlite & {
      Module: { NODEFS: { stream_ops: { fsync: (stream: unknown) => number } } };
    };
    const fsync = vi.spyOn(client.Module.NODEFS.stream_ops, 'fsync');
    for (let i = 0; i < 5; i++) {
      const before = fsync.mock.calls.length;
      await database.queries
        .insert(shops)
        .values({ id: `s${i}`, name: 'S', unit: 'in', paper: 'A4', defaultProfileId: 'x', createdAt: new Date() });
      expect(fsync.mock.calls.length).toBeGreaterThan(before);
    }
    await expect(openEmbedded(folder, migrations, () => undefined)).rejects.toThrow(/in use by another Stilepost/);
    await database.close();

    const again = await openEmbedded(folder, migrations, () => undefined);
    expect(await again.queries.$count(shops)).toBe(5);
    await again.close();
  }, 120_000);
});
