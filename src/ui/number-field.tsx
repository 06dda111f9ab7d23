import { ParsedField, type Parsed, type ParsedFieldProps } from './parsed-field.tsx';

interface NumberFieldProps extends Omit<ParsedFieldProps, 'parse' | 'format' | 'title'> {
  readonly least: number;
  readonly most: number;
  /** Whole numbers only: counts, places in a cutter changer. */
  readonly whole?: boolean;
}

/** A number that is no length: an angle, a count. */
export function NumberField({ least, most, whole = false, ...rest }: NumberFieldProps) {
  function parse(text: string): Parsed {
    const value = /^\s*[+-]?(\d+\.?\d*|\.\d+)\s*$/.test(text) ? Number(text) : Number.NaN;
    const fits = value >= least && value <= most && (!whole || Number.isInteger(value));
    return fits
      ? { ok: true, value }
      : { ok: false, takes: `a ${whole ? 'whole ' : ''}number from ${least} to ${most}` };
  }
  return <ParsedField {...rest} parse={parse} format={String} />;
}
