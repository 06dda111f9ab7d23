import type { Config } from '../config.ts';
import type { Database } from './database.ts';

/** Opens what the configuration names: a PostgreSQL server, or the database in the data folder. Only the driver in use is loaded. */
export async function openDatabase(
  config: Config,
  migrationsFolder: string,
  say: (line: string) => void,
): Promise<Database> {
  if (config.databaseUrl !== undefined) {
    say('Opening the database that DATABASE_URL names …');
    return (await import('./open-postgres.ts')).openPostgres(config.databaseUrl, migrationsFolder);
  }
  return (await import('./open-embedded.ts')).openEmbedded(config.dataDir, migrationsFolder, say);
}
