import { act, fireEvent, screen } from '@testing-library/react';
import { describe, expect, it, vi } from 'vitest';
import { LIMITS } from '#shared/contracts/limits.ts';
import { UploadPanel } from '../../../../src/features/tracing/upload-panel.tsx';
import { takeUploads } from '../../fake-upload.ts';
import { show } from '../../show.tsx';

const STORED = {
  id: 't1',
  jobId: 'j1',
  jobName: 'Fenwick Lane kitchen',
  fileName: 'a.dxf',
  bytes: 1,
  sha256: '0',
  uploadedBy: 'Ada Fell',
  uploadedAt: '2026-05-04T10:00:00.000Z',
  removed: false,
  frames: [],
};

function showPanel() {
  const begun = takeUploads();
  const onUploaded = vi.fn();
  return { begun, onUploaded, ...show(<UploadPanel jobId="j1" onUploaded={onUploaded} />) };
}

describe('UploadPanel', () => {
  it('When a drawing is chosen, then it says how much has gone, and goes on once the server has it', async () => {
    const { begun, onUploaded, user } = showPanel();
    await user.upload(screen.getByLabelText('Drawing'), new File(['0'], 'a.dxf'));
    act(() => begun[0]!.progress(42, 100));
    expect(screen.getByRole('status').textContent).toContain('Sending a.dxf, 42 %.');
    act(() => begun[0]!.answer(201, STORED));
    await vi.waitFor(() => expect(onUploaded).toHaveBeenCalledWith('t1'));
  });

  it('When it is cancelled, then it stops and says that nothing was added', async () => {
    const { begun, onUploaded, user } = showPanel();
    await user.upload(screen.getByLabelText('Drawing'), new File(['0'], 'a.dxf'));
    await user.click(screen.getByRole('button', { name: 'Cancel' }));
    expect(begun[0]!.aborted).toBe(true);
    expect(await screen.findByText('Nothing was added to the job.')).toBeTruthy();
    expect(onUploaded).not.toHaveBeenCalled();
  });

  it('When the server refuses it, then its own words are shown', async () => {
    const { begun, user } = showPanel();
    await user.upload(screen.getByLabelText('Drawing'), new File(['0'], 'a.dxf'));
    act(() => begun[0]!.answer(413, { code: 'too-large', message: 'a.dxf is larger than 32 MB.' }));
    expect((await screen.findByRole('alert')).textContent).toContain('a.dxf is larger than 32 MB.');
  });

  it('When two files are dropped, one too large or an empty one, then it says so and sends none', () => {
    const { begun } = showPanel();
    const drop = (files: File[]) =>
      fireEvent.drop(screen.getByText('Drop a drawing here'), { dataTransfer: { files } });
    const large = new File([''], 'big.dxf');
    Object.defineProperty(large, 'size', { value: LIMITS.drawingBytes + 1 });
    drop([new File(['0'], 'a.dxf'), new File(['0'], 'b.dxf')]);
    expect(screen.getByRole('alert').textContent).toContain('Got 2 files; takes one drawing at a time.');
    drop([large]);
    expect(screen.getByRole('alert').textContent).toContain('big.dxf is 33 MB; takes up to 32 MB.');
    drop([new File([], 'none.dxf')]);
    expect(screen.getByRole('alert').textContent).toContain('none.dxf is empty.');
    expect(begun).toEqual([]);
  });

  it('When a sample is tried, then a drawing of our own is sent', async () => {
    const { begun, user } = showPanel();
    await user.click(screen.getByRole('button', { name: 'Try a sample' }));
    expect(begun[0]!.sent?.name).toBe('two-frames-to-try.dxf');
    expect(await begun[0]!.sent?.text()).toMatch(/^0\nSECTION\n[\s\S]*\n0\nEOF\n$/);
  });
});
