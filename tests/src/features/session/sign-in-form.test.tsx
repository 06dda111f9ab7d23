import { screen } from '@testing-library/react';
import { describe, expect, it } from 'vitest';
import { SignInForm } from '../../../../src/features/session/sign-in-form.tsx';
import { answerCalls, json } from '../../answer-calls.ts';
import { show } from '../../show.tsx';

describe('SignInForm', () => {
  it('When the address is none, then the field says so and nothing is sent', async () => {
    const seen = answerCalls(() => undefined);
    const { user } = show(<SignInForm />);
    await user.type(screen.getByLabelText('E-mail'), 'ada');
    await user.type(screen.getByLabelText('Password'), 'any word');
    await user.click(screen.getByRole('button', { name: 'Sign in' }));
    expect(screen.getByText(/takes an e-mail address/)).toBeTruthy();
    expect(seen).toEqual([]);
  });

  it('When the server refuses, then the reason is announced and what was typed stays', async () => {
    answerCalls(() => json({ code: 'wrong-sign-in', message: 'no' }, 401));
    const { user } = show(<SignInForm />);
    await user.type(screen.getByLabelText('E-mail'), 'ada@example.com');
    await user.type(screen.getByLabelText('Password'), 'wrong words{Enter}');
    expect((await screen.findByRole('alert')).textContent).toContain(
      'No account with this e-mail address and password',
    );
    expect(screen.getByLabelText<HTMLInputElement>('E-mail').value).toBe('ada@example.com');
  });
});
