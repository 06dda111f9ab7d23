import type { Contour, Extents, Point } from '../contour/contour.ts';
import type { FeatureId } from '../frame/members.ts';
import type { Unit } from '../units/unit.ts';
import type { SheetColour } from './sheet-colours.ts';

/** Widths on paper: hairline 0.13 mm, thin 0.25 mm, thick 0.5 mm, heavy 0.9 mm. */
export type LineWeight = 'hairline' | 'thin' | 'thick' | 'heavy';

export interface LineLook {
  readonly colour: SheetColour;
  readonly weight: LineWeight;
  readonly dash?: 'dashed' | 'chain' | 'dotted';
}

/** One place measured from the pins along an axis; dimensions of one axis are laid out together, so that no two texts overlap. */
export interface PinDimension {
  /** Where it is, in the setup's coordinates. */
  readonly at: number;
  /** The measured feature begins here on the other axis; the dimension's thin line starts there. */
  readonly from: number;
  readonly text: string;
  readonly colour: SheetColour;
  /** Stays when there are too many to draw them all. */
  readonly always?: boolean;
  readonly of: readonly FeatureId[];
}

/** Room for a label, in the setup's coordinates. */
export interface LabelSpot {
  readonly area: Extents;
  /** Reads upwards. */
  readonly turned?: boolean;
  /** The side of the area that it stands close to, so that it is seen whose it is; the middle when absent. */
  readonly close?: 'left' | 'right' | 'bottom' | 'top';
  /** May lie over keep-clear places: it stands on its own feature. */
  readonly onFeature?: boolean;
}

/** What a drawing shows, in setup coordinates (frame's unit, Y up), whatever paints it. */
export type DrawingItem =
  | {
      readonly kind: 'contour';
      readonly contour: Contour;
      /** Absent: filled only. */
      readonly line?: LineLook;
      readonly fill?: SheetColour;
      readonly of: readonly FeatureId[];
      /** The line set it belongs to (lineSetKey), '' for none. */
      readonly set: string;
    }
  | {
      /** Words that stay readable at any scale: their height is on paper, their place on the board. */
      readonly kind: 'label';
      /** From the most to the least wanted; what fits first is drawn, and nothing when nothing fits. */
      readonly texts: readonly string[];
      /** Tried in order. */
      readonly spots: readonly LabelSpot[];
      /** Laid under words that do not stand on their own feature, so that lines stop at them. */
      readonly ground?: SheetColour;
      readonly colour: SheetColour;
      readonly bold?: boolean;
      readonly of: readonly FeatureId[];
    }
  /** A locating pin that touches the board at `at`, on the side that `push` says. */
  | { readonly kind: 'pin'; readonly at: Point; readonly side: 'left' | 'below' }
  /** Where both setups measure from. */
  | { readonly kind: 'origin'; readonly at: Point }
  /** A corner marked with a filled quarter disc; `inward` points into the board. */
  | {
      readonly kind: 'corner mark';
      readonly at: Point;
      readonly inward: { readonly x: 1 | -1; readonly y: 1 | -1 };
      readonly colour: SheetColour;
    };

/** A drawing to scale with dimensions from the pins. */
export interface SheetDrawing {
  /** Said to people who do not see the drawing. */
  readonly description: string;
  readonly unit: Unit;
  /** Of the geometry, without dimensions. */
  readonly extents: Extents;
  readonly items: readonly DrawingItem[];
  /** No label may be put over these, but for those that stand on their own feature. */
  readonly keepClear: readonly Extents[];
  /** Measured along X, texts below the drawing. */
  readonly across: readonly PinDimension[];
  /** Measured along Y, texts at the left of the drawing. */
  readonly up: readonly PinDimension[];
}
