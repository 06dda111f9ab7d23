import type { Contour, Point } from '../contour/contour.ts';
import { offsetContour } from '../contour/offset-contour.ts';
import type { BeadingCutter, Cutter, StraightCutter, VeeCutter } from '../cutters/cutter.ts';
import { passDepths } from '../cutters/pass-depths.ts';
import type { Opening } from '../frame/members.ts';
import type { BeadedEdge, Particulars } from '../particulars/particulars.ts';
import { drawingChord, QUIRK_OVERLAP, SAME } from '../tolerances.ts';
import { beadBase } from './held-depth.ts';
import type { LineSet, SetName, Shape } from './line-set.ts';
import type { OpeningCut } from './opening-cut.ts';
import { veeCorners } from './vee-corners.ts';

/** The cutters of a beaded edge, each of the kind that its work takes. */
export interface BeadCutters {
  readonly bead: BeadingCutter;
  readonly quirk: StraightCutter;
  readonly corner: VeeCutter;
}

/** A bead line that cannot be: which, how far from the opening's edge, why and where. */
export interface BeadProblem {
  readonly opening: Opening;
  readonly set: SetName;
  readonly offset: number;
  readonly reason: 'arc' | 'collapse' | 'crosses';
  readonly at: Point;
  readonly radius?: number;
}

/** The cutters of a beaded edge when all are there and of the right kind; undefined otherwise (the cutter check says so). */
export function beadCutters({ bead, quirk, corner }: Particulars['cutters']): BeadCutters | undefined {
  const is = <K extends Cutter['kind']>(cutter: Cutter | undefined, kind: K): cutter is Extract<Cutter, { kind: K }> =>
    cutter?.kind === kind;
  return is(bead, 'beading') && is(quirk, 'straight') && is(corner, 'vee') ? { bead, quirk, corner } : undefined;
}

/**
 * Outward offsets of the quirk's lines from the opening's edge: the middle, when the cutter is as wide as the quirk; else as
 * many as it needs, overlapping a little, the first and last at its radius from the walls. None when it is wider.
 */
export function quirkOffsets({ radius, quirk }: BeadedEdge['bead'], diameter: number): number[] {
  const spare = quirk - diameter;
  if (spare < -SAME) return [];
  const inner = 2 * radius;
  if (spare <= SAME) return [inner + quirk / 2];
  const steps = Math.ceil(spare / (diameter * (1 - QUIRK_OVERLAP)) - SAME);
  return Array.from(
    { length: steps + 1 },
    (_, i) => inner + diameter / 2 + (i === steps ? spare : (i * spare) / steps),
  );
}

/**
 * Bead, quirk and quirk corner lines of the beaded openings, frame view. Outward offsets from the opening's edge, for bead
 * radius R, quirk q and tip flat t: bead −t/2 and 2R + t/2, quirk 2R + q/2; all at the bead's base, e + R below the face.
 */
export function beadLineSets(
  p: Particulars,
  edge: BeadedEdge,
  cutters: BeadCutters,
  openings: readonly Opening[],
  cut: OpeningCut,
): { lineSets: LineSet[]; problems: BeadProblem[] } {
  const { radius, quirk } = edge.bead;
  const flat = cutters.bead.tipFlat;
  const depth = beadBase(edge);
  const problems: BeadProblem[] = [];
  const shapes = new Map<SetName, Shape[]>();
  const put = (set: SetName, shape: Shape) => shapes.set(set, [...(shapes.get(set) ?? []), shape]);

  const lines: readonly (readonly [SetName, number])[] = [
    ['BEAD_INNER', -flat / 2],
    ['BEAD_OUTER', 2 * radius + flat / 2],
    ...quirkOffsets(edge.bead, cutters.quirk.diameter).map((offset) => ['QUIRK', offset] as const),
  ];
  for (const opening of openings) {
    const moved = (set: SetName, offset: number): Contour | undefined => {
      const found = offsetContour(opening.contour, cut.atPlane + offset);
      if (found.ok) return found.contour;
      problems.push({ opening, set, offset, reason: found.reason, at: found.at, radius: found.radius });
      return undefined;
    };
    for (const [set, offset] of lines) {
      const contour = moved(set, offset);
      if (contour) put(set, { kind: 'contour', contour, of: [opening.id] });
    }
    const wall = moved('QUIRK_CORNER', 2 * radius + quirk);
    if (!wall) continue;
    const corners = veeCorners(wall, {
      floor: depth,
      plane: 0,
      filletRadius: cutters.quirk.diameter / 2,
      cutter: cutters.corner,
      chord: drawingChord(p.unit),
    });
    for (const points of corners.paths) put('QUIRK_CORNER', { kind: 'climb', points, of: [opening.id] });
    for (const at of corners.missed)
      problems.push({ opening, set: 'QUIRK_CORNER', offset: 2 * radius + quirk, reason: 'collapse', at });
  }

  const roles = { BEAD_INNER: 'bead', BEAD_OUTER: 'bead', QUIRK: 'quirk', QUIRK_CORNER: 'corner' } as const;
  const lineSets = (Object.keys(roles) as (keyof typeof roles)[]).flatMap((set): LineSet[] => {
    const found = shapes.get(set);
    if (!found) return [];
    const cutter = roles[set];
    const passes = set === 'QUIRK_CORNER' ? [depth] : passDepths(depth, cutters[cutter].maxPass);
    return [{ face: 'front', set, variant: '', cutter, side: 'on', depth, passes, shapes: found }];
  });
  return { lineSets, problems };
}
