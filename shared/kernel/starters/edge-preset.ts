import type { Cutters, Edge } from '../particulars/particulars.ts';
import type { Unit } from '../units/unit.ts';

/** An edge of the openings with the cutters that make it, as a shop saves it to use again; lengths in `unit`. */
export interface EdgePreset {
  readonly name: string;
  readonly unit: Unit;
  readonly edge: Edge;
  /** Cutters that come along; the frame keeps its own for the others. */
  readonly cutters: Partial<Pick<Cutters, 'opening' | 'bead' | 'quirk' | 'corner'>>;
}
