import type { FeatureId } from '../frame/members.ts';
import type { SheetColour } from './sheet-colours.ts';
import type { LineLook } from './sheet-drawing.ts';

/** One stroke, area or word on paper. Millimetres, X right, Y down from the picture's upper left corner. */
export type PaperShape =
  | {
      readonly kind: 'path';
      /** SVG path data: M, L, A and Z only. */
      readonly d: string;
      readonly line?: LineLook;
      readonly fill?: SheetColour;
      readonly of?: readonly FeatureId[];
      readonly set?: string;
    }
  | {
      readonly kind: 'text';
      readonly text: string;
      /** Place of the baseline at the anchor. */
      readonly x: number;
      readonly y: number;
      /** Height of the em; capitals are 0.73 of it, every character is 0.6 of it wide (JetBrains Mono). */
      readonly size: number;
      readonly anchor: 'start' | 'middle' | 'end';
      /** Reads upwards: turned 90° counter-clockwise about x, y. */
      readonly turned?: boolean;
      readonly bold?: boolean;
      readonly colour: SheetColour;
      readonly of?: readonly FeatureId[];
    };

/** A picture in paper millimetres: what painters (PDF, SVG) take. */
export interface PaperPicture {
  readonly width: number;
  readonly height: number;
  readonly shapes: readonly PaperShape[];
  /** Said to people who do not see the picture. */
  readonly description: string;
}

/** Width of every character of JetBrains Mono, as a share of the em. */
export const CHARACTER_WIDTH = 0.6;

/** Millimetres per unit of a line weight, ISO 128-2 series. */
export const LINE_WEIGHT = { hairline: 0.13, thin: 0.25, thick: 0.5, heavy: 0.9 } as const;

/** Dash and gap lengths in millimetres. */
export const LINE_DASH = { dashed: [2, 1.2], chain: [5, 1, 0.8, 1], dotted: [0.5, 0.9] } as const;
