import { fireEvent, screen, waitFor, within } from '@testing-library/react';
import { beforeEach, describe, expect, test, vi } from 'vitest';
import type { Frame } from '#shared/contracts/frames.ts';
import { BUILTIN_PROFILES } from '#shared/kernel/profiles/builtin-profiles.ts';
import type { Particulars } from '#shared/kernel/particulars/particulars.ts';
import { workFrame } from '#shared/kernel/work-frame.ts';
import { FramePage } from '../../../../../src/features/frame-page/frame-page.tsx';
import { boardInFrameView, fitTo, toPage } from '../../../../../src/features/frame-page/model/view.ts';
import { beadedExample } from '../../../../builders/beaded-example.ts';
import { workedExample } from '../../../../builders/worked-example.ts';
import { answerCalls, json } from '../../../answer-calls.ts';
import { show } from '../../../show.tsx';

/** Room of each page in the tests: jsdom lays nothing out. */
const PAGE = { width: 400, height: 400 };

function showFrame(particulars: Particulars = workedExample(), mayEdit = true) {
  const frame: Frame = {
    id: 'f1',
    jobId: 'j1',
    jobName: 'Fenwick Lane kitchen',
    particulars: particulars as Frame['particulars'],
    version: 4,
    changedAt: '2026-05-04T10:00:00.000Z',
    changedBy: 'Ada Fell',
    removed: false,
    revisions: [],
    draftChanged: true,
    tracing: null,
  };
  const profiles = BUILTIN_PROFILES.map((stored) => ({ ...stored, builtIn: true }));
  const shown = show(
    <FramePage
      renderCutPart={() => null}
      frame={frame}
      profiles={profiles}
      defaultProfileId="r2007"
      drawer={[]}
      savedEdges={[]}
      shopName="Tern & Alder Joinery"
      mayEdit={mayEdit}
      mayRelease={mayEdit}
    />,
  );
  /** Clicks at a place of frame view on one face. */
  function clickAt(face: 'back' | 'front', x: number, y: number) {
    const worked = workFrame(particulars);
    const { x: clientX, y: clientY } = toPage(fitTo(boardInFrameView(worked), PAGE), worked[face].placement, PAGE, {
      x,
      y,
    });
    for (const type of ['pointerdown', 'pointerup'])
      fireEvent(drawing(face), new MouseEvent(type, { bubbles: true, button: 0, clientX, clientY }));
    spread().focus();
  }
  return { ...shown, clickAt };
}

// Found by attribute: asking jsdom for the roles of a page as full as this takes seconds.
const spread = (): HTMLElement => document.querySelector<HTMLElement>('[role="group"][aria-label^="Spread"]')!;
const drawing = (face: 'back' | 'front'): Element => document.querySelector(`svg[data-face="${face}"]`)!;
const outlined = (face: 'back' | 'front') => {
  const group = drawing(face).querySelector('[data-selected]');
  return group && { id: group.getAttribute('data-selected'), d: group.querySelector('path')!.getAttribute('d') };
};
/** The front's outline as the back, turned side to side, shows it: mirrored about the page's middle, arcs run the other way. */
const turnedOver = (d: string): string =>
  d
    .replace(/([ML])([\d.]+)/g, (_, command: string, x: string) => command + mirrored(x))
    .replace(
      /(A\S+ \S+ \d \d) ([01]) ([\d.]+)/g,
      (_, arc: string, sweep: string, x: string) => `${arc} ${1 - Number(sweep)} ${mirrored(x)}`,
    );
const mirrored = (x: string): string => String(Number((PAGE.width - Number(x)).toFixed(2)));
const seenAlike = () => expect(outlined('back')!.d).toBe(turnedOver(outlined('front')!.d!));
const selectedId = () => outlined('front')?.id ?? null;
function panel(name: string): HTMLElement {
  const found = document.querySelector<HTMLElement>(`[role="group"][aria-label="${name}, on the drawing"]`);
  if (!found) throw new Error(`no panel of ${name}`);
  return found;
}
const noPanel = () => document.querySelector('[data-selection-panel]') === null;
const said = () => [...document.querySelectorAll('[role="status"]')].map((p) => p.textContent).join(' ');
const squareSwitches = () =>
  [...document.querySelectorAll<HTMLInputElement>('input[type="checkbox"]')].filter(
    (input) => input.labels![0]!.textContent === 'Keep this edge square',
  );
/** What the openings are, as the front is told in words, in drawing order. */
const labels = (): string[] =>
  [...drawing('front').querySelectorAll('text')].map((text) => text.textContent).filter((text) => /^[A-Z]$/.test(text));
const formEntry = (path: string) => document.querySelector<HTMLInputElement>(`input[data-entry="${path}"]`);

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
  Element.prototype.scrollIntoView = () => undefined;
  Element.prototype.getBoundingClientRect = () => new DOMRect(0, 0, PAGE.width, PAGE.height);
  Element.prototype.hasPointerCapture = () => false;
  vi.stubGlobal('CSS', { escape: (text: string) => text });
  let version = 4;
  answerCalls((call) =>
    call.method === 'PUT' && call.path === '/api/frames/f1/draft'
      ? json({ version: ++version, changedAt: '2026-05-04T10:01:00.000Z', draftChanged: true })
      : undefined,
  );
});

describe('openings on the drawing: by mouse', () => {
  test.each(['back', 'front'] as const)(
    'When an opening is clicked on the %s, then it is outlined at the same place on both pages and its panel opens',
    (face) => {
      const { clickAt } = showFrame();
      // Within opening B, (17.25, 1.25) to (31.25, 28.75) in the worked example.
      clickAt(face, 24, 20);
      expect(outlined('front')).not.toBeNull();
      seenAlike();
      expect(outlined('back')!.id).toBe('opening-1');
      expect(selectedId()).toBe('opening-1');
      expect(within(panel('Opening B')).getByText('14 × 27 1/2')).toBeTruthy();
      expect(said()).toContain('Opening B, 14 × 27 1/2, selected');
    },
  );

  test('When a dado is clicked on the back, then its entry is gone to; over the same place on the front the stile is selected', () => {
    const { clickAt } = showFrame();
    clickAt('back', 0.6, 15);
    expect(noPanel()).toBe(true);
    clickAt('front', 0.6, 15);
    expect(selectedId()).toBe('stile-left');
  });

  test('When the board beside the frame is clicked, then nothing is selected any more', () => {
    const { clickAt } = showFrame();
    clickAt('front', 24, 20);
    clickAt('front', -0.5, -0.5);
    expect(selectedId()).toBeNull();
    expect(noPanel()).toBe(true);
  });

  test('When an opening is split and sized in its panel, then drawing and form follow, and undo takes each step back', () => {
    const { clickAt } = showFrame();
    clickAt('front', 24, 20);
    fireEvent.click(within(panel('Opening B')).getByText('Into rows R'));
    expect(labels()).toEqual(['A', 'B', 'C']);
    expect(selectedId()).toBe('opening-2');
    fireEvent.change(within(panel('Opening C')).getByLabelText('Height'), { target: { value: '10' } });
    expect(within(panel('Opening C')).getByText('14 × 10')).toBeTruthy();
    expect(formEntry('outline.layout.columns.1.rows.1.size')!.value).toBe('10');
    fireEvent.click(screen.getByText('Undo'));
    expect(within(panel('Opening C')).getByText('14 × 13')).toBeTruthy();
    fireEvent.click(screen.getByText('Undo'));
    expect(labels()).toEqual(['A', 'B']);
    // The part that C was split from.
    expect(panel('Opening B')).toBeTruthy();
    fireEvent.click(screen.getByText('Redo'));
    expect(labels()).toEqual(['A', 'B', 'C']);
  });

  test('When an arch and a label are typed, then the outline has the arc of the head, the panel the name, until they are undone', async () => {
    const { user, clickAt } = showFrame();
    clickAt('front', 24, 20);
    expect(outlined('front')!.d).not.toMatch(/A/);
    fireEvent.change(within(panel('Opening B')).getByLabelText('Arch'), { target: { value: '3' } });
    expect(outlined('front')!.d).toMatch(/A/);
    seenAlike();
    fireEvent.change(within(panel('Opening B')).getByLabelText('Label'), { target: { value: 'B2' } });
    expect(panel('Opening B2')).toBeTruthy();
    await user.keyboard('{Control>}zz{/Control}');
    expect(outlined('front')!.d).not.toMatch(/A/);
    expect(panel('Opening B')).toBeTruthy();
  });

  test('When a width and a height can be given, then they are those of the column and the row that the opening lies in', () => {
    const { clickAt } = showFrame();
    clickAt('front', 24, 20);
    fireEvent.click(within(panel('Opening B')).getByText('Into rows R'));
    fireEvent.change(within(panel('Opening C')).getByLabelText('Width'), { target: { value: '10' } });
    // 33 − 2 × 1 3/4 − 1 1/2 − 10 are left for A.
    expect(drawing('front').textContent).toContain('18 × 27 1/2');
    expect(drawing('front').textContent).toContain('10 × 13');
  });

  test('When an opening is removed, then its room goes to the other one, which then is the only one and stays', async () => {
    const { user, clickAt } = showFrame();
    clickAt('front', 24, 20);
    fireEvent.click(within(panel('Opening B')).getByText('Remove Del'));
    expect(labels()).toEqual(['A']);
    expect(document.activeElement).toBe(spread());
    expect(within(panel('Opening A')).queryByText('Remove Del')).toBeNull();
    await user.keyboard('{Delete}');
    expect(labels()).toEqual(['A']);
    expect(within(panel('Opening A')).getByText(/^Takes/).textContent).toBe('Takes at least one opening in a frame.');
    await user.keyboard('{Control>}z{/Control}');
    expect(labels()).toEqual(['A', 'B']);
  });

  test('When a member is clicked, then its width can be typed, and a wrong one stays and says what it takes', () => {
    const { clickAt } = showFrame();
    clickAt('front', 16.5, 15);
    const width = within(panel('Mid-stile')).getByLabelText<HTMLInputElement>('Width');
    fireEvent.change(width, { target: { value: '2' } });
    expect(drawing('front').textContent).toContain('13 3/4 × 27 1/2');
    fireEvent.change(width, { target: { value: '2x' } });
    fireEvent.blur(width);
    expect(width.value).toBe('2x');
    expect(within(panel('Mid-stile')).getByText(/^Got “2x”; takes a length such as/)).toBeTruthy();
  });
});

describe('openings on the drawing: by keyboard', () => {
  test('When O is pressed, then arrows walk from neighbour to neighbour as the front shows them, and Escape leaves', async () => {
    const { user } = showFrame();
    spread().focus();
    await user.keyboard('o');
    expect(selectedId()).toBe('opening-0');
    expect(noPanel()).toBe(true);
    await user.keyboard('{ArrowRight}');
    expect(selectedId()).toBe('between-0');
    await user.keyboard('{ArrowRight}{ArrowUp}');
    expect(selectedId()).toBe('rail-top');
    expect(said()).toContain('Top rail, 1 3/4 × 29 1/2 in long, selected');
    await user.keyboard('{Escape}');
    expect(selectedId()).toBeNull();
  });

  test('When one walks on the back, then right is right as the back shows it', async () => {
    const { user, clickAt } = showFrame();
    clickAt('back', 24, 20);
    await user.keyboard('{ArrowRight}{ArrowRight}');
    expect(selectedId()).toBe('opening-0');
  });

  test('When Enter is pressed, then the keyboard is in the panel, goes on from field to field, and Escape brings it back to the drawing', async () => {
    const { user } = showFrame();
    spread().focus();
    await user.keyboard('o{Enter}');
    await waitFor(() => expect(document.activeElement).toBe(within(panel('Opening A')).getByLabelText('Label')));
    await user.keyboard('{Enter}');
    expect(document.activeElement).toBe(within(panel('Opening A')).getByLabelText('Arch'));
    await user.keyboard('{Escape}');
    expect(document.activeElement).toBe(spread());
    expect(noPanel()).toBe(true);
    expect(selectedId()).toBe('opening-0');
  });

  test.each([
    ['l', 'Label'],
    ['s', 'Width'],
    ['a', 'Arch'],
  ])('When %s is pressed, then the keyboard is in the entry for it', async (key, label) => {
    const { user } = showFrame();
    spread().focus();
    await user.keyboard(`o${key}`);
    await waitFor(() => expect(document.activeElement).toBe(within(panel('Opening A')).getByLabelText(label)));
  });

  test('When C, R and Delete are pressed, then the opening is split and removed, each a step that undo takes back and redo does again', async () => {
    const { user } = showFrame();
    spread().focus();
    await user.keyboard('oc');
    expect(labels()).toEqual(['A', 'C', 'B']);
    await user.keyboard('r');
    expect(labels()).toEqual(['A', 'C', 'D', 'B']);
    await user.keyboard('{Delete}');
    expect(labels()).toEqual(['A', 'C', 'B']);
    await user.keyboard('{Control>}zz{/Control}');
    expect(labels()).toEqual(['A', 'C', 'B']);
    await user.keyboard('{Control>}z{/Control}');
    expect(labels()).toEqual(['A', 'B']);
    expect(selectedId()).toBe('opening-0');
    await user.keyboard('{Control>}{Shift>}zz{/Shift}{/Control}');
    expect(labels()).toEqual(['A', 'C', 'D', 'B']);
    expect(document.activeElement).toBe(spread());
  });

  test('When nothing is selected, then those keys change nothing, and arrows, zoom and measuring are as they were', async () => {
    const { user } = showFrame();
    spread().focus();
    const before = drawing('front').innerHTML;
    await user.keyboard('crlsa{Delete}');
    expect(drawing('front').innerHTML).toBe(before);
    await user.keyboard('{ArrowRight}');
    expect(drawing('front').innerHTML).not.toBe(before);
    await user.keyboard('f');
    expect(drawing('front').innerHTML).toBe(before);
    await user.keyboard('m{ArrowRight}{Enter}{ArrowUp}{Enter}');
    expect(document.querySelector('[data-readout]')!.textContent).toMatch(/^Distance/);
    await user.keyboard('o');
    expect(selectedId()).toBe('opening-0');
    expect(document.querySelector('[data-readout]')!.textContent).toContain('C: columns');
    await user.keyboard('{Shift>}{ArrowRight}{/Shift}');
    expect(selectedId()).toBe('opening-0');
    expect(drawing('front').innerHTML).not.toBe(before);
    await user.keyboard('m');
    expect(selectedId()).toBeNull();
  });

  test('When a person may only read, then an opening can be looked at and nothing changes it', async () => {
    const { user } = showFrame(workedExample(), false);
    spread().focus();
    await user.keyboard('ocr{Delete}{Enter}');
    expect(labels()).toEqual(['A', 'B']);
    expect(within(panel('Opening A')).getByLabelText<HTMLInputElement>('Label').readOnly).toBe(true);
    expect(within(panel('Opening A')).queryByText('Into columns C')).toBeNull();
  });
});

describe('openings on the drawing: edges and tracings', () => {
  /** Offsets of a bead are drawn about an opening only where it has one. */
  const beadLines = () =>
    [...document.querySelectorAll('svg[data-face="front"] path.stroke-bead')].flatMap(
      (path) => path.getAttribute('d')!.match(/M/g) ?? [],
    ).length;

  test('When an opening of a beaded frame keeps a square edge, then it has no bead, in the panel and the form alike, until it is undone', () => {
    const { clickAt } = showFrame(beadedExample());
    const before = beadLines();
    expect(before).toBeGreaterThan(0);
    clickAt('front', 8, 15);
    fireEvent.click(within(panel('Opening A')).getByLabelText('Keep this edge square'));
    expect(beadLines()).toBe(before / 2);
    // Two openings in the form, one in the panel.
    expect(squareSwitches().map((s) => s.checked)).toEqual([true, false, true]);
    fireEvent.click(screen.getByText('Undo'));
    expect(squareSwitches().map((s) => s.checked)).toEqual([false, false, false]);
  });

  test('When the edges are square, then there is nothing to keep', () => {
    const { clickAt } = showFrame();
    clickAt('front', 8, 15);
    expect(panel('Opening A')).toBeTruthy();
    expect(squareSwitches()).toEqual([]);
  });

  test('When the outline is traced, then the panel shows numbers and lets the edge be square, and keys that split do nothing', async () => {
    const square = (a: number, b: number) =>
      [
        [a, a],
        [b, a],
        [b, b],
        [a, b],
      ] as [number, number][];
    const { user, clickAt } = showFrame({
      ...beadedExample(),
      dados: [],
      outline: { kind: 'traced', perimeter: square(0, 20), openings: [square(3, 17)] },
    });
    clickAt('front', 10, 10);
    const shown = within(panel('Opening A'));
    expect(shown.getByText('14 × 14')).toBeTruthy();
    expect(shown.getByText(/^3 from the left, 3 from below/)).toBeTruthy();
    expect(panel('Opening A').querySelectorAll('input[type="text"]')).toHaveLength(0);
    const before = drawing('front').innerHTML;
    await user.keyboard('cr{Delete}');
    expect(drawing('front').innerHTML).toBe(before);
    fireEvent.click(shown.getByLabelText('Keep this edge square'));
    expect(drawing('front').innerHTML).not.toBe(before);
    expect(squareSwitches().map((s) => s.checked)).toEqual([true, true]);
    fireEvent.click(screen.getByText('Undo'));
    expect(drawing('front').innerHTML).toBe(before);
  });
});
