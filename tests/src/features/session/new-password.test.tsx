import { screen } from '@testing-library/react';
import { describe, expect, it } from 'vitest';
import { ForgotPasswordForm } from '../../../../src/features/session/forgot-password-form.tsx';
import { ResetPasswordForm } from '../../../../src/features/session/reset-password-form.tsx';
import { answerCalls, json } from '../../answer-calls.ts';
import { show } from '../../show.tsx';

describe('ForgotPasswordForm', () => {
  it('When a link is asked for, then the page says what comes, not whether there is an account', async () => {
    const seen = answerCalls(() => new Response(null, { status: 204 }));
    const { user } = show(<ForgotPasswordForm />);
    await user.type(screen.getByLabelText('E-mail'), 'Ada@Example.com{Enter}');
    expect((await screen.findByRole('status')).textContent).toContain('If ada@example.com has an account');
    expect(seen).toEqual([{ method: 'POST', path: '/api/forgot-password', body: { email: 'ada@example.com' } }]);
  });
});

describe('ResetPasswordForm', () => {
  it('When the link is dead, then the page says so and leads to another one', async () => {
    answerCalls(() => json({ code: 'not-found', message: 'no' }, 404));
    const { user } = show(<ResetPasswordForm token="abc" />);
    await user.type(screen.getByLabelText('New password'), 'ten wet boards{Enter}');
    expect((await screen.findByRole('alert')).textContent).toContain('This link was used or is past its time.');
    expect(screen.getByRole('link', { name: 'Ask for another one' }).getAttribute('href')).toBe('/forgot-password');
  });

  it('When the password is set, then the way to signing in is there', async () => {
    const seen = answerCalls(({ method }) => (method === 'POST' ? new Response(null, { status: 204 }) : undefined));
    const { user } = show(<ResetPasswordForm token="abc" />);
    await user.type(screen.getByLabelText('New password'), 'ten wet boards{Enter}');
    expect((await screen.findByRole('link', { name: 'Sign in' })).getAttribute('href')).toBe('/sign-in');
    expect(seen[0]?.body).toEqual({ token: 'abc', password: 'ten wet boards' });
  });
});
