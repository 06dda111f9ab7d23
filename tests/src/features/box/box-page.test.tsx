import { fireEvent, screen, within } from '@testing-library/react';
import { describe, expect, it, vi } from 'vitest';
import type { Particulars } from '#shared/kernel/particulars/particulars.ts';
import { BoxPage } from '../../../../src/features/box/box-page.tsx';
import { show } from '../../show.tsx';

// jsdom lays nothing out and knows no scrolling (tried with 29.1.1).
Element.prototype.scrollIntoView = () => undefined;

function open(given: { mayEdit?: boolean; error?: Error } = {}) {
  const onCreate = vi.fn<(particulars: Particulars) => void>();
  const page = (
    <BoxPage
      shopName="Tern & Alder Joinery"
      job={{ id: 'j1', name: 'Fenwick Lane kitchen' }}
      unit="in"
      mayEdit={given.mayEdit ?? true}
      busy={false}
      error={given.error ?? null}
      onCreate={onCreate}
    />
  );
  return { onCreate, ...show(page) };
}

const field = (label: string) => screen.getByLabelText<HTMLInputElement>(label);
/** Types the whole text and leaves the field: what each keystroke does is the length field's own test. */
function enter(input: HTMLElement, value: string) {
  fireEvent.change(input, { target: { value } });
  fireEvent.blur(input);
}
const section = (name: string) => within(screen.getByRole('region', { name }));
const create = () => screen.getByRole('button', { name: 'Create the frame' });

describe('BoxPage', () => {
  it('When the box is wider, then the frame, its title and its bottom follow', async () => {
    const { user, onCreate } = open();
    // Plain sums: 32 1/2 of box and 1/4 of overhang on each side.
    expect(section('Frame that follows').getByText('33 × 30 1/2 in')).toBeTruthy();
    enter(field('Width, outside'), '36 1/2');
    expect(section('Frame that follows').getByText('37 × 30 1/2 in')).toBeTruthy();
    // The bottom stands between two ends of 3/4.
    expect(within(screen.getByRole('row', { name: /^Bottom/ })).getByText('35')).toBeTruthy();
    await user.click(create());
    expect(onCreate).toHaveBeenCalledTimes(1);
    expect(onCreate.mock.calls[0]?.[0].outline).toMatchObject({ width: 37, height: 30.5 });
  });

  it('When a part plugs into the frame, then its front-to-back size has the depth of the dado in it', () => {
    open();
    const end = () => within(screen.getByRole('row', { name: /^Left end/ }));
    // 23 1/4 deep and a dado of 1/4.
    expect(end().getByText('23 1/2')).toBeTruthy();
    expect(end().getByText(/front edge/).textContent).toBe('1/4 on its front edge');
    enter(section('Dados').getByLabelText('Depth'), '3/8');
    expect(end().getByText('23 5/8')).toBeTruthy();
  });

  it('When the edge is beaded, then the bead is drawn and created', async () => {
    const { user, onCreate } = open();
    await user.click(screen.getByRole('radio', { name: 'Beaded' }));
    expect(screen.getByRole('img', { name: 'Front face' }).querySelector('.stroke-bead')).not.toBeNull();
    await user.click(create());
    expect(onCreate.mock.calls[0]?.[0].edge.style).toBe('beaded');
  });

  it('When an entry does not go with the others, then it says what it got and takes, and nothing is created', async () => {
    const { user, onCreate } = open();
    enter(field('Clearance'), '1/4');
    expect(screen.getByText('Got 1/4 in; takes at most 1/16 in: more does not hold the panel.')).toBeTruthy();
    expect(screen.getByText(/the drawing is of the last frame that fitted/)).toBeTruthy();
    await user.click(create());
    expect(onCreate).not.toHaveBeenCalled();
    expect(document.activeElement).toBe(field('Clearance'));
    expect(screen.getByRole('alert').textContent).toContain('Not created');
  });

  it('When an entry cannot be read, then nothing is created from the number before it', async () => {
    const { user, onCreate } = open();
    enter(field('Height of the ends'), 'tall');
    await user.click(create());
    expect(onCreate).not.toHaveBeenCalled();
    expect(document.activeElement).toBe(field('Height of the ends'));
  });

  it('When the name is missing, then nothing is created', async () => {
    const { user, onCreate } = open();
    await user.clear(field('Name'));
    await user.click(create());
    expect(field('Name').getAttribute('aria-invalid')).toBe('true');
    expect(onCreate).not.toHaveBeenCalled();
  });

  it('When places are given, then each partition has an entry that begins where it stands', async () => {
    const { user, onCreate } = open();
    await user.selectOptions(field('How many'), '2');
    await user.selectOptions(field('Placed for'), 'given');
    enter(field('Left face of partition 1'), '8');
    await user.click(create());
    const dados = onCreate.mock.calls[0]?.[0].dados ?? [];
    // 8 from the box's outside, which lies 1/4 inside the frame's edge.
    expect(dados.find(({ part }) => part === 'Partition 1')?.at).toBe(8.25);
  });

  it('When the unit is changed and back again, then the entries of each are kept', async () => {
    const { user } = open();
    enter(field('Width, outside'), '40');
    await user.click(screen.getByRole('radio', { name: 'Millimetres' }));
    expect(field('Width, outside').value).toBe('828');
    await user.click(screen.getByRole('radio', { name: 'Inches' }));
    expect(field('Width, outside').value).toBe('40');
  });

  it('When a top is added, then the rail covers it and it is among the parts', async () => {
    const { user } = open();
    await user.click(screen.getByRole('radio', { name: 'Stretcher' }));
    expect(screen.getByRole('row', { name: /^Stretcher/ })).toBeTruthy();
    // 3/4 thick and 1 3/4 of reveal below it.
    expect(section('Frame that follows').getByText('2 1/2 top, 1 1/4 bottom')).toBeTruthy();
  });

  it('When the role may not create frames, then there is no button', () => {
    open({ mayEdit: false });
    expect(screen.queryByRole('button', { name: 'Create the frame' })).toBeNull();
  });

  it('When the server refuses, then the page says why', () => {
    open({ error: new Error('The disk is full.') });
    expect(screen.getByRole('alert').textContent).toContain('The disk is full.');
  });
});
