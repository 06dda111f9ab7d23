import type { EntityFate } from '../found-drawing.ts';

/** Why an entity is not kept. Stable: they stand in the census, and those refused are codes of problems too. */
export type AsideReason =
  | 'text'
  | 'dimension'
  | 'hatch'
  | 'point'
  | 'picture'
  | 'construction-line'
  | 'viewport'
  | 'paper-space'
  | 'invisible'
  | 'layer-off'
  | 'layer-frozen'
  | 'layer-left-out'
  | 'empty-block'
  | 'no-length';

export type RefusedReason =
  | 'not-a-number'
  | 'missing-number'
  | 'not-a-pair'
  | 'three-dimensional'
  | 'not-flat'
  | 'tilted'
  | 'unknown-entity'
  | 'stray-part'
  | 'bad-size'
  | 'out-of-range'
  | 'cut-off'
  | 'spline-data'
  | 'curve-lost'
  | 'block-missing'
  | 'block-external'
  | 'block-cycle'
  | 'block-bomb'
  | 'block-too-deep';

export type Reason = AsideReason | RefusedReason;

const entities = (n: number): string => (n === 1 ? '1 entity' : `${n} entities`);

/** What is said of those refused, and what to do. */
const REFUSED: Readonly<Record<RefusedReason, (n: number) => string>> = {
  'not-a-number': (n) => `${entities(n)} left out: a number in it is none. Export the drawing again.`,
  'missing-number': (n) => `${entities(n)} left out: a coordinate or size is missing. Export the drawing again.`,
  'not-a-pair': (n) => `${entities(n)} left out: a line in it is no group code. Export the drawing again.`,
  'three-dimensional': (n) => `${entities(n)} left out: solids, faces and meshes. Export the outline as 2D polylines.`,
  'not-flat': (n) => `${entities(n)} left out: not all at one height. Flatten the drawing and export it as 2D.`,
  tilted: (n) => `${entities(n)} left out: drawn in a plane that is not the XY plane. Export the drawing as 2D.`,
  'unknown-entity': (n) =>
    `${entities(n)} left out: of a type that is not read. Explode it, or export it as polylines.`,
  'stray-part': (n) => `${entities(n)} left out: part of a polyline or block without its beginning.`,
  'bad-size': (n) => `${entities(n)} left out: a radius, ratio, scale or count is not above 0.`,
  'out-of-range': (n) => `${entities(n)} left out: further from the origin than can be reckoned with.`,
  'cut-off': (n) => `${entities(n)} left out: the file ends within it.`,
  'spline-data': (n) =>
    `${entities(n)} left out: knots, weights or degree of a spline do not fit its points, or these are too many. Export it as a polyline.`,
  'curve-lost': (n) => `${entities(n)} left out: a curve that arcs cannot follow. Export it as a polyline.`,
  'block-missing': (n) =>
    `${entities(n)} left out: the block it puts there is not in the file. Bind or explode blocks.`,
  'block-external': (n) => `${entities(n)} left out: its block is drawn in another file. Bind it, then export again.`,
  'block-cycle': (n) => `${entities(n)} left out: its block holds itself.`,
  'block-bomb': (n) => `${entities(n)} left out: its block would unfold into more than is read of one drawing.`,
  'block-too-deep': (n) => `${entities(n)} left out: too many blocks within blocks. Explode them.`,
};

export const fateOf = (reason: Reason | null): EntityFate =>
  reason === null ? 'kept' : reason in REFUSED ? 'refused' : 'aside';

/** What a person is told of refused entities; null for those aside, which the census shows. */
export const tellRefused = (reason: Reason): ((n: number) => string) | null =>
  reason in REFUSED ? REFUSED[reason as RefusedReason] : null;

/** Types that hold no lines to cut along, and why they are set aside (DXF Reference, ENTITIES section). */
export const ASIDE_TYPES: Readonly<Record<string, AsideReason>> = {
  TEXT: 'text',
  MTEXT: 'text',
  RTEXT: 'text',
  ATTDEF: 'text',
  ARCALIGNEDTEXT: 'text',
  DIMENSION: 'dimension',
  ARC_DIMENSION: 'dimension',
  LARGE_RADIAL_DIMENSION: 'dimension',
  LEADER: 'dimension',
  MLEADER: 'dimension',
  MULTILEADER: 'dimension',
  TOLERANCE: 'dimension',
  ACAD_TABLE: 'text',
  HATCH: 'hatch',
  MPOLYGON: 'hatch',
  SOLID: 'hatch',
  TRACE: 'hatch',
  POINT: 'point',
  IMAGE: 'picture',
  WIPEOUT: 'picture',
  OLEFRAME: 'picture',
  OLE2FRAME: 'picture',
  PDFUNDERLAY: 'picture',
  DWFUNDERLAY: 'picture',
  DGNUNDERLAY: 'picture',
  RAY: 'construction-line',
  XLINE: 'construction-line',
  VIEWPORT: 'viewport',
  LIGHT: 'picture',
  SUN: 'picture',
  CAMERA: 'picture',
};

/** Types that are no drawing in the plane. */
export const SOLID_TYPES: ReadonlySet<string> = new Set([
  '3DFACE',
  '3DSOLID',
  'BODY',
  'MESH',
  'REGION',
  'SURFACE',
  'PLANESURFACE',
  'EXTRUDEDSURFACE',
  'LOFTEDSURFACE',
  'REVOLVEDSURFACE',
  'SWEPTSURFACE',
  'NURBSURFACE',
  'HELIX',
]);
