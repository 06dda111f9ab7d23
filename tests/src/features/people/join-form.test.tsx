import { screen, waitFor } from '@testing-library/react';
import { describe, expect, it, vi } from 'vitest';
import { JoinForm } from '../../../../src/features/people/join-form.tsx';
import { answerCalls, json } from '../../answer-calls.ts';
import { show } from '../../show.tsx';

const SESSION = {
  user: { id: 'u', name: 'Kim', email: 'kim@shop.example', role: 'designer' },
  shop: { id: 's', name: 'Oak', unit: 'in', paper: 'A4', defaultProfileId: 'p' },
  demoAvailable: false,
};
const form = (onJoined = vi.fn()) => <JoinForm token="abc" email="kim@shop.example" onJoined={onJoined} />;

describe('JoinForm', () => {
  it('When name and password are given, then they go with the token and the session is handed on', async () => {
    const seen = answerCalls(() => json(SESSION, 201));
    const onJoined = vi.fn();
    const { user } = show(form(onJoined));
    await user.type(screen.getByLabelText('Your name'), 'Kim');
    await user.type(screen.getByLabelText('Password'), 'nine dry boards{Enter}');
    await waitFor(() => expect(onJoined.mock.calls[0]?.[0]).toEqual(SESSION));
    const body = { token: 'abc', name: 'Kim', password: 'nine dry boards' };
    expect(seen).toEqual([{ method: 'POST', path: '/api/join', body }]);
  });

  it('When the password is short, then the field says what it takes and nothing is sent', async () => {
    const seen = answerCalls(() => undefined);
    const { user } = show(form());
    await user.type(screen.getByLabelText('Your name'), 'Kim');
    await user.type(screen.getByLabelText('Password'), 'short{Enter}');
    expect(screen.getByText('Takes at least 10 characters.')).toBeTruthy();
    expect(seen).toEqual([]);
  });
});
