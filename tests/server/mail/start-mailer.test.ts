import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import type { Database } from '../../../server/db/database.ts';
import { openSmtp } from '../../../server/mail/open-smtp.ts';
import { startMailer } from '../../../server/mail/start-mailer.ts';
import { allowSlowMachine } from '../../setup/slow-machine.ts';
import { FROM, openQueue, queue, rows, SILENT } from './mail-queue.ts';
import { startMailServer } from './mail-server.ts';

allowSlowMachine();

const LOOK_EVERY = 10;
const WAITS = { timeout: 30_000 };

let database: Database;
beforeEach(async () => void (database = await openQueue()));
afterEach(() => database.close());

const now = () => new Date();
const states = async () => (await rows(database)).map(({ state }) => state);

describe('startMailer', () => {
  it('When two mailers work on one database, then each event is one mail', async () => {
    const server = await startMailServer({ beforeAnswer: () => new Promise((resolve) => setTimeout(resolve, 5)) });
    const senders = [0, 1].map(() => {
      const transport = openSmtp({ url: server.url, from: FROM });
      const send = vi.spyOn(transport, 'send');
      return { send, mailer: startMailer(database, transport, now, SILENT, LOOK_EVERY) };
    });
    const events = Array.from({ length: 40 }, (_, i) => `event:${i}`);
    for (const event of events) await queue(database, event);
    await vi.waitFor(async () => expect(new Set(await states())).toEqual(new Set(['sent'])), WAITS);
    const subjects = server.received.map(({ source }) => /^Subject: About (.*)$/m.exec(source)![1]!.trim());
    expect(subjects.toSorted()).toEqual(events.toSorted());
    // Both had a part in it, or this would show nothing.
    for (const { send } of senders) expect(send).toHaveBeenCalled();
    await Promise.all(senders.map(({ mailer }) => mailer.close()));
    await server.close();
  });

  it('When it is stopped while a mail is under way, then that one is noted and no other begun', async () => {
    let letGo = () => {};
    const held = new Promise<void>((resolve) => void (letGo = resolve));
    const server = await startMailServer({ beforeAnswer: () => held });
    for (const event of ['first', 'second']) await queue(database, event);
    const mailer = startMailer(database, openSmtp({ url: server.url, from: FROM }), now, SILENT, LOOK_EVERY);
    await vi.waitFor(() => expect(server.received).toHaveLength(1), WAITS);
    const closed = mailer.close();
    letGo();
    await closed;
    expect(await states()).toEqual(['sent', 'waiting']);
    expect(server.received).toHaveLength(1);
    await server.close();
  });

  it('When the database fails for a moment, then the mailer goes on', async () => {
    const server = await startMailServer();
    await queue(database, 'e');
    let failures = 0;
    const flaky: Database = {
      get queries() {
        if (failures++ < 2) throw new Error('away for a moment');
        return database.queries;
      },
      transaction: (work) => database.transaction(work),
      close: () => database.close(),
    };
    const mailer = startMailer(flaky, openSmtp({ url: server.url, from: FROM }), now, SILENT, LOOK_EVERY);
    await vi.waitFor(async () => expect(await states()).toEqual(['sent']), WAITS);
    expect(failures).toBeGreaterThan(2);
    await mailer.close();
    await server.close();
  });

  it('When there is no mail server, then mails are kept to be read, and a mail server of later does not send them', async () => {
    await queue(database, 'old');
    const keeping = startMailer(database, undefined, now, SILENT, LOOK_EVERY);
    await vi.waitFor(async () => expect(await states()).toEqual(['outbox']), WAITS);
    await keeping.close();
    expect((await rows(database))[0]!.text).toContain('Words of old');

    const server = await startMailServer();
    const mailer = startMailer(database, openSmtp({ url: server.url, from: FROM }), now, SILENT, LOOK_EVERY);
    await queue(database, 'new');
    await vi.waitFor(async () => expect(await states()).toEqual(['outbox', 'sent']), WAITS);
    expect(server.received).toHaveLength(1);
    await mailer.close();
    await server.close();
  });
});
