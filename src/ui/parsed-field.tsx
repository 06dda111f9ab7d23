import { useEffect, useState } from 'react';
import { entryLook } from './entry-look.ts';
import { Field, type FieldProps } from './field.tsx';
import { enterMovesOn } from './move-to-next-field.ts';

export type Parsed = { readonly ok: true; readonly value: number } | { readonly ok: false; readonly takes: string };

export interface ParsedFieldProps extends FieldProps {
  readonly value: number;
  /** Called with each keystroke whose text can be read. */
  readonly onValue: (value: number) => void;
  readonly parse: (text: string) => Parsed;
  readonly format: (value: number) => string;
  /** On hover. */
  readonly title?: string;
  readonly name?: string;
  readonly readOnly?: boolean;
  readonly disabled?: boolean;
  /** Shown at the right of the entry, small: a unit such as °. */
  readonly suffix?: string;
  readonly onFocus?: () => void;
  readonly onBlur?: () => void;
}

/** How long a person may stop within an unfinished entry, such as "30 1/", before it is called wrong. */
const PATIENCE_MS = 700;

/**
 * A number typed as people write it. The text stays as typed while the field has focus or is wrong; what it takes
 * is said after a pause or on leaving. A value that changes from outside (undo) replaces the text.
 */
export function ParsedField(props: ParsedFieldProps) {
  const {
    label,
    error = '',
    hint,
    layout = 'row',
    hideLabel,
    value,
    onValue,
    parse,
    format,
    title,
    suffix,
    onFocus,
    onBlur,
    ...rest
  } = props;
  const [typed, setTyped] = useState<{ text: string; value: number } | null>(null);
  const [settled, setSettled] = useState(true);

  const kept = typed !== null && Object.is(typed.value, value) ? typed.text : null;
  const read = kept === null ? null : parse(kept);
  const wrong =
    read !== null && !read.ok ? `Got ${kept?.trim() ? `“${kept.trim()}”` : 'nothing'}; takes ${read.takes}.` : '';

  useEffect(() => {
    if (wrong === '' || settled) return;
    const timer = setTimeout(() => setSettled(true), PATIENCE_MS);
    return () => clearTimeout(timer);
  }, [wrong, settled, kept]);

  function change(text: string) {
    const now = parse(text);
    setSettled(false);
    setTyped({ text, value: now.ok ? now.value : value });
    if (now.ok && !Object.is(now.value, value)) onValue(now.value);
  }

  function leave() {
    setSettled(true);
    if (wrong === '') setTyped(null);
    onBlur?.();
  }

  return (
    <Field
      label={label}
      error={wrong !== '' && settled ? wrong : error}
      hint={hint}
      layout={layout}
      hideLabel={hideLabel}
    >
      {(wiring) => (
        <span className="flex shrink-0 items-baseline gap-1">
          <input
            {...rest}
            {...wiring}
            type="text"
            inputMode="text"
            autoComplete="off"
            spellCheck={false}
            title={title}
            value={kept ?? format(value)}
            onChange={(event) => change(event.target.value)}
            onKeyDown={enterMovesOn}
            onFocus={onFocus}
            onBlur={leave}
            className={entryLook('w-24 min-w-0 text-right')}
          />
          {suffix !== undefined && <span className="text-11 text-pencil">{suffix}</span>}
        </span>
      )}
    </Field>
  );
}
