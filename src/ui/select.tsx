import { entryLook } from './entry-look.ts';
import { Field, type FieldProps } from './field.tsx';
import type { Option } from './choice.tsx';
import { enterMovesOn } from './move-to-next-field.ts';

interface SelectProps<T extends string> extends FieldProps {
  readonly options: readonly Option<T>[];
  readonly value: T;
  readonly onValue: (value: T) => void;
  readonly disabled?: boolean;
}

/** One of many, in the browser's own list. */
export function Select<T extends string>({
  label,
  error,
  hint,
  layout = 'row',
  hideLabel,
  options,
  value,
  onValue,
  disabled,
}: SelectProps<T>) {
  return (
    <Field label={label} error={error} hint={hint} layout={layout} hideLabel={hideLabel}>
      {(wiring) => (
        <select
          {...wiring}
          disabled={disabled}
          value={value}
          onChange={(event) => onValue(event.target.value as T)}
          onKeyDown={enterMovesOn}
          className={entryLook(layout === 'row' ? 'max-w-full min-w-24' : 'block w-full')}
        >
          {options.map((option) => (
            <option key={option.value} value={option.value} disabled={option.unavailable !== undefined}>
              {option.label}
            </option>
          ))}
        </select>
      )}
    </Field>
  );
}
