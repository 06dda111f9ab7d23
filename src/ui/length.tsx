import { formatLength, formatOther } from '#shared/kernel/units/format-length.ts';
import type { Unit } from '#shared/kernel/units/unit.ts';

/** A length to read: a fraction where exact, else decimals, `≈` where rounded; the other unit on hover. */
export function Length({ value, unit }: { readonly value: number; readonly unit: Unit }) {
  return (
    <span title={formatOther(value, unit)} className="whitespace-nowrap">
      {formatLength(value, unit)}
    </span>
  );
}
