/** A place in the plane, in the frame's unit; X right, Y up. */
export interface Point {
  readonly x: number;
  readonly y: number;
}

/** A place in space; z is negative below the board's face that lies up. */
export interface Point3 extends Point {
  readonly z: number;
}

/**
 * A vertex of a contour. `bulge` belongs to the segment that leaves it: tan(arc angle / 4),
 * positive counter-clockwise, 0 for a line (DXF Reference, LWPOLYLINE group 42).
 */
export interface Vertex extends Point {
  readonly bulge: number;
}

/**
 * Lines and arcs in a row. Closed contours do not repeat their first vertex; their last
 * segment leads back to it. The bulge of an open contour's last vertex means nothing and is 0.
 */
export interface Contour {
  readonly closed: boolean;
  readonly vertices: readonly Vertex[];
}

/** Smallest upright rectangle around something. */
export interface Extents {
  readonly minX: number;
  readonly minY: number;
  readonly maxX: number;
  readonly maxY: number;
}
