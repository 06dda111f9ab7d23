import { screen, within } from '@testing-library/react';
import { describe, expect, it } from 'vitest';
import type { OutboxMail } from '#shared/contracts/outbox.ts';
import { OutboxPage } from '../../../../src/features/outbox/outbox-page.tsx';
import { splitLinks } from '../../../../src/features/outbox/split-links.ts';
import { answerCalls, json } from '../../answer-calls.ts';
import { show } from '../../show.tsx';

const INVITATION: OutboxMail = {
  id: 'i',
  to: 'wren@shop.example',
  subject: 'Join Tern & Alder Joinery',
  state: 'outbox',
  tries: 0,
  lastError: null,
  queuedAt: '2026-03-31T09:00:00.000Z',
  sentAt: null,
  dueAt: null,
};

const page = (mails: readonly OutboxMail[], sending = false) => (
  <OutboxPage outbox={{ sending, mails: [...mails] }} shopName="Tern & Alder Joinery" />
);
const stateOf = (subject: string) =>
  within(screen.getByRole('rowheader', { name: subject }).closest('tr')!)
    .getAllByRole('cell')
    .at(-1)!.textContent;

describe('OutboxPage', () => {
  it('When nothing was mailed, then it says what will be here', () => {
    show(page([]));
    expect(screen.getByText('Nothing was mailed yet')).toBeTruthy();
    expect(screen.queryByRole('table')).toBeNull();
  });

  it('When a mail is opened, then it is there as text, and its address is a link', async () => {
    const text = 'Hello Wren,\nfollow https://frames.example/join/0123abc.\nIt holds for 7 days.';
    const seen = answerCalls(({ path }) => (path === '/api/outbox/i' ? json({ ...INVITATION, text }) : undefined));
    const { user } = show(page([INVITATION]));
    await user.click(screen.getByRole('button', { name: INVITATION.subject }));
    const dialog = within(screen.getByRole('dialog', { name: INVITATION.subject }));
    const link = await dialog.findByRole('link');
    expect(link.getAttribute('href')).toBe('https://frames.example/join/0123abc');
    expect(link.parentElement!.textContent).toBe(text);
    expect(dialog.getByText(/To wren@shop\.example, to be read here/)).toBeTruthy();
    expect(seen).toHaveLength(1);
    await user.click(dialog.getByRole('button', { name: 'Close' }));
    expect(screen.queryByRole('dialog')).toBeNull();
  });

  it('When a mail server carries a mail, then its words are not shown, with the reason', async () => {
    const sent: OutboxMail = { ...INVITATION, state: 'sent', tries: 1, sentAt: '2026-03-31T09:00:01.000Z' };
    answerCalls(() => json({ ...sent, text: null }));
    const { user } = show(page([sent], true));
    await user.click(screen.getByRole('button', { name: sent.subject }));
    expect(await screen.findByText(/a mail server carries it/)).toBeTruthy();
  });

  it('When there is no mail server, then it says that mails are not sent; with one it does not', () => {
    const { unmount } = show(page([INVITATION]));
    expect(screen.getByText(/sends no mails/)).toBeTruthy();
    unmount();
    show(page([INVITATION], true));
    expect(screen.queryByText(/sends no mails/)).toBeNull();
  });

  it('When mails wait, were tried, failed or were sent, then each says so in words', () => {
    const of = (subject: string, change: Partial<OutboxMail>) => ({ ...INVITATION, id: subject, subject, ...change });
    show(
      page(
        [
          of('New', { state: 'waiting' }),
          of('Tried', { state: 'waiting', tries: 2, dueAt: '2026-03-31T09:02:00.000Z', lastError: 'come again' }),
          of('Failed', { state: 'failed', tries: 1, lastError: 'no such person' }),
          of('Sent', { state: 'sent', tries: 1, sentAt: '2026-03-31T09:00:01.000Z' }),
        ],
        true,
      ),
    );
    expect(stateOf('New')).toBe('waiting to be sent');
    expect(stateOf('Tried')).toBe('tried 2 times, again 31 Mar 2026: come again');
    expect(stateOf('Failed')).toBe('not sent, tried 1 time: no such person');
    expect(stateOf('Sent')).toBe('sent 31 Mar 2026');
    expect(screen.getByText('Not sent').parentElement!.textContent).toBe('Not sent1 mail');
  });
});

describe('splitLinks', () => {
  it.each([
    ['no address', []],
    ['https://a.example/b?c=d&e=f#g', ['https://a.example/b?c=d&e=f#g']],
    ['See https://a.example/b. And (http://c.example), too', ['https://a.example/b', 'http://c.example']],
    ['javascript:alert(1) ftp://a.example', []],
    ['<https://a.example/b>', ['https://a.example/b']],
  ])('When the text is %j, then the links are %j, and the parts put together are the text', (text, links) => {
    const parts = splitLinks(text);
    expect(parts.filter((part) => part.isLink).map((part) => part.text)).toEqual(links);
    expect(parts.map((part) => part.text).join('')).toBe(text);
  });
});
