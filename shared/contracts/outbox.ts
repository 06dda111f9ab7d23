import { z } from 'zod';

/** How many mails the outbox lists, the newest. */
export const MOST_MAILS = 200;

/**
 * 'waiting' to be sent, or to be sent again; 'sent': a mail server took it; 'failed': refused for good, or tried for two
 * days; 'outbox': there was no mail server, so it is here to be read.
 */
const mailState = z.enum(['waiting', 'sent', 'failed', 'outbox']);

export const outboxMail = z.object({
  id: z.string(),
  to: z.string(),
  subject: z.string(),
  state: mailState,
  /** How often sending was tried. */
  tries: z.number().int(),
  /** What the mail server or the way there said last; null when nothing went wrong. */
  lastError: z.string().nullable(),
  queuedAt: z.iso.datetime(),
  sentAt: z.iso.datetime().nullable(),
  /** When it is tried again; null when at once, or never. */
  dueAt: z.iso.datetime().nullable(),
});
export type OutboxMail = z.output<typeof outboxMail>;

/** GET /api/outbox (owner): the shop's mails, newest first. `sending` is false where the server has no mail server. */
export const outboxList = z.object({ sending: z.boolean(), mails: z.array(outboxMail) });
export type OutboxList = z.output<typeof outboxList>;

/**
 * GET /api/outbox/:mailId (owner). `text` is null for a mail that a mail server carries: its links are for whoever it
 * goes to, and only without a mail server is the outbox the way they get them.
 */
export const openedMail = outboxMail.extend({ text: z.string().nullable() });
export type OpenedMail = z.output<typeof openedMail>;
