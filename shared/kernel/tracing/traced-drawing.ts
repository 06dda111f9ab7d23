import type { TracedVertex } from '../particulars/particulars.ts';
import type { Unit } from '../units/unit.ts';
import type { CensusRow } from './found-drawing.ts';
import type { LoopRole } from './frames/loop-role.ts';
import type { HealCounts, HealedLoop } from './heal/healed-drawing.ts';

/** How somebody's drawing is read and healed. */
export interface TraceOptions {
  /** null: as the file says. */
  readonly unit: Unit | null;
  /** Gaps up to this are closed; millimetres. */
  readonly gap: number;
  /** Runs of short lines that lie within this of an arc become one; millimetres. null: they stay lines. */
  readonly arcs: number | null;
  /** What is set aside otherwise. */
  readonly include: {
    readonly paperSpace: boolean;
    readonly offLayers: boolean;
    readonly frozenLayers: boolean;
    readonly invisible: boolean;
  };
  /** Layers, by name, that are left out. */
  readonly leaveOut: readonly string[];
  /** Which face the drawing shows. */
  readonly view: 'front' | 'back';
}

/** A drawing read with nothing asked for: gaps up to 0.05 mm closed, lines left lines. */
export const PLAIN_TRACE: TraceOptions = {
  unit: null,
  gap: 0.05,
  arcs: null,
  include: { paperSpace: false, offLayers: false, frozenLayers: false, invisible: false },
  leaveOut: [],
  view: 'front',
};

/** Something that a person should know of the drawing, with its place where it has one. */
export interface TraceProblem {
  readonly code: string;
  readonly message: string;
  /** Line of the file, counted from 1. */
  readonly line?: number;
  /** Drawing units about `origin`. */
  readonly at?: readonly [x: number, y: number];
}

export interface TracedLoop {
  readonly vertices: readonly TracedVertex[];
  readonly kind: HealedLoop['kind'];
  /** What it is taken for, until a person says otherwise. */
  readonly role: LoopRole;
}

/** Somebody's drawing as found and as healed; plain data, to be sent and drawn. Places are in drawing units about `origin`. */
export interface TracedDrawing {
  /** What the file says; null where it says none that is taken, or contradicts itself. */
  readonly fileUnit: Unit | null;
  /** What the numbers are taken as; null: nothing is healed before a person has chosen. */
  readonly unit: Unit | null;
  readonly incomplete: boolean;
  readonly census: readonly CensusRow[];
  readonly placed: readonly CensusRow[];
  readonly problems: readonly TraceProblem[];
  readonly origin: readonly [x: number, y: number];
  /** Extents of all that was found, arcs included; null for a drawing without a line. */
  readonly extents: {
    readonly minX: number;
    readonly minY: number;
    readonly maxX: number;
    readonly maxY: number;
  } | null;
  /** How many lines and arcs were found. */
  readonly segments: number;
  /** x, y, x, y and bulge of each, to be drawn; null when there are too many for that. */
  readonly found: readonly number[] | null;
  readonly loops: readonly TracedLoop[];
  /** What does not close. */
  readonly open: readonly (readonly TracedVertex[])[];
  /** null before the unit is known. */
  readonly counts: HealCounts | null;
}
