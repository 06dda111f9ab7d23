import { memo } from 'react';
import { formatLength, formatOther } from '#shared/kernel/units/format-length.ts';
import { parseLength } from '#shared/kernel/units/parse-length.ts';
import type { Unit } from '#shared/kernel/units/unit.ts';
import { entryLook } from '../../../ui/entry-look.ts';
import { Field } from '../../../ui/field.tsx';
import { enterMovesOn } from '../../../ui/move-to-next-field.ts';
import { useDesk } from '../model/desk.ts';
import { useFormFacts } from './form-facts.ts';
import { useEntry, type ReadText } from './use-entry.ts';

interface EntryProps {
  /** Path of the entry within the particulars, such as 'dados.0.depth'. */
  readonly path: string;
  readonly label: string;
  readonly kind?: 'length' | 'number' | 'text';
  /** Empty takes the entry out of the frame. */
  readonly optional?: boolean;
  /** Shown while an optional entry is empty: what holds then. */
  readonly placeholder?: string;
  /** row: label left, entry right; cell: a small label above, as in a table. */
  readonly layout?: 'row' | 'cell';
  readonly suffix?: string;
}

function readText(kind: NonNullable<EntryProps['kind']>, optional: boolean, unit: Unit, text: string): ReadText {
  const trimmed = text.trim();
  if (trimmed === '' && optional) return { ok: true, value: undefined };
  if (kind === 'text') return { ok: true, value: trimmed };
  if (kind === 'length') return parseLength(trimmed, unit);
  return /^[+-]?(\d+\.?\d*|\.\d+)$/.test(trimmed)
    ? { ok: true, value: Number(trimmed) }
    : { ok: false, takes: 'a number' };
}

function formatValue(kind: NonNullable<EntryProps['kind']>, unit: Unit, value: unknown): string {
  if (value === undefined) return '';
  // Typed again, a rounded number would change the frame: entries show every digit and no mark.
  if (kind === 'length')
    return formatLength(value as number, unit).startsWith('≈') ? String(value) : formatLength(value as number, unit);
  return String(value);
}

/** A length, number or text of the frame, typed as people write it; memoised, so that a keystroke elsewhere costs nothing here. */
export const Entry = memo(function Entry(props: EntryProps) {
  const { path, label, kind = 'length', optional = false, placeholder, layout = 'row', suffix } = props;
  const { readOnly } = useDesk();
  const { unit } = useFormFacts();
  const entry = useEntry(
    path,
    (text) => readText(kind, optional, unit, text),
    (value) => formatValue(kind, unit, value),
  );
  const isCell = layout === 'cell';
  return (
    <Field label={label} error={entry.error} layout="row" hideLabel={isCell} steady>
      {(wiring) => (
        <span className={isCell ? 'block' : 'flex min-w-0 shrink-0 items-baseline gap-1'}>
          {isCell && (
            <span aria-hidden="true" className="block text-11 text-pencil">
              {label}
            </span>
          )}
          <input
            {...wiring}
            data-entry={path}
            type="text"
            autoComplete="off"
            spellCheck={false}
            readOnly={readOnly}
            placeholder={placeholder}
            title={kind === 'length' && typeof entry.value === 'number' ? formatOther(entry.value, unit) : undefined}
            value={entry.text}
            onChange={(event) => entry.change(event.target.value)}
            onKeyDown={enterMovesOn}
            onBlur={entry.leave}
            className={entryLook(
              isCell ? 'block w-full min-w-0' : 'w-24 min-w-0',
              kind === 'text' ? (isCell ? '' : 'w-44') : 'text-right',
            )}
          />
          {suffix !== undefined && <span className="text-11 text-pencil">{suffix}</span>}
        </span>
      )}
    </Field>
  );
});
