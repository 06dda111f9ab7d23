import type { Extents } from '#shared/kernel/contour/contour.ts';
import { contourExtents, joinExtents, pointExtents } from '#shared/kernel/contour/contour-extents.ts';
import type { Drawing, DrawingEntity } from '#shared/kernel/drawing/drawing.ts';
import type { FileProfile } from '#shared/kernel/profiles/file-profile.ts';
import type { ProofCheck } from '#shared/kernel/sheet/proof.ts';
import { PROOF } from '#shared/kernel/tolerances.ts';
import { findTwins } from './find-twins.ts';
import { depthRange, INSUNITS, MEASUREMENT } from './header-values.ts';
import { inLayerOrder } from './layer-order.ts';
import { otherwiseCheck, sameCheck, withinCheck } from './proof-checks.ts';
import type { ReadDxf } from './read-own-dxf.ts';

const VERSIONS: Record<FileProfile['flavour'], string> = { R2007: 'AC1021', R12: 'AC1009' };

/** How far a coordinate read back may lie from the intended one: PROOF at six decimals, tenfold for each digit less. Unit of the file. */
export const proofTolerance = (decimals: number): number => PROOF * 10 ** (6 - decimals);

type Line = Exclude<DrawingEntity, { kind: 'text' }>;
const isLine = (e: DrawingEntity): e is Line => e.kind !== 'text';

const layerWords = (layers: Drawing['layers']) => layers.map(({ name, colour }) => `${name} ${colour}`).join(', ');

function countsByLayer(entities: readonly DrawingEntity[]): string {
  const counts = new Map<string, number>();
  for (const { kind, layer } of entities) counts.set(`${layer} ${kind}`, (counts.get(`${layer} ${kind}`) ?? 0) + 1);
  return [...counts].map(([what, n]) => `${what} ${n}`).join(', ');
}

/** The places of an entity, with what belongs to each: a bulge on a flat line, a z on a climbing one. */
function placesOf(e: DrawingEntity): readonly { x: number; y: number; bulge?: number; z?: number }[] {
  if (e.kind === 'text') return [e.at];
  return e.kind === 'polyline' ? e.vertices : e.points;
}

/** One word an entity: how many vertices it has, c for closed or o for open. */
const shapesOf = (entities: readonly DrawingEntity[]) =>
  entities.map((e) => `${placesOf(e).length}${e.kind === 'polyline' && e.closed ? 'c' : 'o'}`);

/** Differences of the given numbers of each place, entity by entity; NaN where the file has no such place or number. */
function differences(
  read: readonly DrawingEntity[],
  intended: readonly DrawingEntity[],
  of: readonly ('x' | 'y' | 'z' | 'bulge')[],
): number[] {
  return intended.flatMap((entity, i) => {
    const places = read[i] === undefined ? [] : placesOf(read[i]);
    return placesOf(entity).flatMap((wanted, j) =>
      of.flatMap((key) => (wanted[key] === undefined ? [] : [(places[j]?.[key] ?? NaN) - wanted[key]])),
    );
  });
}

/** Longest chord of an arc: a rounded bulge moves a crown by at most this much times the rounding. */
function longestChord(drawing: Drawing): number {
  let longest = 0;
  for (const e of drawing.entities) {
    if (e.kind !== 'polyline') continue;
    e.vertices.forEach((v, i) => {
      const next = e.vertices[(i + 1) % e.vertices.length]!;
      if (v.bulge !== 0) longest = Math.max(longest, Math.hypot(next.x - v.x, next.y - v.y));
    });
  }
  return longest;
}

const sides = (got: Extents, wanted: Extents): number[] => [
  got.minX - wanted.minX,
  got.minY - wanted.minY,
  got.maxX - wanted.maxX,
  got.maxY - wanted.maxY,
];

/** Differences of the header's corner from the intended one; NaN where the header has none. */
function corner(value: unknown, wanted: readonly number[]): number[] {
  const { x, y, z } = (value ?? {}) as { x?: number; y?: number; z?: number };
  return wanted.map((w, i) => ([x, y, z][i] ?? NaN) - w);
}

function extentsChecks(face: string, read: ReadDxf, intended: Drawing, most: number): ProofCheck[] {
  const { extents: e } = intended;
  const { minZ, maxZ } = depthRange(intended);
  const header = [
    ...corner(read.header.$EXTMIN, [e.minX, e.minY, minZ]),
    ...corner(read.header.$EXTMAX, [e.maxX, e.maxY, maxZ]),
    ...corner(read.header.$LIMMIN, [e.minX, e.minY]),
    ...corner(read.header.$LIMMAX, [e.maxX, e.maxY]),
  ];
  const boxes = read.entities
    .filter(isLine)
    .map((l) => (l.kind === 'polyline' ? contourExtents(l) : pointExtents(l.points)));
  const [first, ...rest] = boxes;
  return [
    withinCheck(`${face}: extents in the header`, header, most),
    withinCheck(
      `${face}: extents of the lines`,
      first ? sides(joinExtents(first, ...rest), e) : [NaN],
      most + longestChord(intended) * PROOF,
    ),
  ];
}

/** A file read back, held against the drawing it was written from. `oneCut`: the layers that say the same cut. */
export function compareDrawing(
  face: string,
  read: ReadDxf,
  intended: Drawing,
  flavour: FileProfile['flavour'],
  oneCut: ReadonlySet<string>,
): ProofCheck[] {
  const most = proofTolerance(intended.decimals);
  const wanted = inLayerOrder(intended);
  const { unit } = intended;
  const texts = (entities: readonly DrawingEntity[]) =>
    entities.flatMap((e) => (e.kind === 'text' ? [e.text] : [])).join(', ') || 'none';
  const twins = findTwins(read.entities, most, oneCut);
  return [
    sameCheck(`${face}: flavour`, String(read.header.$ACADVER), VERSIONS[flavour]),
    sameCheck(
      `${face}: unit`,
      `${read.header.$INSUNITS}/${read.header.$MEASUREMENT}`,
      `${INSUNITS[unit]}/${MEASUREMENT[unit]}`,
    ),
    sameCheck(`${face}: layers and colours`, layerWords(read.layers), layerWords(intended.layers)),
    sameCheck(`${face}: lines on each layer`, countsByLayer(read.entities), countsByLayer(wanted)),
    otherwiseCheck(`${face}: open or closed, number of vertices`, shapesOf(read.entities), shapesOf(wanted)),
    withinCheck(`${face}: places of vertices`, differences(read.entities, wanted, ['x', 'y']), most),
    withinCheck(`${face}: bulges of arcs`, differences(read.entities, wanted, ['bulge']), PROOF),
    withinCheck(`${face}: depths of climbing lines`, differences(read.entities, wanted, ['z']), most),
    sameCheck(`${face}: lines off the plane or with a colour of their own`, read.strays.join(', ') || 'none', 'none'),
    sameCheck(`${face}: lines that lie twice`, twins.join(', ') || 'none', 'none'),
    sameCheck(`${face}: text`, texts(read.entities), texts(wanted)),
    ...extentsChecks(face, read, intended, most),
  ];
}
