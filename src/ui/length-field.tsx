import { useEffect, useState } from 'react';
import { formatLength, formatOther } from '#shared/kernel/units/format-length.ts';
import { parseLength, type ParsedLength } from '#shared/kernel/units/parse-length.ts';
import type { Unit } from '#shared/kernel/units/unit.ts';
import { entryLook } from './entry-look.ts';
import { Field, type FieldProps } from './field.tsx';
import { enterMovesOn } from './move-to-next-field.ts';

interface LengthFieldProps extends FieldProps {
  readonly value: number;
  /** Unit of `value` and of what is typed without one. */
  readonly unit: Unit;
  /** Called with each keystroke whose text can be read. */
  readonly onValue: (value: number) => void;
  /** The length must be more than this, in `unit`; left out where any will do. */
  readonly above?: number;
  readonly disabled?: boolean;
}

/** How long a person may stop within an unfinished entry, such as "30 1/", before it is called wrong. */
const PATIENCE_MS = 700;

function read(text: string, unit: Unit, above: number | undefined): ParsedLength {
  const length = parseLength(text, unit);
  if (!length.ok || above === undefined || length.value > above) return length;
  return { ok: false, takes: `a length above ${formatLength(above, unit)}` };
}

/** Every digit of a length that would be rounded: typed again, the rounded one would be another length. */
function show(value: number, unit: Unit): string {
  const text = formatLength(value, unit);
  return text.startsWith('≈') ? String(value) : text;
}

/**
 * A length typed as people write it: 30 1/2, 30-1/2, 30.5, 775mm in an inch frame; the other unit on hover. The text
 * stays as typed while the field has focus or is wrong; what it takes is said after a pause or on leaving. A value
 * that changes from outside (undo) replaces the text. Enter goes to the next field.
 */
export function LengthField(props: LengthFieldProps) {
  const { label, error = '', hint, layout = 'row', hideLabel, value, unit, onValue, above, disabled } = props;
  const [typed, setTyped] = useState<{ text: string; value: number } | null>(null);
  const [settled, setSettled] = useState(true);

  const kept = typed !== null && Object.is(typed.value, value) ? typed.text : null;
  const length = kept === null ? null : read(kept, unit, above);
  const wrong =
    length !== null && !length.ok ? `Got ${kept?.trim() ? `“${kept.trim()}”` : 'nothing'}; takes ${length.takes}.` : '';

  useEffect(() => {
    if (wrong === '' || settled) return;
    const timer = setTimeout(() => setSettled(true), PATIENCE_MS);
    return () => clearTimeout(timer);
  }, [wrong, settled, kept]);

  function change(text: string) {
    const now = read(text, unit, above);
    setSettled(false);
    setTyped({ text, value: now.ok ? now.value : value });
    if (now.ok && !Object.is(now.value, value)) onValue(now.value);
  }

  function leave() {
    setSettled(true);
    if (wrong === '') setTyped(null);
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
        <input
          {...wiring}
          type="text"
          autoComplete="off"
          spellCheck={false}
          disabled={disabled}
          title={formatOther(value, unit)}
          value={kept ?? show(value, unit)}
          onChange={(event) => change(event.target.value)}
          onKeyDown={enterMovesOn}
          onBlur={leave}
          className={entryLook('w-24 min-w-0 shrink-0 text-right')}
        />
      )}
    </Field>
  );
}
