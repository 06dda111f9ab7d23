import { screen, within } from '@testing-library/react';
import { describe, expect, it } from 'vitest';
import type { StoredProfile } from '#shared/contracts/profiles.ts';
import { ProfilePage } from '../../../../src/features/profiles/profile-page.tsx';
import { answerCalls, json } from '../../answer-calls.ts';
import { show } from '../../show.tsx';

const STORED: StoredProfile = {
  id: 'own',
  builtIn: false,
  profile: {
    name: 'Partner in millimetres',
    flavour: 'R12',
    unit: 'mm',
    decimals: 4,
    origin: 'pins',
    openingLines: 'both',
    layerTemplate: '{face}_{set}',
    labels: false,
  },
};

const page = (stored = STORED, mayEdit = true) => (
  <ProfilePage stored={stored} mayEdit={mayEdit} shopName="Tern & Alder Joinery" list={null} />
);
const template = () => screen.getByLabelText<HTMLInputElement>('Template');
const layers = () =>
  within(screen.getByRole('table'))
    .getAllByRole('row')
    .slice(1)
    .map((row) => row.lastElementChild?.textContent);

describe('ProfilePage', () => {
  it('When the template changes, then the example follows', async () => {
    const { user } = show(page());
    expect(layers()).toContain('BACK_DADO');
    await user.clear(template());
    await user.type(template(), 'P-{{face}-{{set}');
    expect(layers()).toContain('P-BACK-DADO');
  });

  it('When two line sets would be on one layer, then the field says which, and saving sends nothing', async () => {
    const seen = answerCalls(() => undefined);
    const { user } = show(page());
    await user.clear(template());
    await user.type(template(), '{{face}');
    expect(template().getAttribute('aria-invalid')).toBe('true');
    expect(screen.getByText(/would both be on layer BACK/)).toBeTruthy();
    await user.click(screen.getByRole('button', { name: 'Save the file profile' }));
    expect(seen).toEqual([]);
  });

  it('When a change is saved, then the whole profile goes to its address', async () => {
    const seen = answerCalls(({ method, body }) =>
      method === 'PUT' ? json({ ...STORED, profile: body }) : json({ profiles: [STORED] }),
    );
    const { user } = show(page());
    await user.click(screen.getByRole('radio', { name: 'R2007' }));
    await user.click(screen.getByRole('button', { name: 'Save the file profile' }));
    expect(seen[0]).toMatchObject({
      method: 'PUT',
      path: '/api/profiles/own',
      body: { ...STORED.profile, flavour: 'R2007' },
    });
  });

  it('When a profile is to be deleted, then it asks with the name', async () => {
    const { user } = show(page());
    await user.click(screen.getByRole('button', { name: 'Delete' }));
    expect(screen.getByRole('button', { name: 'Delete Partner in millimetres' })).toBeTruthy();
  });

  it('When the profile is built in, then it can be read and copied but not changed', () => {
    show(page({ ...STORED, builtIn: true }));
    expect(screen.queryByRole('textbox')).toBeNull();
    expect(screen.getByRole('button', { name: 'Copy this profile' })).toBeTruthy();
  });

  it('When the person may not edit profiles, then there is neither', () => {
    show(page(STORED, false));
    expect(screen.queryByRole('textbox')).toBeNull();
    expect(screen.queryByRole('button')).toBeNull();
  });
});
