import { eq } from 'drizzle-orm';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { MOST_MAILS, openedMail, outboxList } from '../../../shared/contracts/outbox.ts';
import { mails } from '../../../server/db/schema.ts';
import { mailsStore } from '../../../server/mail/mails.store.ts';
import { queueMail } from '../../../server/mail/queue-mail.ts';
import { addMail } from '../../builders/mails.ts';
import { expectStatus, openShop, type SignedInVisitor } from '../../builders/shops.ts';
import { allowSlowMachine } from '../../setup/slow-machine.ts';
import { startTestServer, type TestServer } from '../../setup/test-server.ts';

allowSlowMachine();

const MAIL = { url: 'smtp://127.0.0.1:1', from: 'frames@shop.example' };
const AT = new Date(Date.UTC(2026, 2, 31, 9));
const SOON = new Date(Date.UTC(2026, 2, 31, 9, 1));

let reading: TestServer;
let sending: TestServer;
let owner: SignedInVisitor;
beforeAll(async () => {
  reading = await startTestServer();
  sending = await startTestServer({ mail: MAIL }, reading);
});
afterAll(async () => {
  await sending.close();
  await reading.close();
});

const list = async ({ visitor }: SignedInVisitor) => outboxList.parse((await visitor.get('/api/outbox')).json());
const open = async ({ visitor }: SignedInVisitor, id: string) =>
  openedMail.parse(expectStatus(await visitor.get(`/api/outbox/${id}`), 200).json());

describe('The outbox of a server without a mail server', () => {
  beforeAll(async () => void (owner = await openShop(reading)));

  it('When mails were queued, then the owner has them newest first, and reads them at once', async () => {
    expect(await list(owner)).toEqual({ sending: false, mails: [] });
    const first = await addMail(reading, owner.session.shop.id, { subject: 'First', to: 'tern@shop.example' });
    const second = await addMail(reading, owner.session.shop.id, {
      subject: 'Second',
      text: 'Go to https://a.example',
    });
    const { mails: listed } = await list(owner);
    expect(listed).toMatchObject([
      { id: second, subject: 'Second', state: 'outbox', tries: 0, lastError: null, sentAt: null, dueAt: null },
      { id: first, subject: 'First', to: 'tern@shop.example' },
    ]);
    expect((await open(owner, second)).text).toBe('Go to https://a.example');
    await mailsStore(reading.database).keepForReading();
    expect(await open(owner, second)).toMatchObject({ state: 'outbox', text: 'Go to https://a.example' });
  });

  it('When a mail is of another shop or of none, then the owner neither sees it nor opens it', async () => {
    const other = await openShop(reading);
    const theirs = await addMail(reading, other.session.shop.id, { subject: 'Theirs' });
    await reading.database.transaction((tx) =>
      queueMail(tx, { event: 'of none', shopId: null, to: 'a@b.example', subject: 'Of none', text: '', html: '' }),
    );
    const subjects = (await list(owner)).mails.map(({ subject }) => subject);
    expect(subjects).not.toContain('Theirs');
    expect(subjects).not.toContain('Of none');
    expect((await owner.visitor.get(`/api/outbox/${theirs}`)).status).toBe(404);
  });

  it('When there are more mails than it lists, then it has the newest', async () => {
    const { session, visitor } = await openShop(reading);
    for (let i = 0; i <= MOST_MAILS; i++) await addMail(reading, session.shop.id, { subject: `Mail ${i}` });
    const { mails: listed } = await list({ session, visitor });
    expect(listed).toHaveLength(MOST_MAILS);
    expect(listed[0]!.subject).toBe(`Mail ${MOST_MAILS}`);
    expect(listed.at(-1)!.subject).toBe('Mail 1');
  });
});

describe('The outbox of a server with a mail server', () => {
  beforeAll(async () => void (owner = await openShop(sending)));

  it('When a mail waits, was put off, failed or was sent, then it says so, and its words are for nobody here', async () => {
    const id = await addMail(sending, owner.session.shop.id, { text: 'https://frames.example/join/secret' });
    const store = mailsStore(sending.database);
    const claim = async () => {
      // Other mails of this file are no part of this.
      await sending.database.queries.update(mails).set({ state: 'waiting', dueAt: null }).where(eq(mails.id, id));
      for (;;) {
        const claimed = await store.claim(AT, SOON);
        if (claimed!.id === id) return claimed!;
      }
    };
    expect((await list(owner)).sending).toBe(true);
    expect(await open(owner, id)).toMatchObject({ state: 'waiting', dueAt: null, text: null });
    await store.putOff(await claim(), SOON, 'come again');
    const dueAt = SOON.toISOString();
    expect(await open(owner, id)).toMatchObject({
      state: 'waiting',
      tries: 1,
      dueAt,
      lastError: 'come again',
      text: null,
    });
    await store.markFailed(await claim(), 'no such person');
    expect(await open(owner, id)).toMatchObject({
      state: 'failed',
      dueAt: null,
      lastError: 'no such person',
      text: null,
    });
    await store.markSent(await claim(), AT);
    expect(await open(owner, id)).toMatchObject({
      state: 'sent',
      sentAt: AT.toISOString(),
      lastError: null,
      text: null,
    });
  });
});
