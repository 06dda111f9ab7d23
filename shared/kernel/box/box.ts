import type { Unit } from '../units/unit.ts';

/**
 * A cabinet box as it stands behind its frame, seen from the front; all lengths in `unit`. Bottom, top and partitions
 * stand between the two ends. A nailer at the back does not touch the frame and is no part of this.
 */
export interface Box {
  /** Name of the frame that follows from it. */
  readonly name: string;
  readonly unit: Unit;
  /** Outside, end to end. */
  readonly width: number;
  /** From the lower to the upper edge of the ends. */
  readonly height: number;
  /** Front to back without the frame. */
  readonly depth?: number;
  readonly ends: { readonly thickness: number };
  /** `up`: from the lower edge of the ends to its underside, such as the height of a toe kick. */
  readonly bottom: { readonly thickness: number; readonly up: number };
  readonly top?: BoxTop;
  readonly partitions?: { readonly thickness: number; readonly places: PartitionPlaces };
  /**
   * How far the frame stands out past the box's outside. 0 is flush. Negative where the box stands out past the frame:
   * at the bottom, where ends run down to the floor beside a toe kick; at the top, where ends run up past the frame; at
   * a side, by half an end at most, where the end lies in a rebate of the frame's edge.
   */
  readonly overhang: Sides;
  /**
   * How far a member reaches past the part behind it, into the opening; 0 is flush with the part. Without a top,
   * `reveal.top` counts from the upper edge of the ends.
   */
  readonly reveal: Sides & { /** On each side of a partition. */ readonly partition: number };
  /** How far the stiles run down past the bottom rail. */
  readonly feet: number;
  /** `run`: how the dados of upright parts end where the frame stands out past the box. Elsewhere they are open. */
  readonly dado: { readonly depth: number; readonly clearance: number; readonly run: 'open' | 'stopped' };
  /** How deep a part that ends at another one is let into it. */
  readonly letIn: number;
}

export interface Sides {
  readonly left: number;
  readonly right: number;
  readonly top: number;
  readonly bottom: number;
}

/** `down`: from the upper edge of the ends to its upper face. A stretcher lies flat at the front and has a width of its own, front to back. */
export type BoxTop =
  | { readonly kind: 'panel'; readonly thickness: number; readonly down: number }
  | { readonly kind: 'stretcher'; readonly thickness: number; readonly down: number; readonly width: number };

/**
 * 'given': from the box's left outside to the left face of each, left to right. 'equal openings': the openings between
 * the members are of one width. 'equal spaces': the spaces inside the box are.
 */
export type PartitionPlaces =
  | { readonly kind: 'given'; readonly at: readonly number[] }
  | { readonly kind: 'equal openings' | 'equal spaces'; readonly count: number };
