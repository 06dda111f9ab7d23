import type { Extents, Point, Vertex } from '#shared/kernel/contour/contour.ts';
import { pointExtents } from '#shared/kernel/contour/contour-extents.ts';
import type { DrawingEntity } from '#shared/kernel/drawing/drawing.ts';
import { tidyContour } from '#shared/kernel/drawing/tidy-line.ts';
import { lineSetKey, type LineSet } from '#shared/kernel/line-sets/line-set.ts';
import type { FileProfile } from '#shared/kernel/profiles/file-profile.ts';
import { fileUnit } from '#shared/kernel/profiles/file-unit.ts';
import { nameLayers } from '#shared/kernel/profiles/name-layers.ts';
import type { ProofCheck } from '#shared/kernel/sheet/proof.ts';
import { SAME } from '#shared/kernel/tolerances.ts';
import { convertLength } from '#shared/kernel/units/convert-length.ts';
import type { WorkedFrame } from '#shared/kernel/worked-frame.ts';
import { proofTolerance } from './compare-drawing.ts';
import { compareContours } from './compare-contours.ts';
import { compareRegions } from './compare-regions.ts';
import { withinCheck } from './proof-checks.ts';
import type { ReadDxf } from './read-own-dxf.ts';

/** Lengths of the turn, in the unit of the files. Taken from the particulars, not from the kernel's placements, which are on trial here. */
function turnOf(worked: WorkedFrame, profile: FileProfile) {
  const { unit: drawn, setup, blank } = worked.particulars;
  const unit = fileUnit(profile, drawn);
  const length = (value: number) => convertLength(value, drawn, unit);
  const { allowance: k, trim: t } = setup;
  const { width, height } = worked.contours;
  return {
    length,
    flip: setup.flip,
    squaring: setup.squaring,
    k: length(k),
    t: length(t),
    width: length(width),
    height: length(height),
    boardWidth: length(blank?.width ?? width + 2 * k + 2 * t),
    boardHeight: length(blank?.height ?? height + 2 * k + 2 * t),
  };
}
type Turn = ReturnType<typeof turnOf>;

/** A place of the back file as it lies on the pins once the board is turned over about the fold (spec of the two setups). */
function turnOver(turn: Turn, origin: FileProfile['origin'], p: Point): Point {
  const { flip, k, t, width, height, boardWidth, boardHeight } = turn;
  const sideways = flip === 'side-to-side';
  const corner = sideways ? { x: boardWidth - t - k - width, y: t + k } : { x: t + k, y: boardHeight - t - k - height };
  const x = origin === 'frame' ? p.x + corner.x : p.x;
  const y = origin === 'frame' ? p.y + corner.y : p.y;
  return sideways ? { x: boardWidth - t - x, y: y - t } : { x: x - t, y: boardHeight - t - y };
}

const contoursOn = (read: ReadDxf, layer: string | undefined) =>
  read.entities.filter(
    (e): e is Extract<DrawingEntity, { kind: 'polyline' }> => e.kind === 'polyline' && e.layer === layer,
  );

const sideDifferences = (got: Extents, wanted: Extents): number[] => [
  got.minX - wanted.minX,
  got.minY - wanted.minY,
  got.maxX - wanted.maxX,
  got.maxY - wanted.maxY,
];

/** The squared edges of the turned board against the pins at x = 0 and y = 0. */
function squaredEdges(lines: readonly (readonly Point[])[], turn: Turn): number[] {
  if (lines.length !== 1) return [NaN];
  const line = lines[0]!;
  if (turn.squaring === 'all-edges') {
    return sideDifferences(pointExtents(line), {
      minX: 0,
      minY: 0,
      maxX: turn.width + 2 * turn.k,
      maxY: turn.height + 2 * turn.k,
    });
  }
  const toCorner = Math.min(...line.map((p) => Math.hypot(p.x, p.y)));
  const offEdges = line.map((p) => Math.min(Math.abs(p.x), Math.abs(p.y)));
  // Both edges must be there, and the board must lie on the pins' side of them.
  const reachesX = Math.max(...line.map((p) => p.x)) > turn.width;
  const reachesY = Math.max(...line.map((p) => p.y)) > turn.height;
  return [toCorner, ...offEdges, reachesX && reachesY ? 0 : Infinity];
}

/**
 * The two files against each other by way of frame view: the back, turned over about the fold and laid on the pins,
 * must put each dado and the squared edges where the particulars say; the front its perimeter and openings.
 */
export function proveTurnedOver(
  worked: WorkedFrame,
  profile: FileProfile,
  back: ReadDxf,
  front: ReadDxf,
): ProofCheck[] {
  const turn = turnOf(worked, profile);
  const { length, k } = turn;
  const most = proofTolerance(profile.decimals);
  const layers = nameLayers(worked, profile);
  const layerOf = (lineSet: LineSet) => layers.get(lineSetKey(lineSet))?.name;
  const setsOf = (face: 'back' | 'front', set: LineSet['set']) =>
    worked[face].lineSets.filter((s) => s.set === set && layers.has(lineSetKey(s)));
  const turned = (vertices: readonly Vertex[]) => vertices.map((v) => turnOver(turn, profile.origin, v));

  const dadoSets = setsOf('back', 'DADO');
  const outlinesAt = (depth: number) =>
    dadoSets
      .filter((s) => Math.abs(s.depth - depth) < SAME)
      .flatMap((s) => contoursOn(back, layerOf(s)).map(({ vertices }) => turned(vertices)));
  const depths = [...new Set(worked.dados.map((d) => d.depth))];
  const dadoDifferences = depths.flatMap((depth) => {
    const wanted = worked.dados
      .filter((d) => Math.abs(d.depth - depth) < SAME)
      .map(({ extents: e }) => ({
        minX: length(e.minX) + k,
        minY: length(e.minY) + k,
        maxX: length(e.maxX) + k,
        maxY: length(e.maxY) + k,
      }));
    return compareRegions(outlinesAt(depth), wanted, most);
  });
  const squaring = setsOf('back', 'SQUARING').flatMap((s) =>
    contoursOn(back, layerOf(s)).map(({ vertices }) => turned(vertices)),
  );

  const shift = profile.origin === 'pins' ? k : 0;
  const frameView = (vertices: readonly Vertex[]) => {
    const shifted = vertices.map((v) => ({ x: length(v.x) + shift, y: length(v.y) + shift, bulge: v.bulge }));
    return tidyContour(shifted, true, profile.decimals);
  };
  const onFront = (set: LineSet['set']) =>
    setsOf('front', set).flatMap((s) => contoursOn(front, layerOf(s)).map(({ vertices }) => vertices));
  const perimeter = [frameView(worked.contours.perimeter.vertices)];
  const openings = worked.contours.openings.map(({ contour }) => frameView(contour.vertices));

  // Two roundings meet here, that of the file and that of the turn.
  const twice = 2 * most;
  return [
    withinCheck('back turned over: dados where frame view has them', dadoDifferences, twice),
    withinCheck('back turned over: squared edges on the pins', squaredEdges(squaring, turn), twice),
    withinCheck('front: perimeter where frame view has it', compareContours(onFront('PERIMETER'), perimeter), twice),
    ...(profile.openingLines === 'axis'
      ? []
      : [
          withinCheck(
            'front: openings where frame view has them',
            compareContours(onFront('OPENING'), openings),
            twice,
          ),
        ]),
  ];
}
