import type { Unit } from '#shared/kernel/units/unit.ts';
import type { FieldMessages } from '../../lib/field-messages.ts';
import { LengthField } from '../../ui/length-field.tsx';

interface BoxEntryProps {
  /** Path of the entry within the box, such as 'ends.thickness'. */
  readonly path: string;
  readonly label: string;
  readonly value: number;
  readonly unit: Unit;
  readonly wrong: FieldMessages;
  readonly onValue: (value: number) => void;
  readonly hint?: string;
  /** Left out where 0 or a negative length will do. */
  readonly above?: number;
}

/** One length of a box, with what is wrong with it beside it. */
export const BoxEntry = ({ path, wrong, ...field }: BoxEntryProps) => <LengthField {...field} error={wrong[path]} />;
