import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import type { Database } from '../../../server/db/database.ts';
import { messageId } from '../../../server/mail/message-id.ts';
import { queueMail } from '../../../server/mail/queue-mail.ts';
import { GIVE_UP_AFTER, retryDelay } from '../../../server/mail/retry-delay.ts';
import { aMail, openQueue, queue, rows } from './mail-queue.ts';

let database: Database;
beforeAll(async () => void (database = await openQueue()));
afterAll(() => database.close());

describe('queueMail', () => {
  it("When the event's transaction fails, then there is no mail", async () => {
    const failing = database.transaction(async (tx) => {
      await queueMail(tx, aMail('changed my mind'));
      throw new Error('changed my mind');
    });
    await expect(failing).rejects.toThrow('changed my mind');
    expect(await rows(database)).toEqual([]);
  });

  it('When an event is queued twice, then the first mail stays and is the only one', async () => {
    await queue(database, 'twice', 'first@shop.example');
    await queue(database, 'twice', 'second@shop.example');
    expect(await rows(database)).toMatchObject([{ event: 'twice', to: 'first@shop.example', state: 'waiting' }]);
  });
});

describe('messageId', () => {
  // RFC 5322, 3.6.4: "<" id-left "@" id-right ">".
  it('When the event is the same, then it is, at the domain of the sender; another event has another', () => {
    const one = messageId('a', 'Stilepost <frames@shop.example>');
    expect(one).toMatch(/^<[0-9a-f]{32}@shop\.example>$/);
    expect(messageId('a', 'frames@shop.example')).toBe(one);
    expect(messageId('b', 'frames@shop.example')).not.toBe(one);
  });

  it('When the sender has no address, then it throws with what it got', () => {
    expect(() => messageId('a', 'Stilepost')).toThrow('"Stilepost"');
  });
});

describe('retryDelay', () => {
  it('When tries fail one after the other, then it doubles from a minute up to six hours', () => {
    const minutes = Array.from({ length: 12 }, (_, i) => retryDelay(i + 1) / 60_000);
    expect(minutes).toEqual([1, 2, 4, 8, 16, 32, 64, 128, 256, 360, 360, 360]);
    expect(GIVE_UP_AFTER).toBe(2 * 24 * 60 * 60_000);
  });

  it.each([0, -1, 1.5, NaN])('When there were %s tries, then it throws with the value', (tries) => {
    expect(() => retryDelay(tries)).toThrow(String(tries));
  });
});
