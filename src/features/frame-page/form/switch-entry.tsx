import { memo } from 'react';
import { readField } from '#shared/kernel/particulars/read-field.ts';
import { Choice, type Option } from '../../../ui/choice.tsx';
import { Select } from '../../../ui/select.tsx';
import { useDesk, useEditor } from '../model/desk.ts';

interface SwitchEntryProps {
  readonly path: string;
  readonly label: string;
  readonly options: readonly Option<string>[];
  /** A list that opens, where there is no room to show all options. */
  readonly asList?: boolean;
  readonly hideLabel?: boolean;
  /** What holds while an optional entry is absent. */
  readonly whenAbsent?: string;
}

/** One of a few words in the particulars. Give it the same `options` object each time. */
export const SwitchEntry = memo(function SwitchEntry({
  path,
  label,
  options,
  asList = false,
  hideLabel = false,
  whenAbsent = '',
}: SwitchEntryProps) {
  const { editor, readOnly } = useDesk();
  const value = useEditor((s) => (readField(s.history.present, path) as string | undefined) ?? whenAbsent);
  const wrong = useEditor((s) => s.wrong.get(path) ?? '');
  const pick = (picked: string) => {
    editor.setWrong(path, editor.edit(path, picked));
    editor.leaveEntry();
  };
  const common = {
    label,
    options,
    value,
    onValue: pick,
    disabled: readOnly,
    error: wrong === '' ? '' : `Takes ${wrong}.`,
  };
  return (
    <div data-entry={path}>
      {asList ? (
        <Select {...common} layout="stack" hideLabel={hideLabel} />
      ) : (
        <Choice {...common} hideLabel={hideLabel} />
      )}
    </div>
  );
});
