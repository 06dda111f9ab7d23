import type { Cutter } from '../cutters/cutter.ts';
import type { Unit } from '../units/unit.ts';

/** The data a person enters for a frame, as in a frame file. All lengths in `unit`, all places in frame view. */
export interface Particulars {
  readonly format: 'stilepost.frame/1';
  readonly name: string;
  readonly unit: Unit;
  readonly thickness: number;
  readonly outline: Outline;
  readonly edge: Edge;
  readonly dados: readonly Dado[];
  readonly setup: Setup;
  readonly cutters: Cutters;
  /** The board, when it is given; otherwise it follows from the frame. */
  readonly blank?: { readonly width: number; readonly height: number };
}

export type Outline = MembersOutline | TracedOutline;

export interface MembersOutline {
  readonly kind: 'members';
  readonly width: number;
  readonly height: number;
  readonly stiles: { readonly left: number; readonly right: number };
  readonly rails: { readonly top: number; readonly bottom: number };
  /** How far the stiles run down past the bottom rail. */
  readonly feet: number;
  readonly layout: LayoutPart;
}

/** `[x, y]` or `[x, y, bulge]`. */
export type TracedVertex = readonly [number, number] | readonly [number, number, number];

export interface TracedOutline {
  readonly kind: 'traced';
  readonly perimeter: readonly TracedVertex[];
  readonly openings: readonly (readonly TracedVertex[])[];
  /** Places in `openings`, from 0, of those that keep a square edge in a frame with beaded edges. */
  readonly squareOpenings?: readonly number[];
}

/** A node of the layout tree; `size` is its fixed width (in columns) or height (in rows). */
export type LayoutPart = OpeningPart | ColumnsPart | RowsPart;

export interface OpeningPart {
  readonly opening: {
    readonly label?: string;
    /** Rise of the arc that forms the head. */
    readonly arch?: number;
    /** Keeps this opening's edge square in a frame with beaded edges. */
    readonly edge?: 'square';
  };
  readonly size?: number;
}

export interface ColumnsPart {
  /** Left to right. */
  readonly columns: readonly LayoutPart[];
  /** Width of the mid-stiles between. */
  readonly between: number;
  readonly size?: number;
}

export interface RowsPart {
  /** Top to bottom. */
  readonly rows: readonly LayoutPart[];
  /** Width of the mid-rails between. */
  readonly between: number;
  readonly size?: number;
}

export type SizeHeldAt = 'face' | 'back' | 'bead base';

/**
 * What is done in an opening's inside corners: 'lift' (the opening cutter climbs into them, where its shape allows), 'vee'
 * (that, and a V-cutter after it), 'round' (neither).
 */
export type CornerMethod = 'lift' | 'vee' | 'round';

interface EdgeCommon {
  /** 'lift' when absent. */
  readonly corners?: CornerMethod;
}

export interface SquareEdge extends EdgeCommon {
  readonly style: 'square';
  readonly sizeHeldAt: 'face' | 'back';
}

export interface Bead {
  readonly radius: number;
  /** How far the top of the bead lies below the face. */
  readonly drop: number;
  /** Width of the quirk. */
  readonly quirk: number;
}

export interface BeadedEdge extends EdgeCommon {
  readonly style: 'beaded';
  /** "bead base" when absent. */
  readonly sizeHeldAt?: SizeHeldAt;
  readonly bead: Bead;
}

export type Edge = SquareEdge | BeadedEdge;

export type DadoEnd = 'open' | 'stopped' | 'meets';

export interface Dado {
  /** The box part that plugs in. */
  readonly part: string;
  readonly runs: 'vertical' | 'horizontal';
  /** Left side (vertical) or lower side (horizontal) of the panel. */
  readonly at: number;
  /** Thickness of the panel. */
  readonly panel: number;
  /** How much wider than the panel the dado is, both sides together. */
  readonly clearance: number;
  readonly depth: number;
  readonly from: number;
  readonly to: number;
  /** How it ends at `from` and at `to`. */
  readonly ends: readonly [DadoEnd, DadoEnd];
}

export type Flip = 'side-to-side' | 'end-over-end';

export interface Setup {
  readonly flip: Flip;
  /** k: squared edge to perimeter. */
  readonly allowance: number;
  /** t: rough edge to squared edge. */
  readonly trim: number;
  readonly squaring: 'two-edges' | 'all-edges';
  /** How far through cuts go into the spoilboard. */
  readonly spoilboard: number;
}

export interface Cutters {
  readonly dado: Cutter;
  readonly squaring: Cutter;
  readonly opening: Cutter;
  readonly perimeter: Cutter;
  readonly bead?: Cutter;
  readonly quirk?: Cutter;
  readonly corner?: Cutter;
}
