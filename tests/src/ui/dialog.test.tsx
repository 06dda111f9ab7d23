import { fireEvent, screen } from '@testing-library/react';
import { useState } from 'react';
import { describe, expect, it } from 'vitest';
import { Button } from '../../../src/ui/button.tsx';
import { Dialog } from '../../../src/ui/dialog.tsx';
import { show } from '../show.tsx';

function Page() {
  const [open, setOpen] = useState(false);
  return (
    <>
      <Button onClick={() => setOpen(true)}>Rename</Button>
      {open && (
        <Dialog title="Rename the job" onClose={() => setOpen(false)} actions={<Button>Save</Button>}>
          Words
        </Dialog>
      )}
    </>
  );
}

describe('Dialog', () => {
  it('When it opens, then it is a modal named by its title', async () => {
    const { user } = show(<Page />);
    await user.click(screen.getByText('Rename'));
    const dialog = screen.getByRole<HTMLDialogElement>('dialog', { name: 'Rename the job' });
    expect(dialog.open).toBe(true);
  });

  it('When it is closed, then it is gone and focus is back on what opened it', async () => {
    const { user } = show(<Page />);
    await user.click(screen.getByText('Rename'));
    await user.click(screen.getByText('Close'));
    expect(screen.queryByRole('dialog')).toBeNull();
    expect(document.activeElement).toBe(screen.getByText('Rename'));
  });

  it('When Escape is pressed in a dialog that stays, then it asks each time and lies open, whatever the browser would do', () => {
    const asked: string[] = [];
    show(
      <Dialog title="Outer" onClose={() => asked.push('outer')}>
        <input aria-label="Name" />
        <Dialog title="Inner" onClose={() => asked.push('inner')}>
          Words
        </Dialog>
      </Dialog>,
    );
    // False: the browser is told to leave the key alone, which it would answer by closing.
    expect(fireEvent.keyDown(screen.getByLabelText('Name'), { key: 'Escape' })).toBe(false);
    expect(fireEvent.keyDown(screen.getByLabelText('Name'), { key: 'Escape' })).toBe(false);
    fireEvent.keyDown(screen.getByText('Words'), { key: 'Escape' });
    expect(fireEvent.keyDown(screen.getByLabelText('Name'), { key: 'Escape', isComposing: true })).toBe(true);
    expect(asked).toEqual(['outer', 'outer', 'inner']);
    expect(screen.getByRole<HTMLDialogElement>('dialog', { name: 'Outer' }).open).toBe(true);
  });
});
