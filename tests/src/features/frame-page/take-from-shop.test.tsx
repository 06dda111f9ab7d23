import { screen, waitFor } from '@testing-library/react';
import type { ReactElement } from 'react';
import { describe, expect, it } from 'vitest';
import type { StoredEdgePreset } from '#shared/contracts/edge-presets.ts';
import type { DrawerCutter } from '#shared/kernel/cutter-drawer/drawer-cutter.ts';
import { newFrame } from '#shared/kernel/particulars/new-frame.ts';
import { DrawerProvider } from '../../../../src/features/frame-page/form/drawer.ts';
import { SavedEdgesProvider } from '../../../../src/features/frame-page/form/saved-edges.ts';
import { TakeEdge } from '../../../../src/features/frame-page/form/take-edge.tsx';
import { TakeFromDrawer } from '../../../../src/features/frame-page/form/take-from-drawer.tsx';
import { createDesk, DeskProvider } from '../../../../src/features/frame-page/model/desk.ts';
import { createFrameEditor } from '../../../../src/features/frame-page/model/frame-editor.ts';
import { allowSlowMachine } from '../../../setup/slow-machine.ts';
import { answerCalls, json } from '../../answer-calls.ts';
import { show } from '../../show.tsx';

allowSlowMachine();

const DRAWER: readonly DrawerCutter[] = [
  {
    id: 's',
    unit: 'mm',
    cutter: { kind: 'straight', name: 'Straight 12.7', diameter: 12.7, fluteLength: 25.4 },
    remarks: '',
  },
  { id: 'v', unit: 'in', cutter: { kind: 'vee', name: 'V 30', includedAngle: 30, fluteLength: 0.5 }, remarks: '' },
];
const SAVED: readonly StoredEdgePreset[] = [
  {
    id: 'e',
    preset: { name: 'Sized at the back', unit: 'in', edge: { style: 'square', sizeHeldAt: 'back' }, cutters: {} },
  },
  { id: 'm', preset: { name: 'Metric', unit: 'mm', edge: { style: 'square', sizeHeldAt: 'back' }, cutters: {} } },
];

function showForm(element: ReactElement) {
  const editor = createFrameEditor(newFrame('in', 'Frame'));
  const view = show(
    <DeskProvider value={createDesk(editor, false)}>
      <DrawerProvider value={DRAWER}>
        <SavedEdgesProvider value={SAVED}>{element}</SavedEdgesProvider>
      </DrawerProvider>
    </DeskProvider>,
  );
  return { ...view, present: () => editor.store.get().history.present, undo: () => editor.undo() };
}
const options = (label: string) => [...screen.getByLabelText<HTMLSelectElement>(label).options].map((o) => o.text);

describe('What a frame takes from the shop', () => {
  it('When a cutter is taken from the drawer, then the frame gets a copy in its own unit, and undo takes it back', async () => {
    const { user, present, undo } = showForm(<TakeFromDrawer role="dado" heading="Dado cutter" />);
    const before = present();
    expect(options('Take from the drawer')).toEqual(['not in the drawer', 'Straight 12.7 (in mm)']);
    await user.selectOptions(screen.getByLabelText('Take from the drawer'), 's');
    // 12.7 mm is half an inch, 25.4 mm one inch, exactly.
    expect(present().cutters.dado).toEqual({ kind: 'straight', name: 'Straight 12.7', diameter: 0.5, fluteLength: 1 });
    expect(screen.getByLabelText<HTMLSelectElement>('Take from the drawer').value).toBe('s');
    undo();
    expect(present()).toBe(before);
  });

  it('When a saved edge is taken, then the frame has it; those of the other unit are not offered', async () => {
    const { user, present } = showForm(<TakeEdge />);
    expect(options('Take an edge')).toEqual(['pick one', 'Square', 'Bead 3/32', 'Sized at the back']);
    await user.selectOptions(screen.getByLabelText('Take an edge'), 'Bead 3/32');
    expect(present().edge).toMatchObject({ style: 'beaded', bead: { radius: 0.09375 } });
    expect(present().cutters.bead).toMatchObject({ kind: 'beading' });
    await user.selectOptions(screen.getByLabelText('Take an edge'), 'e');
    expect(present().edge).toEqual({ style: 'square', sizeHeldAt: 'back' });
  });

  it('When the edge is saved by name, then it is sent with the cutters it needs', async () => {
    const seen = answerCalls(({ body }) => json({ id: 'n', preset: body }, 201));
    const { user, present } = showForm(<TakeEdge />);
    await user.selectOptions(screen.getByLabelText('Take an edge'), 'Bead 3/32');
    await user.click(screen.getByRole('button', { name: 'Save this edge, or delete one' }));
    await user.click(screen.getByRole('button', { name: 'Save the edge' }));
    expect(seen).toEqual([]);
    await user.type(screen.getByLabelText('Save this frame’s edge as'), 'Ours');
    await user.click(screen.getByRole('button', { name: 'Save the edge' }));
    await waitFor(() => expect(seen).toHaveLength(1));
    const { edge, cutters } = present();
    expect(seen[0]).toMatchObject({ method: 'POST', path: '/api/edge-presets' });
    expect(seen[0]!.body).toEqual({
      name: 'Ours',
      unit: 'in',
      edge,
      cutters: { bead: cutters.bead, quirk: cutters.quirk, corner: cutters.corner },
    });
  });
});
