import { eq } from 'drizzle-orm';
import { mails } from '../../server/db/schema.ts';
import { queueMail } from '../../server/mail/queue-mail.ts';
import type { TestServer } from '../setup/test-server.ts';

let count = 0;

/** Queues a mail of a shop; answers its id. */
export async function addMail(
  { database }: TestServer,
  shopId: string,
  given: { subject?: string; text?: string; to?: string } = {},
): Promise<string> {
  const event = `test:${++count}`;
  const mail = { to: 'tern@shop.example', subject: 'A mail', text: 'Its words', html: '<p>Its words</p>', ...given };
  await database.transaction((tx) => queueMail(tx, { event, shopId, ...mail }));
  const [row] = await database.queries.select({ id: mails.id }).from(mails).where(eq(mails.event, event));
  return row!.id;
}
