import type { Contour, Vertex } from '../../contour/contour.ts';
import { bulgeOf, startOf } from './half-edges.ts';
import type { Network } from './network.ts';

/** Half-edges in a row as a contour, run the other way when asked. */
export function contourOfHalves(
  network: Network,
  halves: readonly number[],
  closed: boolean,
  backwards: boolean,
): Contour {
  const { x, y } = network.nodes;
  const way = backwards ? halves.toReversed().map((h) => h ^ 1) : halves;
  const vertices: Vertex[] = way.map((h) => {
    const n = startOf(network, h);
    return { x: x[n]!, y: y[n]!, bulge: bulgeOf(network, h) };
  });
  if (!closed) {
    const n = startOf(network, way.at(-1)! ^ 1);
    vertices.push({ x: x[n]!, y: y[n]!, bulge: 0 });
  }
  return { closed, vertices };
}
