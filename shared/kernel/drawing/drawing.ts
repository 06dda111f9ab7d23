import type { Extents, Point, Point3, Vertex } from '../contour/contour.ts';
import type { Unit } from '../units/unit.ts';

/** A layer of a drawing. Colours are on the layer only. */
export interface DrawingLayer {
  /** `[A-Z0-9_-]`, at most 31 characters. */
  readonly name: string;
  /** AutoCAD Color Index 1 to 255, as in the DXF Reference, group 62. */
  readonly colour: number;
}

export type DrawingEntity =
  | {
      readonly kind: 'polyline';
      readonly layer: string;
      readonly closed: boolean;
      readonly vertices: readonly Vertex[];
    }
  | { readonly kind: 'polyline3d'; readonly layer: string; readonly points: readonly Point3[] }
  | {
      readonly kind: 'text';
      readonly layer: string;
      readonly at: Point;
      readonly height: number;
      readonly text: string;
    };

/** What a DXF holds, before any flavour: the neutral drawing that writers take and the proof holds files against. */
export interface Drawing {
  readonly unit: Unit;
  /** Digits behind the point, 4 to 6. */
  readonly decimals: number;
  readonly layers: readonly DrawingLayer[];
  readonly entities: readonly DrawingEntity[];
  /** True extents, arcs included. */
  readonly extents: Extents;
}
