import type { Particulars } from '../particulars/particulars.ts';
import type { Unit } from '../units/unit.ts';
import type { EdgePreset } from './edge-preset.ts';

export type StarterId = 'base' | 'drawer-stack' | 'wall' | 'tall' | 'corner-pair' | 'vanity' | 'arched-bookcase';

/** A common frame to begin from, or frames that belong together. Sizes are invented: round numbers of either unit, not converted. */
export interface Starter {
  readonly id: StarterId;
  readonly name: string;
  /** What it is, in a line. */
  readonly line: string;
  /** Its frames, each valid and without a stop; square edges unless a preset in the same unit is given. */
  frames(unit: Unit, edge?: EdgePreset): Particulars[];
}
