import type { Network } from './network.ts';
import { packOrder } from './pack-order.ts';

/** Items to a node of the tree. */
const FAN = 16;
/** Rectangles of edges packed into a tree, for finding those that meet. */
export interface BoxTree {
  /** Calls `visit` with the number of each edge whose rectangle meets this one. */
  readonly eachMeeting: (minX: number, minY: number, maxX: number, maxY: number, visit: (edge: number) => void) => void;
  /** Calls `visit` once with each two edges whose rectangles meet, or are no further apart than `reach` in X and Y. */
  readonly eachPair: (reach: number, visit: (edge: number, other: number) => void) => void;
}

/** Middles of the edges' chords, in an order that keeps neighbours together. */
function orderOf({ nodes, edges }: Network): Int32Array {
  const x = new Float64Array(edges.count);
  const y = new Float64Array(edges.count);
  for (let e = 0; e < edges.count; e++) {
    x[e] = (nodes.x[edges.from[e]!]! + nodes.x[edges.to[e]!]!) / 2;
    y[e] = (nodes.y[edges.from[e]!]! + nodes.y[edges.to[e]!]!) / 2;
  }
  return packOrder(x, y);
}

/** Rectangles that hold each edge, in the order given: exact for lines, the chord's grown by the sagitta for arcs. */
function boxesOf({ nodes, edges }: Network, order: Int32Array): Float64Array {
  const boxes = new Float64Array(4 * edges.count);
  for (let i = 0; i < edges.count; i++) {
    const e = order[i]!;
    const ax = nodes.x[edges.from[e]!]!;
    const ay = nodes.y[edges.from[e]!]!;
    const bx = nodes.x[edges.to[e]!]!;
    const by = nodes.y[edges.to[e]!]!;
    const bulge = edges.bulge[e]!;
    const grow = bulge === 0 ? 0 : (Math.hypot(bx - ax, by - ay) * Math.abs(bulge)) / 2;
    boxes[4 * i] = Math.min(ax, bx) - grow;
    boxes[4 * i + 1] = Math.min(ay, by) - grow;
    boxes[4 * i + 2] = Math.max(ax, bx) + grow;
    boxes[4 * i + 3] = Math.max(ay, by) + grow;
  }
  return boxes;
}

/** A box for each FAN boxes of the level below. */
function levelAbove(boxes: Float64Array, size: number): Float64Array {
  const parents = Math.ceil(size / FAN);
  const level = new Float64Array(4 * parents);
  for (let p = 0; p < parents; p++) {
    let minX = Infinity;
    let minY = Infinity;
    let maxX = -Infinity;
    let maxY = -Infinity;
    for (let at = 4 * p * FAN; at < 4 * Math.min(size, (p + 1) * FAN); at += 4) {
      if (boxes[at]! < minX) minX = boxes[at]!;
      if (boxes[at + 1]! < minY) minY = boxes[at + 1]!;
      if (boxes[at + 2]! > maxX) maxX = boxes[at + 2]!;
      if (boxes[at + 3]! > maxY) maxY = boxes[at + 3]!;
    }
    level[4 * p] = minX;
    level[4 * p + 1] = minY;
    level[4 * p + 2] = maxX;
    level[4 * p + 3] = maxY;
  }
  return level;
}

/** A tree over all edges of a network. */
export function makeBoxTree(network: Network): BoxTree {
  const { count } = network.edges;
  const order = orderOf(network);
  const packed = boxesOf(network, order);
  // levels[0] has the edges themselves, in packed order; each level above has a box for FAN of the one below, up to one box.
  const levels: Float64Array[] = [packed];
  while (levels.at(-1)!.length > 4) levels.push(levelAbove(levels.at(-1)!, levels.at(-1)!.length / 4));

  const stack: number[] = [];
  const stackLevels: number[] = [];
  /** Boxes of one level that meet a rectangle. */
  const search = (
    stop: number,
    minX: number,
    minY: number,
    maxX: number,
    maxY: number,
    visit: (index: number) => void,
  ) => {
    if (count === 0) return;
    stack.push(0);
    stackLevels.push(levels.length - 1);
    while (stack.length > 0) {
      const first = stack.pop()!;
      const level = stackLevels.pop()!;
      const boxes = levels[level]!;
      const end = Math.min(boxes.length, 4 * (first + FAN));
      for (let at = 4 * first; at < end; at += 4) {
        if (boxes[at]! > maxX || boxes[at + 2]! < minX || boxes[at + 1]! > maxY || boxes[at + 3]! < minY) continue;
        if (level === stop) {
          visit(at >> 2);
        } else {
          stack.push((at >> 2) * FAN);
          stackLevels.push(level - 1);
        }
      }
    }
  };
  const eachMeeting: BoxTree['eachMeeting'] = (minX, minY, maxX, maxY, visit) =>
    search(0, minX, minY, maxX, maxY, (i) => visit(order[i]!));

  const eachPair: BoxTree['eachPair'] = (reach, visit) => {
    const comparePart = (from: number, to: number, otherFrom: number, otherTo: number) => {
      for (let i = from; i < to; i++) {
        const minX = packed[4 * i]! - reach;
        const minY = packed[4 * i + 1]! - reach;
        const maxX = packed[4 * i + 2]! + reach;
        const maxY = packed[4 * i + 3]! + reach;
        for (let j = from === otherFrom ? i + 1 : otherFrom; j < otherTo; j++) {
          const at = 4 * j;
          if (packed[at]! > maxX || packed[at + 2]! < minX || packed[at + 1]! > maxY || packed[at + 3]! < minY)
            continue;
          visit(order[i]!, order[j]!);
        }
      }
    };
    if (levels.length === 1) {
      comparePart(0, count, 0, count);
      return;
    }
    // Sixteen neighbours look for others together.
    const groups = levels[1]!;
    let group = 0;
    const end = (g: number) => Math.min(count, (g + 1) * FAN);
    const meetGroup = (other: number) => {
      if (other >= group) comparePart(group * FAN, end(group), other * FAN, end(other));
    };
    for (; 4 * group < groups.length; group++) {
      const at = 4 * group;
      search(
        1,
        groups[at]! - reach,
        groups[at + 1]! - reach,
        groups[at + 2]! + reach,
        groups[at + 3]! + reach,
        meetGroup,
      );
    }
  };
  return { eachMeeting, eachPair };
}
