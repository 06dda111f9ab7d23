import { formatLength, formatOther } from '#shared/kernel/units/format-length.ts';
import { parseLength } from '#shared/kernel/units/parse-length.ts';
import type { Unit } from '#shared/kernel/units/unit.ts';
import { ParsedField, type Parsed, type ParsedFieldProps } from './parsed-field.tsx';

interface LengthFieldProps extends Omit<ParsedFieldProps, 'parse' | 'format' | 'title'> {
  /** Unit of `value` and of what is typed without one. */
  readonly unit: Unit;
  /** Smallest and largest that the field takes, in `unit`. */
  readonly least?: number;
  readonly most?: number;
  /** The smallest itself is refused: a width of 0 is none. */
  readonly above?: boolean;
}

/** A length typed as people write it: 30 1/2, 30-1/2, 30.5, 775mm in an inch frame. The other unit shows on hover. */
export function LengthField({ unit, least, most, above = false, ...rest }: LengthFieldProps) {
  function parse(text: string): Parsed {
    const read = parseLength(text, unit);
    if (!read.ok) return read;
    const tooSmall = least !== undefined && (above ? read.value <= least : read.value < least);
    if (tooSmall)
      return {
        ok: false,
        takes: above ? `a length above ${formatLength(least, unit)}` : `a length from ${formatLength(least, unit)}`,
      };
    if (most !== undefined && read.value > most)
      return { ok: false, takes: `a length up to ${formatLength(most, unit)}` };
    return read;
  }
  return (
    <ParsedField
      {...rest}
      parse={parse}
      format={(value) => formatLength(value, unit)}
      title={formatOther(rest.value, unit)}
    />
  );
}
