import type { Logger } from 'pino';
import type { Database } from '../db/database.ts';
import type { MailTransport } from './mail-transport.ts';
import { mailsStore } from './mails.store.ts';
import { sendDueMail } from './send-due-mail.ts';

const SECOND = 1_000;
const LOOK_EVERY = SECOND;
/** A mail under way gets this long to end when the mailer is asked to stop. Later its claim runs out, and it is sent again under the same Message-ID. */
const LAST_ORDERS = 10 * SECOND;

export interface Mailer {
  /** Begins no other mail, and waits for the one under way. */
  close(): Promise<void>;
}

/** Waits, or less long when the signal comes. */
const pause = (ms: number, signal: AbortSignal): Promise<void> =>
  new Promise((resolve) => {
    const end = () => {
      clearTimeout(timer);
      signal.removeEventListener('abort', end);
      resolve();
    };
    const timer = setTimeout(end, ms);
    signal.addEventListener('abort', end);
    if (signal.aborted) end();
  });

/** Sends mails as they fall due, one at a time. Without a transport they are put where the owner reads them. */
export function startMailer(
  database: Database,
  transport: MailTransport | undefined,
  now: () => Date,
  log: Logger,
  lookEvery = LOOK_EVERY,
): Mailer {
  const store = mailsStore(database);
  const stopping = new AbortController();
  const step = async (): Promise<boolean> => {
    if (transport) return sendDueMail({ store, transport, now, log });
    await store.keepForReading();
    return false;
  };
  const run = async (): Promise<void> => {
    while (!stopping.signal.aborted) {
      const more = await step().catch((error: unknown) => {
        log.error({ err: error }, 'the queue of mails could not be worked off');
        return false;
      });
      if (!more) await pause(lookEvery, stopping.signal);
    }
  };
  const running = run();
  return {
    async close() {
      stopping.abort();
      const enough = new AbortController();
      await Promise.race([running, pause(LAST_ORDERS, enough.signal)]);
      enough.abort();
    },
  };
}
