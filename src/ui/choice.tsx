import { useId } from 'react';
import { classNames } from './class-names.ts';

export interface Option<T extends string> {
  readonly value: T;
  readonly label: string;
  /** Why it cannot be picked; left out when it can. */
  readonly unavailable?: string;
}

interface ChoiceProps<T extends string> {
  readonly label: string;
  readonly options: readonly Option<T>[];
  readonly value: T;
  readonly onValue: (value: T) => void;
  readonly hint?: string;
  readonly error?: string;
  /** The label is for screen readers only, where a heading says it already. */
  readonly hideLabel?: boolean;
  readonly disabled?: boolean;
}

/** A switch between two or three options, all in sight: a radio group, walked with the arrow keys. */
export function Choice<T extends string>({
  label,
  options,
  value,
  onValue,
  hint,
  error = '',
  hideLabel = false,
  disabled = false,
}: ChoiceProps<T>) {
  const id = useId();
  const says = [error !== '' && `${id}-error`, hint !== undefined && `${id}-hint`]
    .filter((part) => part !== false)
    .join(' ');
  return (
    <fieldset disabled={disabled} aria-describedby={says || undefined} className="mb-1.5 min-w-0">
      <legend className={hideLabel ? 'sr-only' : 'mb-0.5'}>{label}</legend>
      <div className="flex border border-ink">
        {options.map((option, i) => (
          <label
            key={option.value}
            title={option.unavailable}
            className={classNames(
              'flex min-h-6.5 flex-1 items-center justify-center px-1.5 py-0.5 text-center',
              'has-checked:bg-ink has-checked:text-paper has-disabled:text-pencil has-checked:has-disabled:bg-pencil has-checked:has-disabled:text-paper',
              'has-focus-visible:outline-2 has-focus-visible:outline-offset-2 has-focus-visible:outline-front',
              i > 0 && 'border-l border-ink',
            )}
          >
            <input
              type="radio"
              name={id}
              value={option.value}
              checked={option.value === value}
              disabled={option.unavailable !== undefined}
              onChange={() => onValue(option.value)}
              className="sr-only"
            />
            {option.label}
          </label>
        ))}
      </div>
      {error !== '' && (
        <p id={`${id}-error`} className="text-12 text-stop">
          {error}
        </p>
      )}
      {hint !== undefined && (
        <p id={`${id}-hint`} className="text-11 text-pencil">
          {hint}
        </p>
      )}
    </fieldset>
  );
}
