import { screen } from '@testing-library/react';
import { useState } from 'react';
import { describe, expect, it } from 'vitest';
import type { Unit } from '#shared/kernel/units/unit.ts';
import { LengthField } from '../../../src/ui/length-field.tsx';
import { show } from '../show.tsx';

interface DeskProps {
  readonly unit?: Unit;
  readonly start?: number;
  readonly onValue?: (value: number) => void;
}

function Desk({ unit = 'in', start = 30.5, onValue }: DeskProps) {
  const [width, setWidth] = useState(start);
  const [height, setHeight] = useState(1);
  const take = (value: number) => {
    onValue?.(value);
    setWidth(value);
  };
  return (
    <form>
      <LengthField label="Width" unit={unit} value={width} onValue={take} above={0} />
      <LengthField label="Height" unit={unit} value={height} onValue={setHeight} />
      <button type="button" onClick={() => setWidth(12)}>
        Undo
      </button>
      <output>{width}</output>
    </form>
  );
}

const width = () => screen.getByLabelText<HTMLInputElement>('Width');
const value = () => Number(screen.getByRole('status').textContent);

describe('LengthField', () => {
  it('When a value is a fraction of 64ths, then it shows as one, with the other unit on hover', () => {
    show(<Desk start={30.5} />);
    expect(width().value).toBe('30 1/2');
    // 30.5 × 25.4, the inch being 25.4 mm by definition.
    expect(width().title).toBe('774.7 mm');
  });

  it('When a value has more digits than are shown to read, then all of them stand in the field', () => {
    show(<Desk start={0.08216083} />);
    expect(width().value).toBe('0.08216083');
  });

  it('When a length is typed, then each keystroke that can be read is taken and the text stays as typed', async () => {
    const taken: number[] = [];
    const { user } = show(<Desk onValue={(v) => taken.push(v)} />);
    await user.clear(width());
    await user.type(width(), '14-3/8');
    expect(width().value).toBe('14-3/8');
    expect(value()).toBe(14.375);
    expect(taken).toContain(1);
    await user.tab();
    expect(width().value).toBe('14 3/8');
  });

  it('When the other unit is typed, then its length in the own unit is taken', async () => {
    const { user } = show(<Desk />);
    await user.clear(width());
    await user.type(width(), '254mm');
    expect(value()).toBe(10);
  });

  it('When a wrong entry is left, then its text stays, the value stays, and the field says what it got and takes', async () => {
    const { user } = show(<Desk />);
    await user.clear(width());
    await user.type(width(), '30,5');
    await user.tab();
    expect(width().value).toBe('30,5');
    // "30" on the way was a length, "30," and "30,5" are none.
    expect(value()).toBe(30);
    expect(width().getAttribute('aria-invalid')).toBe('true');
    const said = document.getElementById(width().getAttribute('aria-describedby') ?? '')?.textContent ?? '';
    expect(said).toMatch(/^Got “30,5”; takes a length such as/);
  });

  it('When an entry is unfinished and focus is still in it, then nothing is called wrong yet', async () => {
    const { user } = show(<Desk />);
    await user.clear(width());
    await user.type(width(), '30 1/');
    expect(width().getAttribute('aria-invalid')).toBeNull();
  });

  it('When a length is under the least, then it is refused with the bound', async () => {
    const { user } = show(<Desk />);
    await user.clear(width());
    await user.type(width(), '0');
    await user.tab();
    expect(value()).toBe(30.5);
    expect(screen.getByText('Got “0”; takes a length above 0.')).toBeTruthy();
  });

  it('When the value changes from outside, then it replaces a wrong text', async () => {
    const { user } = show(<Desk />);
    await user.clear(width());
    await user.type(width(), 'abc');
    await user.click(screen.getByText('Undo'));
    expect(width().value).toBe('12');
    expect(width().getAttribute('aria-invalid')).toBeNull();
  });

  it('When Enter is pressed, then the next field has focus and its text is marked', async () => {
    const { user } = show(<Desk />);
    await user.click(width());
    await user.keyboard('{Enter}');
    const height = screen.getByLabelText<HTMLInputElement>('Height');
    expect(document.activeElement).toBe(height);
    expect([height.selectionStart, height.selectionEnd]).toEqual([0, 1]);
  });
});
