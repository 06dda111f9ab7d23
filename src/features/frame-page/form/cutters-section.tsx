import { memo } from 'react';
import { FIT } from '#shared/kernel/checks/check-cutters.ts';
import type { Cutter, CutterKind, CutterRole } from '#shared/kernel/cutters/cutter.ts';
import { changeCutterKind } from '#shared/kernel/particulars/change-cutter-kind.ts';
import { setField } from '#shared/kernel/particulars/set-field.ts';
import { Section } from '../../../ui/section.tsx';
import { Select } from '../../../ui/select.tsx';
import { useDesk, useEditor } from '../model/desk.ts';
import { Entry } from './entry.tsx';
import { TakeFromDrawer } from './take-from-drawer.tsx';

const ROLES: readonly { readonly role: CutterRole; readonly heading: string }[] = [
  { role: 'dado', heading: 'Dado cutter' },
  { role: 'squaring', heading: 'Squaring cutter' },
  { role: 'opening', heading: 'Opening cutter' },
  { role: 'perimeter', heading: 'Perimeter cutter' },
  { role: 'bead', heading: 'Bead cutter' },
  { role: 'quirk', heading: 'Quirk cutter' },
  { role: 'corner', heading: 'Corner cutter' },
];

const KIND_WORDS: Record<CutterKind, string> = {
  straight: 'Straight',
  tapered: 'Tapered',
  vee: 'V',
  beading: 'Beading',
};

/** The numbers that give a kind of cutter its shape. */
const SHAPES: Record<
  CutterKind,
  readonly {
    readonly key: string;
    readonly label: string;
    readonly kind: 'length' | 'number';
    readonly suffix?: string;
  }[]
> = {
  straight: [{ key: 'diameter', label: 'Diameter', kind: 'length' }],
  tapered: [
    { key: 'tipRadius', label: 'Tip radius', kind: 'length' },
    { key: 'sideAngle', label: 'Angle of a side', kind: 'number', suffix: '°' },
  ],
  vee: [{ key: 'includedAngle', label: 'Included angle', kind: 'number', suffix: '°' }],
  beading: [
    { key: 'profileRadius', label: 'Profile radius', kind: 'length' },
    { key: 'tipFlat', label: 'Tip flat', kind: 'length' },
  ],
};

const CutterEntries = memo(function CutterEntries({
  role,
  heading,
}: {
  readonly role: CutterRole;
  readonly heading: string;
}) {
  const { editor, readOnly } = useDesk();
  const kind = useEditor((s) => s.history.present.cutters[role]?.kind);
  const path = `cutters.${role}`;
  if (kind === undefined) return null;
  const kinds = [...new Set([...FIT[role], kind])];
  function changeKind(wanted: CutterKind) {
    const { present } = editor.store.get().history;
    const cutter = present.cutters[role] as Cutter;
    editor.apply(setField(present, path, changeCutterKind(cutter, wanted, present.unit)), `${heading}, kind`);
  }
  return (
    <Section heading={heading} aside={kinds.length > 1 ? undefined : KIND_WORDS[kind].toLowerCase()} level={3}>
      <TakeFromDrawer role={role} heading={heading} />
      {/* Where one kind alone can do the work there is nothing to choose. */}
      {kinds.length > 1 && (
        <div data-entry={`${path}.kind`}>
          <Select
            label="Kind"
            layout="row"
            options={kinds.map((value) => ({ value, label: KIND_WORDS[value] }))}
            value={kind}
            onValue={changeKind}
            disabled={readOnly}
          />
        </div>
      )}
      {SHAPES[kind].map(({ key, ...entry }) => (
        <Entry key={key} path={`${path}.${key}`} {...entry} />
      ))}
      <Entry path={`${path}.fluteLength`} label="Flute length" />
      <Entry path={`${path}.maxPass`} label="Deepest pass" optional placeholder="all at once" />
      <Entry path={`${path}.name`} label="Name" kind="text" optional />
      <Entry path={`${path}.number`} label="Place in changer" kind="number" optional />
    </Section>
  );
});

/** The cutter of each role that the frame has one for. */
export function CuttersSection() {
  return (
    <Section heading="Cutters">
      {ROLES.map((entry) => (
        <CutterEntries key={entry.role} {...entry} />
      ))}
    </Section>
  );
}
