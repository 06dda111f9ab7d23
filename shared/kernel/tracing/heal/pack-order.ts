/** Bits of a coordinate in the order. */
const ORDER_BITS = 14;
/** Points that can be numbered. */
const INDEX_ROOM = 2 ** 24;

/** Spreads the bits of a number so that another's fit between them. */
function spread(n: number): number {
  n = (n | (n << 8)) & 0x00ff00ff;
  n = (n | (n << 4)) & 0x0f0f0f0f;
  n = (n | (n << 2)) & 0x33333333;
  return (n | (n << 1)) & 0x55555555;
}

/**
 * Numbers of points in an order in which neighbours are near each other (Morton order). Points in one cell of its 16,384 × 16,384
 * stay in the order in which they came. Throws for more points than it can number (16 million).
 */
export function packOrder(x: Float64Array, y: Float64Array): Int32Array {
  const count = x.length;
  if (count >= INDEX_ROOM) throw new RangeError(`points: got ${count}, takes fewer than ${INDEX_ROOM}`);
  let minX = Infinity;
  let minY = Infinity;
  let maxX = -Infinity;
  let maxY = -Infinity;
  for (let i = 0; i < count; i++) {
    if (x[i]! < minX) minX = x[i]!;
    if (x[i]! > maxX) maxX = x[i]!;
    if (y[i]! < minY) minY = y[i]!;
    if (y[i]! > maxY) maxY = y[i]!;
  }
  const steps = 2 ** ORDER_BITS - 1;
  const scale = steps / Math.max(maxX - minX, maxY - minY, Number.MIN_VALUE);
  const keys = new Float64Array(count);
  for (let i = 0; i < count; i++) {
    const column = Math.min(steps, Math.floor((x[i]! - minX) * scale));
    const row = Math.min(steps, Math.floor((y[i]! - minY) * scale));
    // Place and number in one float, so that sorting needs no comparison function.
    keys[i] = (spread(column) | (spread(row) << 1)) * INDEX_ROOM + i;
  }
  keys.sort();
  const order = new Int32Array(count);
  for (let i = 0; i < count; i++) order[i] = keys[i]! % INDEX_ROOM;
  return order;
}
