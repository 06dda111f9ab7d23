import { screen, within } from '@testing-library/react';
import { describe, expect, it } from 'vitest';
import type { Invitation, Person } from '#shared/contracts/people.ts';
import { PeoplePage } from '../../../../src/features/people/people-page.tsx';
import { answerCalls, json } from '../../answer-calls.ts';
import { show } from '../../show.tsx';

const aPerson = (id: string, name: string, change: Partial<Person> = {}): Person => ({
  id,
  name,
  email: `${id}@shop.example`,
  role: 'designer',
  since: '2026-03-01T09:00:00.000Z',
  lastSignInAt: null,
  disabled: false,
  demo: false,
  ...change,
});
const ME = aPerson('me', 'Maren Alder', { role: 'owner', lastSignInAt: '2026-03-30T09:00:00.000Z' });
const JOSS = aPerson('joss', 'Joss Quillby');
const GONE = aPerson('gone', 'Ines Tarrow', { disabled: true });
const INVITED: Invitation = {
  id: 'i',
  email: 'piet@shop.example',
  role: 'operator',
  invitedBy: 'Maren Alder',
  invitedAt: '2026-03-20T09:00:00.000Z',
  expiresAt: '2026-03-27T09:00:00.000Z',
  expired: true,
};

const page = (change: object = {}) => (
  <PeoplePage people={[ME, JOSS, GONE]} invitations={[INVITED]} shopName="Tern & Alder" myId="me" {...change} />
);
const rowOf = (name: string) => within(screen.getByRole('rowheader', { name }).closest('tr')!);
const buttonsOf = (name: string) =>
  rowOf(name)
    .queryAllByRole('button')
    .map((button) => button.textContent);

describe('PeoplePage', () => {
  it('When the people are shown, then each has what can be done to them, and I have nothing', () => {
    show(page());
    expect(buttonsOf('Maren Alder')).toEqual([]);
    expect(buttonsOf('Joss Quillby')).toEqual(['Change role', 'Take away access']);
    expect(buttonsOf('Ines Tarrow')).toEqual(['Give access back']);
    expect(rowOf('Ines Tarrow').getByText('designer, no access')).toBeTruthy();
    expect(rowOf('Joss Quillby').getByText('never')).toBeTruthy();
    expect(rowOf('piet@shop.example').getByText(/past its time/)).toBeTruthy();
  });

  it('When people are of the demo, then nothing can be done to them', () => {
    show(page({ people: [ME, { ...JOSS, demo: true }] }));
    expect(buttonsOf('Joss Quillby')).toEqual([]);
  });

  it('When nobody is invited, then the page says what to do', async () => {
    const { user } = show(page({ invitations: [] }));
    await user.click(screen.getByRole('button', { name: 'Invite somebody to the shop' }));
    expect(screen.getByRole('dialog', { name: 'Invite somebody' })).toBeTruthy();
  });

  it('When access is taken away, then it asks with the name first, and a refusal is said in the server’s words', async () => {
    const seen = answerCalls(() => json({ code: 'last-owner', message: 'A shop needs an owner.' }, 409));
    const { user } = show(page());
    await user.click(screen.getByRole('button', { name: 'Take away the access of Joss Quillby' }));
    expect(seen).toEqual([]);
    const dialog = within(screen.getByRole('dialog', { name: 'Take away the access of Joss Quillby' }));
    await user.click(dialog.getByRole('button', { name: 'Take away access' }));
    expect((await dialog.findByRole('alert')).textContent).toContain('A shop needs an owner.');
    expect(seen).toEqual([{ method: 'PATCH', path: '/api/people/joss', body: { disabled: true } }]);
  });

  it('When a role is changed, then that is sent and said', async () => {
    const seen = answerCalls(() => new Response(null, { status: 204 }));
    const { user } = show(page());
    await user.click(screen.getByRole('button', { name: 'Change the role of Joss Quillby' }));
    await user.selectOptions(screen.getByLabelText('Role'), 'operator');
    await user.click(screen.getByRole('button', { name: 'Change the role' }));
    expect((await screen.findByRole('status')).textContent).toContain('Joss Quillby is operator now.');
    expect(seen[0]).toEqual({ method: 'PATCH', path: '/api/people/joss', body: { role: 'operator' } });
  });

  it('When the invited address has an account, then the field says so and what was typed stays', async () => {
    answerCalls(() => json({ code: 'email-taken', message: 'There is already an account.' }, 409));
    const { user } = show(page());
    await user.click(screen.getByRole('button', { name: 'Invite somebody' }));
    await user.type(screen.getByLabelText('E-mail'), 'joss@shop.example{Enter}');
    expect(await screen.findByText('There is already an account.')).toBeTruthy();
    expect(screen.getByLabelText<HTMLInputElement>('E-mail').value).toBe('joss@shop.example');
  });

  it('When an invitation is sent anew, then the page says where a mail is that does not go out', async () => {
    const seen = answerCalls(() => json({ ...INVITED, expired: false }));
    const { user } = show(page());
    await user.click(screen.getByRole('button', { name: 'Send anew to piet@shop.example' }));
    const said = await screen.findByRole('status');
    expect(within(said).getByRole('link', { name: 'outbox' }).getAttribute('href')).toBe('/outbox');
    expect(seen[0]).toMatchObject({ method: 'POST', path: '/api/invitations/i/resend' });
  });

  it('When an invitation is revoked, then it asks with the address first', async () => {
    const seen = answerCalls(() => new Response(null, { status: 204 }));
    const { user } = show(page());
    await user.click(screen.getByRole('button', { name: 'Revoke the invitation of piet@shop.example' }));
    expect(seen).toEqual([]);
    await user.click(screen.getByRole('button', { name: 'Revoke the invitation' }));
    expect((await screen.findByRole('status')).textContent).toContain('piet@shop.example opens nothing any more');
    expect(seen[0]).toMatchObject({ method: 'DELETE', path: '/api/invitations/i' });
  });
});
