import { fireEvent, screen, waitFor, within } from '@testing-library/react';
import { beforeEach, describe, expect, test, vi } from 'vitest';
import type { Frame } from '#shared/contracts/frames.ts';
import { BUILTIN_PROFILES } from '#shared/kernel/profiles/builtin-profiles.ts';
import type { Particulars } from '#shared/kernel/particulars/particulars.ts';
import { setField } from '#shared/kernel/particulars/set-field.ts';
import { workFrame } from '#shared/kernel/work-frame.ts';
import { FramePage } from '../../../../src/features/frame-page/frame-page.tsx';
import { fitTo, boardInFrameView, toPage } from '../../../../src/features/frame-page/model/view.ts';
import { dado, workedExample } from '../../../builders/worked-example.ts';
import { answerCalls, json } from '../../answer-calls.ts';
import { show } from '../../show.tsx';

/** Room of each page in the tests: jsdom lays nothing out. */
const PAGE = { width: 400, height: 400 };

const aStoredFrame = (changes: Partial<Frame> = {}): Frame => ({
  id: 'f1',
  jobId: 'j1',
  jobName: 'Fenwick Lane kitchen',
  particulars: workedExample() as Frame['particulars'],
  version: 4,
  changedAt: '2026-05-04T10:00:00.000Z',
  changedBy: 'Ada Fell',
  removed: false,
  revisions: [],
  draftChanged: true,
  tracing: null,
  ...changes,
});

function showFrame(changes: Partial<Frame> = {}, may = { mayEdit: true, mayRelease: true }) {
  const profiles = BUILTIN_PROFILES.map((stored) => ({ ...stored, builtIn: true }));
  return show(
    <FramePage
      renderCutPart={() => null}
      frame={aStoredFrame(changes)}
      profiles={profiles}
      defaultProfileId="r2007"
      drawer={[]}
      savedEdges={[]}
      shopName="Tern & Alder Joinery"
      {...may}
    />,
  );
}

const entry = (path: string): HTMLInputElement =>
  document.querySelector<HTMLInputElement>(`input[data-entry="${path}"]`)!;
const drawing = (face: 'back' | 'front'): Element => document.querySelector(`svg[data-face="${face}"]`)!;
const pathsOf = (face: 'back' | 'front'): string[] =>
  [...drawing(face).querySelectorAll('path')].map((path) => path.getAttribute('d') ?? '');
const litOn = (face: 'back' | 'front'): (string | null)[] =>
  [...drawing(face).querySelectorAll('[data-lit]')].map((path) => path.getAttribute('data-lit'));

beforeEach(() => {
  localStorage.clear();
  vi.stubGlobal(
    'ResizeObserver',
    class {
      observe() {}
      unobserve() {}
      disconnect() {}
    },
  );
  // jsdom has no layout, and so no scrolling into sight.
  Element.prototype.scrollIntoView = () => undefined;
  Element.prototype.getBoundingClientRect = () => new DOMRect(0, 0, PAGE.width, PAGE.height);
  Element.prototype.hasPointerCapture = () => false;
  // jsdom has no CSS object; paths of entries need no escaping.
  vi.stubGlobal('CSS', { escape: (text: string) => text });
});

const savesTo = (answer: (body: { version: number; particulars: Particulars }) => Response) =>
  answerCalls((call) =>
    call.method === 'PUT' && call.path === '/api/frames/f1/draft'
      ? answer(call.body as { version: number; particulars: Particulars })
      : undefined,
  );

describe('frame page: entries', () => {
  test('When a size is typed, then both faces are drawn anew at once, and the words about the board follow', async () => {
    showFrame();
    const before = [pathsOf('back').join(), pathsOf('front').join()];
    fireEvent.change(entry('outline.width'), { target: { value: '36 1/2' } });
    expect(pathsOf('back').join()).not.toBe(before[0]);
    expect(pathsOf('front').join()).not.toBe(before[1]);
    expect(drawing('front').textContent).toContain('36 1/2 frame');
    expect(await screen.findByText('39 × 33 blank')).toBeTruthy();
  });

  test('When a text cannot be read, then it stays, says what the entry takes after leaving, and the drawing is as it was', () => {
    showFrame();
    const before = pathsOf('front').join();
    fireEvent.change(entry('outline.stiles.left'), { target: { value: '1 3/' } });
    expect(entry('outline.stiles.left').getAttribute('aria-invalid')).toBeNull();
    fireEvent.blur(entry('outline.stiles.left'));
    expect(entry('outline.stiles.left').value).toBe('1 3/');
    expect(entry('outline.stiles.left').getAttribute('aria-invalid')).toBe('true');
    expect(screen.getByText(/Got “1 3\/”; takes a length such as/)).toBeTruthy();
    expect(pathsOf('front').join()).toBe(before);
  });

  test('When a length is 0 where there must be one, then the contract says so at the entry', () => {
    showFrame();
    fireEvent.change(entry('thickness'), { target: { value: '0' } });
    fireEvent.blur(entry('thickness'));
    expect(screen.getByText('Got “0”; takes a length above 0.')).toBeTruthy();
  });

  test('When keys are pressed for undo and redo, then the whole frame goes back and forth and the entries follow', async () => {
    const { user } = showFrame();
    await user.clear(entry('outline.width'));
    await user.type(entry('outline.width'), '40');
    await user.tab();
    await user.type(entry('outline.height'), '1');
    expect(entry('outline.height').value).toBe('30 1/21');
    await user.keyboard('{Control>}z{/Control}');
    expect(entry('outline.height').value).toBe('30 1/2');
    expect(entry('outline.width').value).toBe('40');
    await user.keyboard('{Control>}z{/Control}');
    expect(entry('outline.width').value).toBe('33');
    await user.keyboard('{Control>}{Shift>}z{/Shift}{/Control}');
    expect(entry('outline.width').value).toBe('40');
  });

  test('When Enter is pressed, then the keyboard is in the next entry of the board', async () => {
    const { user } = showFrame();
    entry('outline.width').focus();
    const order: (string | undefined)[] = [];
    for (let i = 0; i < 8; i += 1) {
      await user.keyboard('{Enter}');
      order.push((document.activeElement as HTMLElement).dataset.entry);
    }
    expect(order).toEqual([
      'outline.height',
      'thickness',
      'outline.stiles.left',
      'outline.stiles.right',
      'outline.rails.top',
      'outline.rails.bottom',
      'outline.feet',
      'outline.layout.between',
    ]);
  });

  test('When a person may only read, then entries cannot be typed in and nothing offers to change them', () => {
    showFrame(
      {
        revisions: [
          { letter: 'B', note: '', author: 'Ada Fell', releasedAt: '2026-05-04T10:00:00.000Z', sha256: '0'.repeat(64) },
        ],
      },
      { mayEdit: false, mayRelease: false },
    );
    expect(entry('outline.width').readOnly).toBe(true);
    expect(screen.queryByText('Undo')).toBeNull();
    expect(screen.queryByText('Add a dado')).toBeNull();
    expect(screen.getByText('Download revision B')).toBeTruthy();
  });
});

describe('frame page: openings and joints', () => {
  test('When an opening is split and a part removed by keyboard, then the tree, the drawing and the keyboard follow', async () => {
    const { user } = showFrame();
    const opening = entry('outline.layout.columns.0.opening.label').closest('div.border-b') as HTMLElement;
    within(opening).getByText('Into rows').focus();
    await user.keyboard('{Enter}');
    await waitFor(() =>
      expect((document.activeElement as HTMLElement).dataset.entry).toBe(
        'outline.layout.columns.0.rows.1.opening.label',
      ),
    );
    expect(entry('outline.layout.columns.0.rows.1.opening.label').value).toBe('C');
    expect(entry('outline.layout.columns.0.rows.0.opening.label').value).toBe('A');
    await user.keyboard('{Control>}z{/Control}');
    expect(entry('outline.layout.columns.0.rows.1.opening.label')).toBeNull();
  });

  test('When a dado is added and removed, then it is drawn, its part named, and undo brings it back', async () => {
    const { user } = showFrame();
    await user.click(screen.getByText('Add a dado'));
    await waitFor(() => expect((document.activeElement as HTMLElement).dataset.entry).toBe('dados.4.part'));
    expect(entry('dados.4.part').value).toBe('Top');
    await user.click(within(screen.getByRole('group', { name: 'Top' })).getByText('Remove'));
    expect(entry('dados.4.part')).toBeNull();
    await user.click(screen.getByText('Undo'));
    expect(entry('dados.4.part').value).toBe('Top');
  });

  test('When the outline is traced, then its extents and openings are shown to read', () => {
    const square = (a: number, b: number) =>
      [
        [a, a],
        [b, a],
        [b, b],
        [a, b],
      ] as [number, number][];
    const outline = { kind: 'traced' as const, perimeter: square(0, 20), openings: [square(3, 17)] };
    showFrame({ particulars: { ...workedExample({ dados: [dado({ to: 20 })] }), outline } as Frame['particulars'] });
    expect(screen.getByText(/Traced outline/).textContent).toBe('Traced outline, 20 × 20');
    expect(screen.getByText('14 × 14', { selector: 'span' })).toBeTruthy();
    expect(entry('outline.width')).toBeNull();
    expect(entry('outline.stiles.left')).toBeNull();
  });
});

describe('frame page: spread', () => {
  const worked = workFrame(workedExample());

  /** Points at a place of frame view on one face. */
  function pointAt(face: 'back' | 'front', x: number, y: number) {
    const view = fitTo(boardInFrameView(worked), PAGE);
    const { x: clientX, y: clientY } = toPage(view, worked[face].placement, PAGE, { x, y });
    fireEvent(drawing(face), new MouseEvent('pointermove', { bubbles: true, clientX, clientY }));
  }

  test.each(['back', 'front'] as const)(
    'When a dado is pointed at on the %s, then the same one lights up on both faces',
    (face) => {
      showFrame();
      // In the dado of the left end, where the left stile lies over it.
      pointAt(face, 0.6, 15);
      expect(litOn('back')).toEqual(['dado-0', 'stile-left']);
      expect(litOn('front')).toEqual(['dado-0', 'stile-left']);
    },
  );

  test('When an opening is pointed at, then it lights up on both faces, and nothing does once the pointer has left', () => {
    showFrame();
    pointAt('front', 24, 15);
    expect(litOn('back')).toEqual(['opening-1']);
    fireEvent.pointerLeave(drawing('front'));
    expect(litOn('front')).toEqual([]);
  });

  test('When a dado is typed in, then it lights up on both faces', () => {
    showFrame();
    fireEvent.focus(entry('dados.2.at'));
    expect(litOn('back')).toEqual(['dado-2']);
    expect(litOn('front')).toEqual(['dado-2']);
  });

  test('When a line set is switched off in the legend, then its lines go and come back', async () => {
    const { user } = showFrame();
    const count = pathsOf('back').length;
    const toggle = screen.getByRole('button', { name: '1 Dados' });
    await user.click(toggle);
    expect(toggle.getAttribute('aria-pressed')).toBe('false');
    expect(pathsOf('back')).toHaveLength(count - 1);
    await user.click(toggle);
    expect(pathsOf('back')).toHaveLength(count);
  });

  test('When the board turns end over end, then the page says so', async () => {
    const { user } = showFrame();
    expect(screen.getByText('turned side to side')).toBeTruthy();
    await user.click(screen.getByLabelText('End over end'));
    expect(screen.getByText('turned end over end')).toBeTruthy();
  });

  test('When two places are picked by keyboard, then their distance is said in both units', async () => {
    const { user } = showFrame();
    document.querySelector<HTMLElement>('[aria-label^="Spread"]')!.focus();
    // Begins at the lower left corner of the frame; the next corner to the right is that of opening A, 1 3/4 along and 1 1/4 up.
    await user.keyboard('m{ArrowRight}{Enter}{ArrowUp}{Enter}');
    expect(document.querySelector('[data-readout]')!.textContent).toMatch(
      /^Distance .* in \(.* mm\); across .* in \(.* mm\); up .* in \(.* mm\)$/,
    );
  });

  test('When somebody cannot see the drawing, then each face is told in words', () => {
    showFrame();
    const words = (face: 'back' | 'front') =>
      document.getElementById(drawing(face).getAttribute('aria-describedby')!)!.textContent;
    // Back setup of the worked example, spec 2: Left end at x 33.245 to 34.005, squared edges right and bottom.
    expect(words('back')).toContain('Left end, 1/4 deep, from 33.245 to 34.005 across');
    expect(words('back')).toContain('Squared edges: right and bottom.');
    expect(words('front')).toContain('A, 14 by 27 1/2, lower left corner at 2 3/4 across and 2 1/4 up');
  });
});

describe('frame page: findings', () => {
  test('When a dado is too deep, then the stop is counted, lights up its place and leads to its entry; release says what stops it', async () => {
    const { user } = showFrame();
    fireEvent.change(entry('dados.0.depth'), { target: { value: '0.7' } });
    const row = (await screen.findByText('Stop')).closest('li')!;
    await screen.findByText(/^1 stop,/);
    fireEvent.pointerEnter(row);
    expect(litOn('back')).toContain('dado-0');
    await user.click(within(row).getByText('Entry'));
    expect((document.activeElement as HTMLElement).dataset.entry).toBe('dados.0.depth');
    await user.click(screen.getByRole('button', { name: 'Release revision A' }));
    const dialog = screen.getByRole('dialog');
    expect(within(dialog).getByText('Stop:')).toBeTruthy();
    expect(within(dialog).getByRole<HTMLButtonElement>('button', { name: 'Release revision A' }).disabled).toBe(true);
  });
});

describe('frame page: saving', () => {
  test('When a change is typed, then the draft is saved with its version and the page says so', async () => {
    const seen = savesTo(() => json({ version: 5, changedAt: '2026-05-04T10:01:00.000Z', draftChanged: true }));
    showFrame();
    fireEvent.change(entry('outline.width'), { target: { value: '34' } });
    expect(screen.getByText('saving')).toBeTruthy();
    await screen.findByText('saved', {}, { timeout: 3000 });
    expect(seen.map((call) => call.body)).toEqual([
      { version: 4, particulars: setField(workedExample(), 'outline.width', 34) },
    ]);
  });

  test('When somebody else saved meanwhile, then both changes are shown, and keeping mine where theirs changed nothing keeps both', async () => {
    const theirs = setField(workedExample(), 'thickness', 0.5);
    let version = 9;
    const seen = savesTo((body) =>
      body.version === version
        ? json({ version: ++version, changedAt: '2026-05-04T10:01:00.000Z', draftChanged: true })
        : json(
            {
              code: 'stale-draft',
              message: 'stale',
              details: {
                version,
                particulars: theirs,
                changedBy: 'Ben Ousel',
                changedAt: '2026-05-04T10:00:30.000Z',
                changes: [],
              },
            },
            409,
          ),
    );
    const { user } = showFrame();
    fireEvent.change(entry('outline.width'), { target: { value: '34' } });
    const dialog = await screen.findByRole('dialog', {}, { timeout: 3000 });
    const cells = within(dialog)
      .getAllByRole('row')
      .map((row) => [...row.children].map((cell) => cell.textContent));
    expect(cells).toEqual([
      ['Entry', 'Was', 'Yours', 'Theirs'],
      ['Width', '33', '34', 'as it was'],
      ['Board thickness', '3/4', 'as it was', '1/2'],
    ]);
    await user.click(within(dialog).getByText('Keep mine where theirs changed nothing'));
    expect(entry('thickness').value).toBe('1/2');
    expect(entry('outline.width').value).toBe('34');
    await screen.findByText('saved', {}, { timeout: 3000 });
    expect(seen.at(-1)!.body).toEqual({ version: 9, particulars: setField(theirs, 'outline.width', 34) });
    await user.click(screen.getByText('Undo'));
    expect(entry('outline.width').value).toBe('33');
  });

  test('When work did not reach the server last time, then it is offered, and taken up it is one step that undo takes back', async () => {
    const mine = setField(workedExample(), 'outline.width', 36);
    localStorage.setItem(
      'stilepost.unsaved.f1',
      JSON.stringify({ version: 4, base: workedExample(), mine, at: '2026-05-04T09:00:00.000Z' }),
    );
    savesTo(() => json({ version: 5, changedAt: '2026-05-04T10:01:00.000Z', draftChanged: true }));
    const { user } = showFrame();
    expect(entry('outline.width').value).toBe('33');
    await user.click(screen.getByText('Take it up again'));
    expect(entry('outline.width').value).toBe('36');
    await user.click(screen.getByText('Undo'));
    expect(entry('outline.width').value).toBe('33');
    expect(screen.queryByText('Take it up again')).toBeNull();
  });
});

describe('frame page: frame files', () => {
  test('When a frame file with mistakes is imported, then each is named and the frame stays as it was', async () => {
    const { user } = showFrame();
    const file = new File(
      [JSON.stringify({ ...workedExample(), thickness: 'thick', colour: 'red' })],
      'kitchen.frame.json',
    );
    await user.upload(screen.getByLabelText('Frame file to import'), file);
    const dialog = await screen.findByRole('dialog');
    expect(within(dialog).getByText('thickness').closest('li')!.textContent).toContain(
      'got "thick", takes a length above 0',
    );
    expect(within(dialog).getByText('colour')).toBeTruthy();
    expect(entry('thickness').value).toBe('3/4');
  });

  test('When a good one is imported, then it takes the place of the frame until it is undone', async () => {
    savesTo(() => json({ version: 5, changedAt: '2026-05-04T10:01:00.000Z', draftChanged: true }));
    const { user } = showFrame();
    const file = new File([JSON.stringify(setField(workedExample(), 'outline.width', 40))], 'kitchen.frame.json');
    await user.upload(screen.getByLabelText('Frame file to import'), file);
    await waitFor(() => expect(entry('outline.width').value).toBe('40'));
    await user.click(screen.getByText('Undo'));
    expect(entry('outline.width').value).toBe('33');
  });
});
