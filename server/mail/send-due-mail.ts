import { setTimeout } from 'node:timers/promises';
import type { Logger } from 'pino';
import { RefusedForGood, type MailTransport } from './mail-transport.ts';
import type { ClaimedMail, MailsStore } from './mails.store.ts';
import { GIVE_UP_AFTER, retryDelay } from './retry-delay.ts';

const MINUTE = 60_000;
/** A mail whose sender is not heard of for this long may be sent by another process. */
export const LEASE = 5 * MINUTE;
const RENEW_EVERY = MINUTE;
const NOTE_TRIES = 5;
const NOTE_AGAIN_AFTER = 1_000;

export interface MailerGiven {
  readonly store: MailsStore;
  readonly transport: MailTransport;
  readonly now: () => Date;
  readonly log: Logger;
}

const after = (moment: Date, ms: number): Date => new Date(moment.getTime() + ms);
const sayWhy = (error: unknown): string => (error instanceof Error ? error.message : String(error));

/** Sends the mail, keeping the claim alive meanwhile. */
async function sendClaimed({ store, transport, now, log }: MailerGiven, mail: ClaimedMail): Promise<void> {
  const renew = () =>
    store
      .renew(mail, after(now(), LEASE))
      .catch((error: unknown) => log.error({ err: error }, `claim of mail ${mail.id} could not be renewed`));
  const renewing = setInterval(() => void renew(), RENEW_EVERY);
  try {
    await transport.send(mail);
  } finally {
    clearInterval(renewing);
  }
}

/** Refused for good or tried for too long, it has failed; otherwise it is due again later. */
async function noteFailure({ store, now, log }: MailerGiven, mail: ClaimedMail, error: unknown): Promise<boolean> {
  const why = sayWhy(error);
  const at = now();
  if (error instanceof RefusedForGood || at >= after(mail.firstTriedAt, GIVE_UP_AFTER)) {
    log.error({ err: error }, `mail ${mail.id} has failed after ${mail.tries} tries`);
    return store.markFailed(mail, why);
  }
  const dueAt = after(at, retryDelay(mail.tries));
  log.warn({ err: error }, `mail ${mail.id} could not be sent, next try ${dueAt.toISOString()}`);
  return store.putOff(mail, dueAt, why);
}

/** Notes that the server took the mail. What keeps the database from it may pass, and a mail not noted goes out again. */
async function noteSent({ store, now, log }: MailerGiven, mail: ClaimedMail): Promise<boolean> {
  for (let left = NOTE_TRIES - 1; ; left--) {
    try {
      return await store.markSent(mail, now());
    } catch (error) {
      if (left === 0) throw error;
      log.error({ err: error }, `mail ${mail.id} was sent, which could not be noted yet`);
      await setTimeout(NOTE_AGAIN_AFTER);
    }
  }
}

/** Sends one mail that is due, outside any transaction, and notes what came of it. False when none was due. */
export async function sendDueMail(given: MailerGiven): Promise<boolean> {
  const { store, now, log } = given;
  const at = now();
  const mail = await store.claim(at, after(at, LEASE));
  if (!mail) return false;
  const sent = await sendClaimed(given, mail).then(
    () => ({ ok: true as const }),
    (error: unknown) => ({ ok: false as const, error }),
  );
  const noted = sent.ok ? await noteSent(given, mail) : await noteFailure(given, mail, sent.error);
  if (!noted) log.error(`mail ${mail.id} was taken over by another process while it was being sent`);
  return true;
}
