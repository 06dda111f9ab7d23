/** The most that is read of one drawing; beyond, it is refused by a named code. */
export interface ReadLimits {
  /** Size of the file. */
  readonly bytes: number;
  /** Entities in the file together with those that blocks put there; blocks as well. */
  readonly entities: number;
  /** Lines and arcs that come of them. */
  readonly segments: number;
  /** Attempts to lay arcs along ellipses and splines. */
  readonly fits: number;
  /** Bytes of block contents, read again each time a block is put somewhere. */
  readonly placedBytes: number;
  /** Blocks within blocks. */
  readonly nesting: number;
}

const MB = 1024 * 1024;

export const READ_LIMITS: ReadLimits = {
  bytes: 32 * MB,
  entities: 400_000,
  segments: 2_000_000,
  fits: 3_000_000,
  placedBytes: 128 * MB,
  nesting: 32,
};

/** Lines of the census and problems of one kind keep this many places; the others are counted only. */
export const PLACES_KEPT = 10;

/** Coordinates beyond this are refused: their squares and products would lose all meaning. Drawing units. */
export const FARTHEST = 1e12;

/** Splines of a higher degree are refused: none is drawn by hand, and work grows with its square. */
export const HIGHEST_DEGREE = 11;

/** Attempts that one curve may take, and as many more for each of its pieces; one that takes more is refused alone. */
export const FITS_A_CURVE = 10_000;
export const FITS_A_PIECE = 64;

/** Splines of more control or fit points are refused: their pieces are all in memory at once. */
export const MOST_SPLINE_POINTS = 100_000;

/** Greatest ratio of a spline's weights. */
export const WEIGHT_RANGE = 1e6;
