import { drizzle } from 'drizzle-orm/node-postgres';
import { migrate } from 'drizzle-orm/node-postgres/migrator';
import pg from 'pg';
import { guardDatabase, type Database, type Queries } from './database.ts';
import * as schema from './schema.ts';

/** Any number that only this product locks by. */
const MIGRATION_LOCK = 5_715_411;

/** Opens a PostgreSQL server. Several processes may start at once: one migrates, the others wait for it. */
export async function openPostgres(url: string, migrationsFolder: string): Promise<Database> {
  const pool = new pg.Pool({ connectionString: url, max: 10, connectionTimeoutMillis: 10_000 });
  // An idle connection that breaks is replaced by the pool; without a listener it would end the process.
  pool.on('error', (error) => process.stderr.write(`database connection lost: ${error.message}\n`));
  const client = await pool.connect();
  try {
    await client.query('SELECT pg_advisory_lock($1)', [MIGRATION_LOCK]);
    await migrate(drizzle(client), { migrationsFolder });
  } finally {
    await client.query('SELECT pg_advisory_unlock($1)', [MIGRATION_LOCK]);
    client.release();
  }
  return guardDatabase(drizzle(pool, { schema }) as unknown as Queries, () => pool.end());
}
