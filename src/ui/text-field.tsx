import type { HTMLInputAutoCompleteAttribute, Ref } from 'react';
import { entryLook } from './entry-look.ts';
import { Field, type FieldProps } from './field.tsx';
import { enterMovesOn } from './move-to-next-field.ts';

interface TextFieldProps extends FieldProps {
  readonly value: string;
  readonly onValue: (value: string) => void;
  readonly name?: string;
  readonly type?: 'text' | 'email' | 'password' | 'search' | 'date';
  readonly autoComplete?: HTMLInputAutoCompleteAttribute;
  readonly maxLength?: number;
  readonly readOnly?: boolean;
  readonly disabled?: boolean;
  readonly placeholder?: string;
  /** Enter goes to the next field in place of sending the form. */
  readonly enterMoves?: boolean;
  /** More than one line: how many are shown. */
  readonly lines?: number;
  readonly onBlur?: () => void;
  readonly ref?: Ref<HTMLInputElement>;
}

export function TextField(props: TextFieldProps) {
  const {
    label,
    error,
    hint,
    layout,
    hideLabel,
    value,
    onValue,
    enterMoves = false,
    lines = 1,
    type = 'text',
    ref,
    ...rest
  } = props;
  return (
    <Field label={label} error={error} hint={hint} layout={layout} hideLabel={hideLabel}>
      {(wiring) =>
        lines > 1 ? (
          <textarea
            {...rest}
            {...wiring}
            rows={lines}
            value={value}
            onChange={(event) => onValue(event.target.value)}
            className={entryLook('block w-full')}
          />
        ) : (
          <input
            {...rest}
            {...wiring}
            ref={ref}
            type={type}
            value={value}
            onChange={(event) => onValue(event.target.value)}
            onKeyDown={enterMoves ? enterMovesOn : undefined}
            className={entryLook(layout === 'row' ? 'w-36 min-w-0 shrink-0 text-right' : 'block w-full')}
          />
        )
      }
    </Field>
  );
}
