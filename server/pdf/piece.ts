import type { Pen } from './pen.ts';

/** The least thing that is never broken over two pages: a line, a table row, a picture. Heights in millimetres. */
export interface Piece {
  readonly height: number;
  /** Draws with the upper left corner at x, y. */
  readonly draw: (pen: Pen, x: number, y: number) => void;
}

/** A block of the sheet, ready to be placed. */
export interface PlacedBlock {
  /** '' for none. Said again, with "continued", where the block goes on overleaf. */
  readonly title: string;
  /** Stands under the title, and again overleaf: a table's head. */
  readonly head?: Piece;
  readonly pieces: readonly Piece[];
}
