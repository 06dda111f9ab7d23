import { screen, within } from '@testing-library/react';
import { afterEach, beforeEach, describe, expect, test, vi } from 'vitest';
import { workFrame } from '#shared/kernel/work-frame.ts';
import { CutPart } from '../../../../src/features/cut-part/cut-part.tsx';
import { show } from '../../show.tsx';
import { useWorkingWorkers } from './fake-worker.ts';
import { smallFrame } from './parts.ts';

// jsdom has neither a drawing canvas nor a style sheet: the page shows its flat picture, in these colours.
const TOKENS = {
  paper: '#faf7f0',
  ink: '#22282b',
  board: '#ead9be',
  'board-light': '#f3e8d5',
  back: '#9c3a22',
  front: '#1d5c8f',
  bead: '#2e7d6b',
  lift: '#6b4a9e',
};

beforeEach(() => {
  for (const [name, value] of Object.entries(TOKENS))
    document.documentElement.style.setProperty(`--color-${name}`, value);
  vi.spyOn(HTMLCanvasElement.prototype, 'getContext').mockReturnValue(null);
});
afterEach(() => {
  vi.unstubAllGlobals();
  vi.restoreAllMocks();
});

const steps = () => screen.getAllByRole('list')[0]!;
const shownStep = () => within(steps()).getByRole('button', { current: 'step' }).textContent;

describe('When a frame is looked at in a browser without WebGL', () => {
  test('then it says so, and shows one face shaded with its words', async () => {
    useWorkingWorkers(['measure']);
    show(<CutPart worked={workFrame(smallFrame())} stops={0} />);
    expect(screen.getByText(/WebGL is missing/)).toBeTruthy();
    const picture = screen.getByRole('img', { name: 'Cut part, front' });
    expect(
      await screen.findByText(
        /After step 5 of 5, front, perimeter/,
        { selector: '[role=status]' },
        { timeout: 10_000 },
      ),
    ).toBeTruthy();
    expect(document.getElementById(picture.getAttribute('aria-describedby')!)?.textContent).toContain(
      'Seen from the front.',
    );
    expect(screen.queryByRole('radio', { name: 'Both' })).toBeNull();
  });

  test('then its steps are those of the files, back first, and can be walked', async () => {
    useWorkingWorkers(['relief', 'measure']);
    const { user } = show(<CutPart worked={workFrame(smallFrame())} stops={0} />);
    const wanted = ['Board as loaded', '1 Dados', '2 Squaring edge', '3 Openings', '4 Corner lift', '5 Perimeter'];
    const buttons = within(steps()).getAllByRole('button');
    expect(buttons.map((button, i) => button.textContent.slice(0, wanted[i]?.length))).toEqual(wanted);
    expect(shownStep()).toContain('5 Perimeter');
    await user.click(screen.getByRole('button', { name: 'Step back' }));
    expect(shownStep()).toContain('4 Corner lift');
    expect(shownStep()).toContain('climbs from 13/16 in below the face');
    await user.click(screen.getByRole('button', { name: /Board as loaded/ }));
    expect(screen.getByText('The board as loaded, before any cut.', { selector: '[role=status]' })).toBeTruthy();
    expect(screen.getByRole<HTMLButtonElement>('button', { name: 'Step back' }).disabled).toBe(true);
  });

  test('then the largest difference of each face is said in words', async () => {
    useWorkingWorkers(['relief']);
    show(<CutPart worked={workFrame(smallFrame())} stops={0} />);
    expect(
      await screen.findByText(/≈0.0183 in of board left standing at opening A/, {}, { timeout: 10_000 }),
    ).toBeTruthy();
    expect(screen.getByText('Less than 0.00005 in off everywhere.')).toBeTruthy();
  }, 15_000);

  test('then work under way can be cancelled, and begun again', async () => {
    useWorkingWorkers(['relief', 'measure']);
    const { user } = show(<CutPart worked={workFrame(smallFrame())} stops={0} />);
    const [picture, numbers] = screen.getAllByRole('button', { name: 'Cancel' });
    await user.click(numbers!);
    expect(screen.getByText(/Not compared/)).toBeTruthy();
    await user.click(picture!);
    await user.click(screen.getByRole('button', { name: 'Cut again' }));
    expect(screen.getByText('Cutting')).toBeTruthy();
  });

  test('then a frame with stops says that lines may be missing', () => {
    useWorkingWorkers(['relief', 'measure']);
    show(<CutPart worked={workFrame(smallFrame({ blank: { width: 8, height: 8 } }))} stops={2} />);
    expect(screen.getByText(/This frame has 2 stops: lines may be missing/)).toBeTruthy();
  });

  test('then every place to look at is in the list: the board, the opening, its four corners', () => {
    useWorkingWorkers(['relief', 'measure']);
    show(<CutPart worked={workFrame(smallFrame())} stops={0} />);
    expect(
      within(screen.getByLabelText('Look at'))
        .getAllByRole('option')
        .map((o) => o.textContent),
    ).toEqual([
      'Whole board',
      'Opening A',
      'Opening A, lower left corner',
      'Opening A, lower right corner',
      'Opening A, upper right corner',
      'Opening A, upper left corner',
    ]);
  });
});
