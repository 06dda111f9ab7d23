import type { Unit } from '../units/unit.ts';

/**
 * What was found in somebody's drawing, before healing: lines and arcs in drawing units, and what every entity of the
 * file came to. Ellipses and splines are lines and arcs here already.
 */
export interface FoundDrawing {
  /** What the file says of its unit; null where it says none that is taken, or contradicts itself (then a problem says how). */
  readonly unit: Unit | null;
  readonly curves: FoundCurves;
  /**
   * The entities of the ENTITIES section, each counted once: a POLYLINE with its vertices, an INSERT with its attributes.
   * An INSERT is kept when anything of its block is.
   */
  readonly census: readonly CensusRow[];
  /** What kept INSERTs put there, each entity once for each time, INSERTs within blocks among them; lines are the block's. */
  readonly placed: readonly CensusRow[];
  readonly problems: readonly FoundProblem[];
  /** The file's end was missing: what came before it is here, and a person has to confirm. */
  readonly incomplete: boolean;
}

/** Segments in the order of the file, packed so that 300,000 of them are cheap to hand to a worker. */
export interface FoundCurves {
  readonly count: number;
  /** Five numbers a segment: x and y of its start, x and y of its end, bulge (0 for a line, at most 1: half a turn). */
  readonly segments: Float64Array;
  /**
   * For each segment, which entity it came of, counted from 0 over the entities kept; one of a block anew each time it is
   * put there, INSERTs themselves not.
   */
  readonly entityOf: Uint32Array;
}

export type EntityFate = 'kept' | 'aside' | 'refused';

/** Entities of one type on one layer that fared alike. All counts of the census add up to the entities in the file. */
export interface CensusRow {
  readonly type: string;
  readonly layer: string;
  readonly fate: EntityFate;
  /** Why, for those aside or refused; one row a reason. */
  readonly reason: string | null;
  readonly count: number;
  /** Line numbers in the file, counted from 1, of the first ten. */
  readonly lines: readonly number[];
}

/** Something that a person should know of the drawing. `code` is stable; `message` says what was found and what to do. */
export interface FoundProblem {
  readonly code: string;
  readonly message: string;
  /** Line number in the file, counted from 1, where there is one. */
  readonly line?: number;
  /** Place in drawing units, where there is one. */
  readonly at?: readonly [x: number, y: number];
}
