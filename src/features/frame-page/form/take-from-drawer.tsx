import { useMemo } from 'react';
import type { DrawerCutter } from '#shared/kernel/cutter-drawer/drawer-cutter.ts';
import { pickCutter, rolesOf } from '#shared/kernel/cutter-drawer/pick-cutter.ts';
import { refsByNumbers } from '#shared/kernel/cutter-drawer/refs-by-numbers.ts';
import type { CutterRole } from '#shared/kernel/cutters/cutter.ts';
import { setField } from '#shared/kernel/particulars/set-field.ts';
import type { Unit } from '#shared/kernel/units/unit.ts';
import { Select } from '../../../ui/select.tsx';
import { useDesk, useEditor } from '../model/desk.ts';
import { useDrawer } from './drawer.ts';

const optionOf = ({ id, cutter, unit: its }: DrawerCutter, unit: Unit) => ({
  value: id,
  label: its === unit ? cutter.name : `${cutter.name} (in ${its})`,
});

/** Puts a copy of one of the shop's cutters in the frame; shows which one the frame carries now, told by its numbers. */
export function TakeFromDrawer({ role, heading }: { readonly role: CutterRole; readonly heading: string }) {
  const { editor, readOnly } = useDesk();
  const drawer = useDrawer();
  const unit = useEditor((s) => s.history.present.unit);
  const fitting = useMemo(() => drawer.filter(({ cutter }) => rolesOf(cutter).includes(role)), [drawer, role]);
  const cutters = useEditor((s) => s.history.present.cutters);
  const current = useMemo(() => refsByNumbers({ cutters, unit }, fitting)[role] ?? '', [cutters, unit, fitting, role]);
  if (fitting.length === 0) return null;
  function take(id: string) {
    const kept = fitting.find((entry) => entry.id === id);
    const { present } = editor.store.get().history;
    if (kept) editor.apply(setField(present, `cutters.${role}`, pickCutter(kept, unit)), `${heading}, from the drawer`);
  }
  return (
    <Select
      label="Take from the drawer"
      layout="stack"
      options={[
        { value: '', label: 'not in the drawer', unavailable: 'pick one' },
        ...fitting.map((entry) => optionOf(entry, unit)),
      ]}
      value={current}
      onValue={take}
      disabled={readOnly}
    />
  );
}
