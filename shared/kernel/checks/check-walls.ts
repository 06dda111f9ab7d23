import { containsPoint } from '../contour/contains-point.ts';
import type { Contour, Extents } from '../contour/contour.ts';
import { rectangle } from '../contour/make-contour.ts';
import { intersectSegments } from '../contour/intersect-segments.ts';
import { segmentDistance } from '../contour/segment-distance.ts';
import { segmentsOf, type Segment } from '../contour/segments.ts';
import type { DadoOutline } from '../frame/dado-outline.ts';
import type { FrameContours, Opening } from '../frame/members.ts';
import type { Dado, Particulars } from '../particulars/particulars.ts';
import { leastWall, WELD } from '../tolerances.ts';
import { formatWithUnit } from '../units/format-length.ts';
import type { Unit } from '../units/unit.ts';
import type { Finding } from './finding.ts';
import { atDado, atOpening, wholeFrame } from './place-finding.ts';

interface Prepared {
  readonly dado: Dado;
  readonly outline: DadoOutline;
  readonly box: Contour;
  readonly sides: readonly Segment[];
}

const line = (ax: number, ay: number, bx: number, by: number): Segment => ({
  kind: 'line',
  a: { x: ax, y: ay },
  b: { x: bx, y: by },
});

/** Board left between a dado and openings, the frame's edge and other dados, at the entered sizes; frame view. */
export function checkWalls(p: Particulars, contours: FrameContours, outlines: readonly DadoOutline[]): Finding[] {
  const least = leastWall(p.unit);
  const prepared = outlines.map((outline): Prepared => {
    const box = rectangle(outline.extents);
    return { dado: p.dados[outline.index]!, outline, box, sides: segmentsOf(box) };
  });
  const openings = contours.openings.map((opening) => ({ opening, segments: segmentsOf(opening.contour) }));
  const perimeter = segmentsOf(contours.perimeter);
  return prepared.flatMap((d, i) => [
    ...openings.flatMap(({ opening, segments }) => checkOpening(d, opening, segments, least, p.unit)),
    ...checkEdge(d, perimeter, contours, least, p.unit),
    ...prepared.slice(i + 1).flatMap((other) => checkOther(d, other, least, p.unit)),
  ]);
}

const gap = (a: Extents, b: Extents) => Math.max(a.minX - b.maxX, b.minX - a.maxX, a.minY - b.maxY, b.minY - a.maxY);

function leastDistance(as: readonly Segment[], bs: readonly Segment[], stopAt: number): number {
  let least = stopAt;
  for (const a of as) for (const b of bs) least = Math.min(least, segmentDistance(a, b));
  return least;
}

const thin = (text: string, remedy: string, wall: number, places: Finding['places'], field: string): Finding => ({
  code: 'thin-wall',
  level: 'caution',
  text,
  remedy,
  numbers: { wall },
  places,
  field,
});

/** How far a dado reaches into an opening's extents, across its direction. */
function reachInto({ dado, outline: { extents: d } }: Prepared, o: Extents): number {
  return dado.runs === 'vertical'
    ? Math.min(d.maxX - o.minX, o.maxX - d.minX)
    : Math.min(d.maxY - o.minY, o.maxY - d.minY);
}

function checkOpening(
  d: Prepared,
  opening: Opening,
  segments: readonly Segment[],
  least: number,
  unit: Unit,
): Finding[] {
  if (gap(d.outline.extents, opening.extents) >= least) return [];
  const inside =
    containsPoint(opening.contour, d.box.vertices[0]!) || containsPoint(d.box, opening.contour.vertices[0]!);
  const wall = inside ? 0 : leastDistance(d.sides, segments, least);
  if (wall >= least - WELD) return [];
  const places = [atDado(d.outline), atOpening(opening, 'both')];
  const field = `dados.${d.outline.index}.at`;
  const remedy = 'Move the dado or make the member wider.';
  if (wall > WELD)
    return [
      thin(
        `Only ${formatWithUnit(wall, unit)} of board between dado ${d.dado.part} and opening ${opening.label}.`,
        remedy,
        wall,
        places,
        field,
      ),
    ];
  const reach = reachInto(d, opening.extents);
  const width = d.dado.panel + d.dado.clearance;
  const text =
    reach <= WELD
      ? `Dado ${d.dado.part} touches opening ${opening.label}: no board is left between them.`
      : reach < width - WELD
        ? `Dado ${d.dado.part} breaks into opening ${opening.label} by ${formatWithUnit(reach, unit)}.`
        : `Dado ${d.dado.part} runs across opening ${opening.label}.`;
  return [thin(text, `${remedy} If the panel is meant to show there, go on.`, -Math.max(0, reach), places, field)];
}

/** The sides of a dado that should have board beside them: its long sides, and its ends that are not open. */
function edgeSides({ dado, outline: { extents: e } }: Prepared): Segment[] {
  const low = dado.ends[0] !== 'open';
  const high = dado.ends[1] !== 'open';
  return dado.runs === 'vertical'
    ? [
        line(e.minX, e.minY, e.minX, e.maxY),
        line(e.maxX, e.minY, e.maxX, e.maxY),
        ...(low ? [line(e.minX, e.minY, e.maxX, e.minY)] : []),
        ...(high ? [line(e.minX, e.maxY, e.maxX, e.maxY)] : []),
      ]
    : [
        line(e.minX, e.minY, e.maxX, e.minY),
        line(e.minX, e.maxY, e.maxX, e.maxY),
        ...(low ? [line(e.minX, e.minY, e.minX, e.maxY)] : []),
        ...(high ? [line(e.maxX, e.minY, e.maxX, e.maxY)] : []),
      ];
}

const middle = ({ dado, outline: { extents: e } }: Prepared): Segment =>
  dado.runs === 'vertical'
    ? line((e.minX + e.maxX) / 2, e.minY, (e.minX + e.maxX) / 2, e.maxY)
    : line(e.minX, (e.minY + e.maxY) / 2, e.maxX, (e.minY + e.maxY) / 2);

function checkEdge(
  d: Prepared,
  perimeter: readonly Segment[],
  contours: FrameContours,
  least: number,
  unit: Unit,
): Finding[] {
  const centre = middle(d);
  // Edges that the dado runs out through are meant to be open.
  const edges = perimeter.filter((edge) => intersectSegments(centre, edge).length === 0);
  const wall = leastDistance(edgeSides(d), edges, least);
  if (wall >= least - WELD) return [];
  const broken = wall <= WELD;
  const text = broken
    ? `Dado ${d.dado.part} breaks out at the frame’s edge along its side.`
    : `Only ${formatWithUnit(wall, unit)} of board between dado ${d.dado.part} and the frame’s edge.`;
  return [
    thin(
      text,
      'Move the dado away from the edge.',
      broken ? 0 : wall,
      [atDado(d.outline), wholeFrame(contours, 'back')],
      `dados.${d.outline.index}.at`,
    ),
  ];
}

function checkOther(d: Prepared, other: Prepared, least: number, unit: Unit): Finding[] {
  const apart = gap(d.outline.extents, other.outline.extents);
  if (apart <= WELD || apart >= least) return [];
  const wall = leastDistance(d.sides, other.sides, least);
  if (wall >= least - WELD) return [];
  return [
    thin(
      `Only ${formatWithUnit(wall, unit)} of board between dados ${d.dado.part} and ${other.dado.part}.`,
      'Move one of the dados.',
      wall,
      [atDado(d.outline), atDado(other.outline)],
      `dados.${other.outline.index}.at`,
    ),
  ];
}
