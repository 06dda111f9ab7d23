import type { Unit } from '../../units/unit.ts';
import type { FoundProblem } from '../found-drawing.ts';
import type { FileHeader } from './read-header.ts';

/** Names of the units that $INSUNITS may stand for (DXF Reference, group 70 of $INSUNITS), but for inches and millimetres. */
const OTHER_UNITS: Readonly<Record<number, string>> = {
  2: 'feet',
  3: 'miles',
  5: 'centimetres',
  6: 'metres',
  7: 'kilometres',
  8: 'microinches',
  9: 'mils',
  10: 'yards',
  11: 'ångströms',
  12: 'nanometres',
  13: 'micrometres',
  14: 'decimetres',
  15: 'decametres',
  16: 'hectometres',
  17: 'gigametres',
  18: 'astronomical units',
  19: 'light years',
  20: 'parsecs',
  21: 'US survey feet',
  22: 'US survey inches',
  23: 'US survey yards',
  24: 'US survey miles',
};

const CHOOSE = 'Choose the unit by the width and height that the drawing should have.';

/** The unit that a file says it is drawn in, or null and why: it says none, one that we do not take, or contradicts itself. */
export function findUnit({ insertUnits, measurement }: FileHeader): {
  readonly unit: Unit | null;
  readonly problem: FoundProblem | null;
} {
  const none = (code: string, message: string) => ({ unit: null, problem: { code, message: `${message} ${CHOOSE}` } });
  if (insertUnits === null || insertUnits === 0) return none('unit-not-said', 'The file does not say its unit.');
  if (insertUnits !== 1 && insertUnits !== 4) {
    const name = OTHER_UNITS[insertUnits] ?? `unit ${insertUnits}, which is none`;
    return none('unit-not-taken', `The file says ${name}; inches and millimetres are taken.`);
  }
  const unit = insertUnits === 1 ? 'in' : 'mm';
  if (measurement === (unit === 'in' ? 1 : 0)) {
    const [says, against] = unit === 'in' ? ['inches', 'metric'] : ['millimetres', 'inches'];
    return none('unit-conflict', `The file says ${says} ($INSUNITS) and ${against} ($MEASUREMENT).`);
  }
  return { unit, problem: null };
}
