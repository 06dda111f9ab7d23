import { useState } from 'react';
import { formatDecimal } from '#shared/kernel/units/format-length.ts';
import { parseLength } from '#shared/kernel/units/parse-length.ts';
import { entryLook } from '../../ui/entry-look.ts';
import { Field } from '../../ui/field.tsx';

interface MillimetreEntryProps {
  readonly label: string;
  readonly value: number;
  readonly from: number;
  readonly to: number;
  readonly hint?: string;
  readonly disabled?: boolean;
  /** Called when the entry is left or Enter is pressed, with a value in the range: each one has the drawing read again. */
  readonly onValue: (value: number) => void;
}

/** Digits behind the point: finer gaps than these mean nothing. */
const DIGITS = 4;

/** A small length in millimetres, whatever the unit of the drawing. */
export function MillimetreEntry({ label, value, from, to, hint, disabled, onValue }: MillimetreEntryProps) {
  const [typed, setTyped] = useState<string | null>(null);
  const [wrong, setWrong] = useState('');

  function take() {
    if (typed === null) return;
    const read = parseLength(typed, 'mm');
    const inRange = read.ok && read.value >= from && read.value <= to;
    setWrong(inRange ? '' : `Got “${typed.trim()}”; takes millimetres from ${from} to ${to}.`);
    if (!inRange) return;
    setTyped(null);
    if (read.value !== value) onValue(read.value);
  }

  return (
    <Field label={label} error={wrong} hint={hint} layout="row">
      {(wiring) => (
        <input
          {...wiring}
          type="text"
          inputMode="decimal"
          autoComplete="off"
          spellCheck={false}
          disabled={disabled}
          value={typed ?? formatDecimal(value, DIGITS)}
          onChange={(event) => setTyped(event.target.value)}
          onBlur={take}
          onKeyDown={(event) => {
            if (event.key === 'Enter' && !event.nativeEvent.isComposing) take();
          }}
          className={entryLook('w-24 min-w-0 shrink-0 text-right')}
        />
      )}
    </Field>
  );
}
