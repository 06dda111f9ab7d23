import { setField } from '#shared/kernel/particulars/set-field.ts';
import { Checkbox } from '../../../ui/checkbox.tsx';
import { Section } from '../../../ui/section.tsx';
import { useDesk, useEditor } from '../model/desk.ts';
import { Entry } from './entry.tsx';
import { SwitchEntry } from './switch-entry.tsx';

const FLIPS = [
  { value: 'side-to-side', label: 'Side to side' },
  { value: 'end-over-end', label: 'End over end' },
] as const;

const SQUARING = [
  { value: 'two-edges', label: 'Two edges' },
  { value: 'all-edges', label: 'All edges' },
] as const;

/** The board as given by the shop, in place of the one that follows from the frame. */
function GivenBoard() {
  const { editor, readOnly } = useDesk();
  const given = useEditor((s) => s.history.present.blank !== undefined);
  function toggle(wanted: boolean) {
    const { history, lines } = editor.store.get();
    const { rough } = lines.blank;
    const blank = wanted ? { width: rough.maxX - rough.minX, height: rough.maxY - rough.minY } : undefined;
    editor.apply(setField(history.present, 'blank', blank), wanted ? 'Board given' : 'Board follows from the frame');
  }
  return (
    <>
      <Checkbox label="Board is given" checked={given} onChecked={toggle} disabled={readOnly} />
      {given && (
        <>
          <Entry path="blank.width" label="Board width" />
          <Entry path="blank.height" label="Board height" />
        </>
      )}
    </>
  );
}

/** How the board is turned and squared. */
export function TurningSection() {
  return (
    <Section heading="Turning over">
      <SwitchEntry path="setup.flip" label="The board turns" options={FLIPS} hideLabel />
      <SwitchEntry path="setup.squaring" label="Squaring edge" options={SQUARING} />
      <Entry path="setup.allowance" label="Allowance" />
      <Entry path="setup.trim" label="Trim" />
      <Entry path="setup.spoilboard" label="Into the spoilboard" />
      <GivenBoard />
    </Section>
  );
}
