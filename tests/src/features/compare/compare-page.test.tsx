import { fireEvent, screen, within } from '@testing-library/react';
import { describe, expect, it, vi } from 'vitest';
import type { MembersOutline, Particulars } from '#shared/kernel/particulars/particulars.ts';
import { ComparePage, type CompareChoice } from '../../../../src/features/compare/compare-page.tsx';
import { workedExample } from '../../../builders/worked-example.ts';
import { allowSlowMachine } from '../../../setup/slow-machine.ts';
import { show } from '../../show.tsx';

allowSlowMachine();

const base = workedExample();
/** The left stile 1/2 wider, the bottom's dado gone, one more in its place of another direction, and less allowance. */
const changed = workedExample({
  outline: { ...(base.outline as MembersOutline), stiles: { left: 2.25, right: 1.75 } },
  dados: [...base.dados.slice(0, 3), { ...base.dados[0]!, part: 'Divider', at: 8 }],
  setup: { ...base.setup, allowance: 0.75 },
});

function page(view: CompareChoice['view'], after: Particulars = changed) {
  const onChoice = vi.fn<(choice: CompareChoice) => void>();
  const shown = show(
    <ComparePage
      shopName="Marsh Lane Cabinets"
      job={{ id: 'j', name: 'Fenwick Lane' }}
      frame={{ id: 'f', name: 'Two-door base' }}
      states={['draft', 'B', 'A']}
      choice={{ from: 'A', to: 'draft', view }}
      before={base}
      after={after}
      onChoice={onChoice}
    />,
  );
  return { ...shown, onChoice };
}
const lit = (container: HTMLElement) =>
  [...container.querySelectorAll('[data-lit]')].map((path) => path.getAttribute('data-lit'));

describe('ComparePage', () => {
  it('When nothing differs, then it says so and draws nothing', () => {
    page('overlaid', structuredClone(base));
    expect(screen.getByText('Nothing has changed between revision A and the draft.')).toBeTruthy();
    expect(screen.queryByRole('img')).toBeNull();
  });

  it('When a change is picked, then its place is lit in both states and on both faces, and put out by a second press', async () => {
    const { user, container } = page('side');
    expect(screen.getAllByRole('img').map((img) => img.getAttribute('aria-label'))).toEqual([
      'Back, revision A',
      'Back, the draft',
      'Front, revision A',
      'Front, the draft',
    ]);
    const opening = screen.getByRole('button', { name: /^Opening A/ });
    expect(opening.textContent).toBe('Opening Awidth 14 → 13 3/4 (−1/4)from left 1 3/4 → 2 1/4 (+1/2)');
    await user.click(opening);
    expect(lit(container)).toEqual(Array(4).fill('opening-0'));
    await user.click(opening);
    expect(lit(container)).toEqual([]);
  });

  it('When a dado came and another went, then both words stand in the drawing, and a pick lights up the state that has it', async () => {
    const { user, container } = page('overlaid');
    const back = screen.getByRole('img', { name: 'Back, revision A under the draft' });
    expect([...back.querySelectorAll('text')].map((text) => text.textContent).sort()).toEqual(['came', 'went']);
    const front = screen.getByRole('img', { name: 'Front, revision A under the draft' });
    expect(front.querySelectorAll('text')).toHaveLength(0);
    await user.click(screen.getByRole('button', { name: /^Dado Bottom\s*went/ }));
    // Once a face, in the older state alone.
    expect(lit(container)).toEqual(['dado-3', 'dado-3']);
  });

  it('When the slider is at one end, then only that state is seen', () => {
    page('overlaid');
    const strengths = () =>
      [...screen.getByRole('img', { name: /^Front/ }).querySelectorAll('g[opacity]')].map((g) =>
        g.getAttribute('opacity'),
      );
    // The newer lies under the older, whose pencil lines hide none of it.
    expect(strengths()).toEqual(['1', '1']);
    fireEvent.change(screen.getByRole('slider'), { target: { value: '0' } });
    expect(strengths()).toEqual(['0', '1']);
    fireEvent.change(screen.getByRole('slider'), { target: { value: '100' } });
    expect(strengths()).toEqual(['1', '0']);
    expect(screen.getByText('Fade from revision A to the draft: the draft alone')).toBeTruthy();
  });

  it('When the table is shown, then each number has a row with was, is and difference, settings after the parts', () => {
    page('table');
    const table = screen.getByRole('table', { name: 'What differs between revision A and the draft' });
    const rows = within(table)
      .getAllByRole('row')
      .slice(1)
      .map((row) => [...row.querySelectorAll('th, td')].map((cell) => cell.textContent));
    expect(rows[0]).toEqual(['Opening A', 'width', '14', '13 3/4', '−1/4']);
    expect(rows).toContainEqual(['Dado Divider', 'came', 'not there', 'there', '']);
    expect(rows.slice(-3)).toEqual([
      ['Turning over', 'allowance', '1', '3/4', '−1/4'],
      ['Blank', 'width', '35 1/2', '35', '−1/2'],
      ['Blank', 'height', '33', '32 1/2', '−1/2'],
    ]);
  });

  it('When another state or view is chosen, then the address is asked to hold it', async () => {
    const { user, onChoice } = page('side');
    await user.selectOptions(screen.getByLabelText('From'), 'B');
    expect(onChoice).toHaveBeenLastCalledWith({ from: 'B', to: 'draft', view: 'side' });
    await user.click(screen.getByLabelText('Table'));
    expect(onChoice).toHaveBeenLastCalledWith({ from: 'A', to: 'draft', view: 'table' });
  });
});
