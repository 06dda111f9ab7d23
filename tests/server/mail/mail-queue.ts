import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import { asc } from 'drizzle-orm';
import { pino } from 'pino';
import { inject } from 'vitest';
import type { Database } from '../../../server/db/database.ts';
import { openInMemory } from '../../../server/db/open-embedded.ts';
import { mails } from '../../../server/db/schema.ts';
import { openSmtp } from '../../../server/mail/open-smtp.ts';
import { mailsStore } from '../../../server/mail/mails.store.ts';
import { queueMail } from '../../../server/mail/queue-mail.ts';

export const FROM = 'Stilepost <frames@shop.example>';
export const SILENT = pino({ level: 'silent' });

export const openQueue = (): Promise<Database> =>
  openInMemory(join(import.meta.dirname, '../../../drizzle'), new Blob([readFileSync(inject('migratedDatabase'))]));

export const aMail = (event: string, to = 'tern@shop.example') => ({
  event,
  shopId: null,
  to,
  subject: `About ${event}`,
  text: `Words of ${event}: https://frames.example/join/0123456789`,
  html: `<p>Words of ${event}</p>`,
});

export const queue = (database: Database, event: string, to?: string): Promise<void> =>
  database.transaction((tx) => queueMail(tx, aMail(event, to)));

export const rows = (database: Database) => database.queries.select().from(mails).orderBy(asc(mails.ordinal));

/** A mailer's givens on a database, with a clock that a test moves on; it starts on 31 March 2026, 9:00 UTC. */
export function mailerOn(database: Database, url: string) {
  let clock = Date.UTC(2026, 2, 31, 9);
  return {
    store: mailsStore(database),
    transport: openSmtp({ url, from: FROM }),
    log: SILENT,
    now: () => new Date(clock),
    wait: (seconds: number) => void (clock += seconds * 1000),
  };
}
