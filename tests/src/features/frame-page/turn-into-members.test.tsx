import { screen } from '@testing-library/react';
import { beforeEach, describe, expect, test, vi } from 'vitest';
import type { Frame } from '#shared/contracts/frames.ts';
import { BUILTIN_PROFILES } from '#shared/kernel/profiles/builtin-profiles.ts';
import type { TracedVertex } from '#shared/kernel/particulars/particulars.ts';
import { FramePage } from '../../../../src/features/frame-page/frame-page.tsx';
import { workedExample } from '../../../builders/worked-example.ts';
import { answerCalls } from '../../answer-calls.ts';
import { show } from '../../show.tsx';

const rectangle = (x0: number, y0: number, x1: number, y1: number): TracedVertex[] => [
  [x0, y0],
  [x1, y0],
  [x1, y1],
  [x0, y1],
];

function showTraced(openings: TracedVertex[][], mayEdit = true) {
  // Nothing is saved within a test.
  answerCalls(() => new Response(null, { status: 503 }));
  const outline = { kind: 'traced' as const, perimeter: rectangle(0, 0, 33, 30.5), openings };
  const frame: Frame = {
    id: 'f1',
    jobId: 'j1',
    jobName: 'Fenwick Lane kitchen',
    particulars: { ...workedExample(), outline } as Frame['particulars'],
    version: 1,
    changedAt: '2026-05-04T10:00:00.000Z',
    changedBy: 'Ada Fell',
    removed: false,
    revisions: [],
    draftChanged: true,
    tracing: { id: 't1', fileName: 'kitchen.dxf' },
  };
  return show(
    <FramePage
      renderCutPart={() => null}
      frame={frame}
      profiles={BUILTIN_PROFILES.map((stored) => ({ ...stored, builtIn: true }))}
      defaultProfileId="r2007"
      drawer={[]}
      savedEdges={[]}
      shopName="Tern & Alder Joinery"
      mayEdit={mayEdit}
      mayRelease={mayEdit}
    />,
  );
}

const value = (path: string) => document.querySelector<HTMLInputElement>(`input[data-entry="${path}"]`)?.value;

beforeEach(() => {
  localStorage.clear();
  vi.stubGlobal(
    'ResizeObserver',
    class {
      observe() {}
      disconnect() {}
    },
  );
  vi.stubGlobal('CSS', { escape: (text: string) => text });
});

describe('frame page of a traced frame', () => {
  test('When it was traced from a drawing, then it names the drawing with a link to the file', () => {
    showTraced([rectangle(1.75, 1.25, 31.25, 28.75)]);
    const link = screen.getByRole('link', { name: 'kitchen.dxf' });
    expect(link.getAttribute('href')).toBe('/api/tracings/t1/file');
  });

  test('When it is turned into members, then stiles and rails can be typed, and undo brings the traced lines back', async () => {
    const { user } = showTraced([rectangle(1.75, 1.25, 15.75, 28.75), rectangle(17.25, 1.25, 31.25, 28.75)]);
    await user.click(screen.getByRole('button', { name: 'Turn into members' }));
    // The worked example's sizes, entered as contours above.
    expect([value('outline.width'), value('outline.stiles.left'), value('outline.rails.top')]).toEqual([
      '33',
      '1 3/4',
      '1 3/4',
    ]);
    expect(screen.queryByRole('button', { name: 'Turn into members' })).toBeNull();
    await user.click(screen.getByRole('button', { name: 'Undo' }));
    expect(screen.getByText(/Traced outline/)).toBeTruthy();
    expect(value('outline.width')).toBeUndefined();
  });

  test('When it cannot be, then it stays as it is and says why', async () => {
    const slanted: TracedVertex[] = [
      [2, 2],
      [30, 3],
      [30, 28],
      [2, 28],
    ];
    const { user } = showTraced([slanted]);
    await user.click(screen.getByRole('button', { name: 'Turn into members' }));
    expect(screen.getByText(/Opening A is neither an upright rectangle/)).toBeTruthy();
    expect(screen.getByText(/Traced outline/)).toBeTruthy();
  });

  test('When the frame is to be read only, then there is no such button', () => {
    showTraced([rectangle(1.75, 1.25, 31.25, 28.75)], false);
    expect(screen.queryByRole('button', { name: 'Turn into members' })).toBeNull();
  });
});
