/**
 * A square raster of heights, `side` samples to a row, side − 1 a power of two. `kind` 0 is nothing; triangles between
 * different kinds, or between something and nothing, are never merged.
 */
export interface Raster {
  readonly side: number;
  readonly height: Float32Array;
  readonly kind: Uint16Array;
}

/** For each sample, how wrong a triangle is that does not use it, itself or by the samples that need it; Infinity across kinds. */
function findErrors({ side, height, kind }: Raster): Float32Array {
  const errors = new Float32Array(side * side);
  const last = side - 1;
  const own = (at: number, a: number, b: number): number => {
    const [k, ka, kb] = [kind[at]!, kind[a]!, kind[b]!];
    if (k !== ka || k !== kb) return Infinity;
    return k === 0 ? 0 : Math.abs(height[at]! - (height[a]! + height[b]!) / 2);
  };
  const take = (at: number, error: number): void => {
    if (error > errors[at]!) errors[at] = error;
  };
  for (let s = 1; s < side - 1; s *= 2) {
    // Middles of level and upright hypotenuses, 2s long; they need the middles of the slanting ones of half that size.
    const h = s / 2;
    for (let y = 0; y <= last; y += s) {
      const isLevel = (y / s) % 2 === 0;
      const step = isLevel ? s : s * side;
      for (let x = isLevel ? s : 0; x <= last; x += 2 * s) {
        const at = y * side + x;
        take(at, own(at, at - step, at + step));
        if (s === 1) continue;
        if (y > 0 && x > 0) take(at, errors[at - h * side - h]!);
        if (y > 0 && x < last) take(at, errors[at - h * side + h]!);
        if (y < last && x > 0) take(at, errors[at + h * side - h]!);
        if (y < last && x < last) take(at, errors[at + h * side + h]!);
      }
    }
    // Middles of squares 2s wide; their slanting hypotenuse runs through the middle of the square they are a quarter of.
    for (let y = s; y < last; y += 2 * s) {
      for (let x = s; x < last; x += 2 * s) {
        const at = y * side + x;
        const rises = (((x - s) / (2 * s)) & 1) === (((y - s) / (2 * s)) & 1);
        const corner = rises ? s * side + s : s * side - s;
        take(at, own(at, at - corner, at + corner));
        take(at, errors[at - s]!);
        take(at, errors[at + s]!);
        take(at, errors[at - s * side]!);
        take(at, errors[at + s * side]!);
      }
    }
  }
  return errors;
}

/** Called with the raster places of a triangle's corners, counter-clockwise seen from above. */
export type TakeTriangle = (a: number, b: number, c: number) => void;

/**
 * Covers a raster with right triangles, halved where the heights ask for it (right-triangulated irregular network: Evans,
 * Kirkpatrick and Townsend, 2001). Corners are samples, so their heights are exact; every halving that is left out would
 * have moved its new corner by no more than `tolerance`. Neighbours share their corners: there are no cracks. Triangles of
 * nothing are left out. Gives back a function that walks all triangles, as often as it is called.
 */
export function rightTriangles(raster: Raster, tolerance: number): (take: TakeTriangle) => void {
  const { side, kind } = raster;
  const last = side - 1;
  if (last < 2 || (last & (last - 1)) !== 0)
    throw new RangeError(`side: got ${side}, takes a power of two and one more`);
  const errors = findErrors(raster);
  return (take) => {
    const walk = (ax: number, ay: number, bx: number, by: number, cx: number, cy: number): void => {
      const mx = (ax + bx) >> 1;
      const my = (ay + by) >> 1;
      if (Math.abs(ax - cx) + Math.abs(ay - cy) > 1 && errors[my * side + mx]! > tolerance) {
        walk(cx, cy, ax, ay, mx, my);
        walk(bx, by, cx, cy, mx, my);
        return;
      }
      const [a, b, c] = [ay * side + ax, by * side + bx, cy * side + cx];
      if (kind[a] !== 0 || kind[b] !== 0 || kind[c] !== 0) take(a, c, b);
    };
    walk(0, 0, last, last, last, 0);
    walk(last, last, 0, 0, 0, last);
  };
}
