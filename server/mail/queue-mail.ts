import { randomUUID } from 'node:crypto';
import type { Queries } from '../db/database.ts';
import { mails } from '../db/schema.ts';

interface QueuedMail {
  /** What happened, once and for all, such as 'invitation:<id>'. A second mail for the same event is not queued. */
  readonly event: string;
  /** Whose outbox shows it; null for a mail of no shop. */
  readonly shopId: string | null;
  readonly to: string;
  readonly subject: string;
  readonly text: string;
  readonly html: string;
}

/** Queues a mail in the transaction of its event: it goes out when that commits, and never when it does not. */
export async function queueMail(tx: Queries, mail: QueuedMail): Promise<void> {
  await tx
    .insert(mails)
    .values({ id: randomUUID(), ...mail })
    .onConflictDoNothing({ target: mails.event });
}
