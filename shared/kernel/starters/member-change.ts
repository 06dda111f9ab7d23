import type { FeatureId } from '../frame/members.ts';
import type { Particulars } from '../particulars/particulars.ts';
import type { Unit } from '../units/unit.ts';

/** What can be changed for many frames at once. 'mid-stiles' and 'mid-rails' are all of a frame; 'thickness' is the board's. */
export const CHANGEABLE = [
  'left stile',
  'right stile',
  'top rail',
  'bottom rail',
  'mid-stiles',
  'mid-rails',
  'feet',
  'thickness',
  'dado clearance',
  'dado depth',
] as const;
export type Changeable = (typeof CHANGEABLE)[number];

/** Entries that may be 0. */
export const MAY_BE_NONE: readonly Changeable[] = ['feet', 'dado clearance'];

export interface MemberChange {
  readonly what: Changeable;
  readonly unit: Unit;
  readonly to: number;
  /** Only where it is this now; wherever it is when absent. */
  readonly from?: number;
}

/** An entry of a dado that followed a member: where a part stands, or where it begins or ends because another part moved. */
export interface MovedDado {
  readonly dado: FeatureId;
  readonly part: string;
  readonly entry: 'at' | 'from' | 'to';
  readonly was: number;
  readonly is: number;
}

/** A dado behind a member that changed, left where it is because it could follow in more than one way. */
export interface StayedDado {
  readonly dado: FeatureId;
  readonly part: string;
}

export type ChangedFrame =
  | {
      readonly ok: true;
      /** The very same object when nothing changed. */
      readonly particulars: Particulars;
      /** "left stile: 2 in, was 1 3/4 in". */
      readonly changed: readonly string[];
      /** Changes that found nothing to do, and why. */
      readonly skipped: readonly string[];
      readonly moved: readonly MovedDado[];
      readonly stayed: readonly StayedDado[];
    }
  | { readonly ok: false; readonly why: string };
