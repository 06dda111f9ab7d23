import type { Point, Extents } from '../contour/contour.ts';
import type { FeatureId } from '../frame/members.ts';
import type { Unit } from '../units/unit.ts';
import type { ComparedState } from './compared-state.ts';

/** Where a changed thing is in one of the states; frame view, unit of the comparison. */
export interface ChangedPlace {
  readonly id: FeatureId;
  readonly extents: Extents;
}

/** A number that differs; `measure` says what it is a number of. Areas are in the unit squared, angles in degrees. */
export interface NumberChange {
  readonly name: string;
  readonly measure: 'length' | 'area' | 'angle' | 'count';
  readonly was: number;
  readonly is: number;
}

/** Something that is told in words: a label, an edge, how a dado ends. '' where it was not there. */
export interface WordChange {
  readonly name: string;
  readonly was: string;
  readonly is: string;
}

/** How an outline's line moved where numbers alone do not tell. */
export interface LineChange {
  /** Greatest distance from either outline to the other, and the place of it. */
  readonly distance: number;
  readonly at: Point;
  /** Vertices of the older outline that the newer one does not have, and the other way round. */
  readonly verticesGone: readonly Point[];
  readonly verticesNew: readonly Point[];
}

/** A part of the frame that is not what it was. `before` null: it came. `after` null: it went. */
export interface FeatureChange {
  readonly kind: 'perimeter' | 'opening' | 'dado' | 'member';
  /** As the newer state calls it. */
  readonly label: string;
  readonly before: ChangedPlace | null;
  readonly after: ChangedPlace | null;
  readonly numbers: readonly NumberChange[];
  readonly words: readonly WordChange[];
  readonly line: LineChange | null;
}

/** A setting that differs, in numbers or in words; null where a state does not have it. */
export interface SettingChange {
  /** Such as "Edge" or "Dado cutter". */
  readonly subject: string;
  readonly name: string;
  readonly measure: 'length' | 'angle' | 'count' | 'word';
  readonly was: number | string | null;
  readonly is: number | string | null;
}

/** Two states of a frame held against each other. All lengths in `unit`, the newer state's. */
export interface Comparison {
  readonly unit: Unit;
  /** The older state's unit, when it is another one. */
  readonly unitWas: Unit | null;
  readonly before: ComparedState;
  readonly after: ComparedState;
  /** Perimeter, openings, dados, members. */
  readonly features: readonly FeatureChange[];
  /** What the cut depends on first, names last. */
  readonly settings: readonly SettingChange[];
}
