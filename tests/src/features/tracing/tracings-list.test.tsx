import { screen, within } from '@testing-library/react';
import { describe, expect, it } from 'vitest';
import type { Tracing } from '#shared/contracts/tracings.ts';
import { TracingsList } from '../../../../src/features/tracing/tracings-list.tsx';
import { answerCalls, json } from '../../answer-calls.ts';
import { show } from '../../show.tsx';

const tracing = (id: string, frames: Tracing['frames'] = []): Tracing => ({
  id,
  jobId: 'j1',
  jobName: 'Fenwick Lane kitchen',
  fileName: `${id}.dxf`,
  bytes: 1,
  sha256: '0',
  uploadedBy: 'Ada Fell',
  uploadedAt: '2026-05-04T10:00:00.000Z',
  removed: false,
  frames,
});

describe('TracingsList', () => {
  it('When drawings have frames, then each drawing leads to its review and each frame to its page', () => {
    show(<TracingsList mayEdit tracings={[tracing('base', [{ id: 'f1', name: 'B33' }]), tracing('wall')]} />);
    expect(screen.getByRole('link', { name: 'base.dxf' }).getAttribute('href')).toBe('/drawings/base');
    const frames = within(screen.getByRole('list', { name: 'Frames of base.dxf' }));
    expect(frames.getByRole('link', { name: 'B33' }).getAttribute('href')).toBe('/frames/f1');
    expect(screen.getByText('No frame came of it yet.')).toBeTruthy();
  });

  it('When a drawing is put away, then the server is told, and undo brings it back', async () => {
    const seen = answerCalls(({ body }) => json({ ...tracing('base'), ...(body as { removed: boolean }) }));
    const { user } = show(<TracingsList mayEdit tracings={[tracing('base')]} />);
    await user.click(screen.getByRole('button', { name: 'Put away base.dxf' }));
    expect(await screen.findByText('“base.dxf” is put away.')).toBeTruthy();
    await user.click(screen.getByRole('button', { name: 'Undo' }));
    expect(seen.map(({ method, path, body }) => [method, path, body])).toEqual([
      ['PATCH', '/api/tracings/base', { removed: true }],
      ['PATCH', '/api/tracings/base', { removed: false }],
    ]);
  });

  it('When there is room for few, then the newest are named and a link leads to all', () => {
    const most = { count: 2, to: '/jobs/j1/drawings' };
    show(<TracingsList mayEdit={false} tracings={['c', 'b', 'a'].map((id) => tracing(id))} most={most} />);
    expect(screen.queryByRole('link', { name: 'a.dxf' })).toBeNull();
    expect(screen.getByRole('link', { name: 'All 3 drawings' }).getAttribute('href')).toBe('/jobs/j1/drawings');
    expect(screen.queryByRole('button')).toBeNull();
  });
});
