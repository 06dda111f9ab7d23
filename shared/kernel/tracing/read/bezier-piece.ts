/** A rational Bézier curve: three numbers a control point, x·w, y·w and w, with w above 0. */
export type Piece = Float64Array;
