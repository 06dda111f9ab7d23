import { createServer, type AddressInfo } from 'node:net';
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import type { Database } from '../../../server/db/database.ts';
import { messageId } from '../../../server/mail/message-id.ts';
import { openSmtp } from '../../../server/mail/open-smtp.ts';
import { LEASE, sendDueMail } from '../../../server/mail/send-due-mail.ts';
import { allowSlowMachine } from '../../setup/slow-machine.ts';
import { FROM, mailerOn, openQueue, queue, rows } from './mail-queue.ts';
import { startMailServer, type MailServer } from './mail-server.ts';

allowSlowMachine();

const MINUTE = 60;
const HOUR = 60 * MINUTE;

let database: Database;
let servers: MailServer[] = [];
const serve = async (...given: Parameters<typeof startMailServer>): Promise<MailServer> => {
  const server = await startMailServer(...given);
  servers.push(server);
  return server;
};
beforeEach(async () => void (database = await openQueue()));
afterEach(async () => {
  vi.useRealTimers();
  await Promise.all(servers.map((server) => server.close()));
  servers = [];
  await database.close();
});

const only = async () => (await rows(database))[0]!;

// What servers answer and how a sender takes it: RFC 5321, 4.2.1 (4yz: try again, 5yz: do not).
describe('sendDueMail', () => {
  it('When the mail server takes the mail, then it is there whole, and marked as sent with its words gone', async () => {
    const server = await serve();
    const mailer = mailerOn(database, server.url);
    await queue(database, 'invitation:1');
    expect(await sendDueMail(mailer)).toBe(true);
    expect(await sendDueMail(mailer)).toBe(false);
    expect(server.received).toHaveLength(1);
    const { to, source } = server.received[0]!;
    expect(to).toEqual(['tern@shop.example']);
    expect(source).toContain('From: Stilepost <frames@shop.example>');
    expect(source).toContain('To: tern@shop.example');
    expect(source).toContain('Subject: About invitation:1');
    expect(source).toContain('Words of invitation:1: https://frames.example/join/0123456789');
    expect(source).toContain('<p>Words of invitation:1</p>');
    expect(source).toContain('Auto-Submitted: auto-generated');
    expect(await only()).toMatchObject({ state: 'sent', tries: 1, text: '', html: '', sentAt: mailer.now() });
  });

  it('When an address looks like several, then nobody gets the mail', async () => {
    const server = await serve();
    await queue(database, 'e', 'one@shop.example, two@shop.example');
    await sendDueMail(mailerOn(database, server.url));
    expect(server.received.map(({ to }) => to)).not.toContainEqual(['one@shop.example', 'two@shop.example']);
    expect((await only()).state).not.toBe('sent');
  });

  it.each([
    ['the recipient', { recipient: () => ({ code: 550, words: 'no such person' }) }, 'no such person'],
    ['the content', { content: () => ({ code: 554, words: 'not that' }) }, 'not that'],
  ])('When the server refuses %s for good, then the mail has failed at once', async (_what, manners, words) => {
    const server = await serve(manners);
    const mailer = mailerOn(database, server.url);
    await queue(database, 'e');
    expect(await sendDueMail(mailer)).toBe(true);
    expect(await only()).toMatchObject({ state: 'failed', tries: 1, lastError: expect.stringContaining(words) });
    mailer.wait(7 * 24 * HOUR);
    expect(await sendDueMail(mailer)).toBe(false);
  });

  it.each([
    ['the recipient for now', { recipient: () => ({ code: 450, words: 'come again' }) }, 'come again'],
    ['the sender, which is a setting', { sender: () => ({ code: 550, words: 'not from you' }) }, 'not from you'],
  ])('When the server refuses %s, then the mail waits', async (_what, manners, words) => {
    const mailer = mailerOn(database, (await serve(manners)).url);
    await queue(database, 'e');
    await sendDueMail(mailer);
    expect(await only()).toMatchObject({ state: 'waiting', lastError: expect.stringContaining(words) });
  });

  it('When the server is down and comes up, then the mail is tried after 1, 2 and 4 minutes and arrives once', async () => {
    const { port, close, url } = await startMailServer();
    await close();
    const mailer = mailerOn(database, url);
    await queue(database, 'e');
    expect(await sendDueMail(mailer)).toBe(true);
    for (const minutes of [1, 2]) {
      mailer.wait(minutes * MINUTE - 1);
      expect(await sendDueMail(mailer)).toBe(false);
      mailer.wait(1);
      expect(await sendDueMail(mailer)).toBe(true);
    }
    expect(await only()).toMatchObject({
      state: 'waiting',
      tries: 3,
      lastError: expect.stringContaining('ECONNREFUSED'),
    });
    const server = await serve({ port });
    mailer.wait(4 * MINUTE - 1);
    expect(await sendDueMail(mailer)).toBe(false);
    mailer.wait(1);
    expect(await sendDueMail(mailer)).toBe(true);
    expect(server.received).toHaveLength(1);
    expect(await only()).toMatchObject({ state: 'sent', tries: 4, lastError: null });
  });

  it('When the server stays down for two days, then the mail has failed, with its words kept', async () => {
    const { close, url } = await startMailServer();
    await close();
    const mailer = mailerOn(database, url);
    await queue(database, 'e');
    const begin = mailer.now().getTime();
    while ((await only()).state === 'waiting') {
      expect(await sendDueMail(mailer)).toBe(true);
      mailer.wait(6 * HOUR);
    }
    const days = (mailer.now().getTime() - begin) / (24 * HOUR * 1000);
    expect(days).toBe(2.25);
    expect(await only()).toMatchObject({ state: 'failed', tries: 9 });
    expect((await only()).text).toContain('Words of e');
  });

  it('When something listens that never speaks, then the try ends and the mail waits', async () => {
    const mute = createServer((socket) => void socket.on('error', () => undefined));
    await new Promise<void>((resolve) => mute.listen(0, '127.0.0.1', resolve));
    const url = `smtp://127.0.0.1:${(mute.address() as AddressInfo).port}`;
    const patience = { connectionTimeout: 2_000, greetingTimeout: 200, socketTimeout: 2_000 };
    await queue(database, 'e');
    await sendDueMail({ ...mailerOn(database, url), transport: openSmtp({ url, from: FROM }, patience) });
    expect(await only()).toMatchObject({ state: 'waiting', tries: 1, lastError: expect.stringMatching(/greeting/i) });
    mute.close();
  });

  it('When a process dies between sending and marking, then another sends it once its lease is out, under the same Message-ID', async () => {
    const server = await serve();
    const mailer = mailerOn(database, server.url);
    await queue(database, 'e');
    const claimed = await mailer.store.claim(mailer.now(), new Date(mailer.now().getTime() + LEASE));
    await mailer.transport.send(claimed!);
    expect(server.received).toHaveLength(1);

    mailer.wait(LEASE / 1000);
    expect(await sendDueMail(mailer)).toBe(false);
    mailer.wait(1);
    expect(await sendDueMail(mailer)).toBe(true);
    expect(server.received.map((mail) => mail.messageId)).toEqual([messageId('e', FROM), messageId('e', FROM)]);
    expect(await only()).toMatchObject({ state: 'sent', tries: 2 });
    // The first one was only slow after all: what it knows is of no account any more.
    expect(await mailer.store.putOff(claimed!, mailer.now(), 'late')).toBe(false);
    expect((await only()).state).toBe('sent');
  });

  it('When the server is slower than a lease, then the claim is kept alive and no other process sends the mail', async () => {
    let letGo = () => {};
    const held = new Promise<void>((resolve) => void (letGo = resolve));
    const server = await serve({ beforeAnswer: () => held });
    const mailer = mailerOn(database, server.url);
    await queue(database, 'e');
    vi.useFakeTimers({ toFake: ['setInterval', 'clearInterval'] });
    const sending = sendDueMail(mailer);
    await vi.waitFor(() => expect(server.received).toHaveLength(1));
    for (let minute = 1; minute <= 12; minute++) {
      mailer.wait(MINUTE);
      const until = mailer.now().getTime() + LEASE;
      vi.advanceTimersByTime(60_000);
      await vi.waitFor(async () => expect((await only()).claimedUntil?.getTime()).toBe(until));
      expect(await sendDueMail(mailer)).toBe(false);
    }
    letGo();
    await sending;
    expect(server.received).toHaveLength(1);
    expect(await only()).toMatchObject({ state: 'sent', tries: 1 });
  });

  it('When the database cannot be told at first that a mail was sent, then it is told again and nothing is sent twice', async () => {
    const server = await serve();
    const mailer = mailerOn(database, server.url);
    await queue(database, 'e');
    const markSent = vi.spyOn(mailer.store, 'markSent').mockRejectedValueOnce(new Error('away for a moment'));
    await sendDueMail(mailer);
    expect(markSent).toHaveBeenCalledTimes(2);
    expect(server.received).toHaveLength(1);
    expect((await only()).state).toBe('sent');
  });
});
