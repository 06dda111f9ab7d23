import { screen } from '@testing-library/react';
import { useState } from 'react';
import { describe, expect, it } from 'vitest';
import { Choice } from '../../../src/ui/choice.tsx';
import { show } from '../show.tsx';

function Turning() {
  const [flip, setFlip] = useState<'side' | 'end'>('side');
  return (
    <Choice
      label="Turning over"
      options={[
        { value: 'side', label: 'Side to side' },
        { value: 'end', label: 'End over end' },
      ]}
      value={flip}
      onValue={setFlip}
    />
  );
}

describe('Choice', () => {
  it('When it is shown, then it is a group of radios named by its label, with the value checked', () => {
    show(<Turning />);
    expect(screen.getByRole('group', { name: 'Turning over' })).toBeTruthy();
    expect(screen.getByRole<HTMLInputElement>('radio', { name: 'Side to side' }).checked).toBe(true);
  });

  it('When the other option is clicked, then it is chosen, and only it', async () => {
    const { user } = show(<Turning />);
    await user.click(screen.getByText('End over end'));
    expect(screen.getAllByRole<HTMLInputElement>('radio').map((radio) => radio.checked)).toEqual([false, true]);
  });
});
