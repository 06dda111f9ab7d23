import { SAME } from '../tolerances.ts';
import { formatWithUnit } from '../units/format-length.ts';
import type { Unit } from '../units/unit.ts';
import type { BoxProblem } from './box-problem.ts';

/** Holds entries against bounds and gathers what is wrong; a value that is no number keeps no bound. */
export interface BoxBounds {
  readonly problems: readonly BoxProblem[];
  least(field: string, value: number, least: number, why: string): void;
  most(field: string, value: number, most: number, why: string): void;
  say(value: number): string;
}

export function boxBounds(unit: Unit): BoxBounds {
  const problems: BoxProblem[] = [];
  const say = (value: number): string => (Number.isFinite(value) ? formatWithUnit(value, unit) : String(value));
  return {
    problems,
    say,
    least(field, value, least, why) {
      if (!(value >= least - SAME)) problems.push({ field, got: say(value), takes: `at least ${say(least)}: ${why}` });
    },
    most(field, value, most, why) {
      if (!(value <= most + SAME)) problems.push({ field, got: say(value), takes: `at most ${say(most)}: ${why}` });
    },
  };
}
