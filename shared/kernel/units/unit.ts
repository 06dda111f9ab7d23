/** The two units of length a frame may be written in. */
export type Unit = 'in' | 'mm';

/** Exact by definition: international yard and pound agreement of 1959. */
export const MM_PER_INCH = 25.4;

/** Unit names as a person reads them. */
export const UNIT_WORDS: Record<Unit, string> = { in: 'inches', mm: 'millimetres' };
