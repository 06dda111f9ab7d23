import type { Cutter } from './cutter.ts';

/**
 * Tip depth below the face of a cut through the board: thickness + tip radius for a tapered cutter, so that its
 * straight flank passes the far face; thickness + spoilboard for the others. Common practice, no source.
 */
export const throughDepth = (cutter: Cutter, thickness: number, spoilboard: number): number =>
  thickness + (cutter.kind === 'tapered' ? cutter.tipRadius : spoilboard);
