import { contourExtents } from '../contour/contour-extents.ts';
import type { Dado, Outline, Particulars } from '../particulars/particulars.ts';
import { SAME } from '../tolerances.ts';
import { formatWithUnit } from '../units/format-length.ts';
import type { BoxPart } from './box-part.ts';
import type { Sides } from './box.ts';
import { tidyLength } from './tidy-length.ts';

/** What a frame does not say of its box; each may be left out. Lengths in the frame's unit. */
export interface GivenOfBox {
  /** Front to back of the box without the frame. */
  readonly depth?: number;
  /** Front-to-back size, without growth, of parts that are not as deep as the box, by name: a stretcher, say. */
  readonly widths?: Readonly<Record<string, number>>;
  /** How far the frame stands out past the box where dados run out through its edge; 0 where left out. */
  readonly overhang?: Partial<Sides>;
  /** How deep a part that meets another is let into it. */
  readonly letIn?: number;
}

function sizeOf(outline: Outline): { width: number; height: number } {
  if (outline.kind === 'members') return { width: outline.width, height: outline.height };
  const vertices = outline.perimeter.map(([x, y, bulge = 0]) => ({ x, y, bulge }));
  const e = contourExtents({ closed: true, vertices });
  return { width: e.maxX - e.minX, height: e.maxY - e.minY };
}

function partOf(dado: Dado, p: Particulars, given: GivenOfBox): BoxPart {
  const size = sizeOf(p.outline);
  const upright = dado.runs === 'vertical';
  const edge = upright ? size.height : size.width;
  const [lowSide, highSide] = upright ? (['bottom', 'top'] as const) : (['left', 'right'] as const);
  const lowOut = dado.ends[0] === 'open' && dado.from <= SAME;
  const highOut = dado.ends[1] === 'open' && dado.to >= edge - SAME;
  const letIn = given.letIn ?? 0;
  const from = lowOut ? (given.overhang?.[lowSide] ?? 0) : dado.from - (dado.ends[0] === 'meets' ? letIn : 0);
  const to = highOut ? edge - (given.overhang?.[highSide] ?? 0) : dado.to + (dado.ends[1] === 'meets' ? letIn : 0);
  const own = given.widths && Object.hasOwn(given.widths, dado.part) ? given.widths[dado.part] : undefined;
  const width = own ?? given.depth;
  return {
    part: dado.part,
    count: 1,
    thickness: dado.panel,
    width: width === undefined ? undefined : tidyLength(width + dado.depth),
    length: tidyLength(to - from),
    growth: dado.depth,
    grows: 'front edge',
    remark: `add ${formatWithUnit(dado.depth, p.unit)} to the front-to-back size`,
    runsOut: [...(lowOut ? [lowSide] : []), ...(highOut ? [highSide] : [])],
  };
}

/**
 * The cut list of the box parts that plug into a frame, from its dados and outline: thickness, length, and the
 * front-to-back size with its growth. Parts of one name and size are told together, in the order of the dados; none
 * without dados. Parts that do not touch the frame (backs, nailers, drawer boxes) are not in it.
 */
export function listBoxParts(p: Particulars, given: GivenOfBox = {}): BoxPart[] {
  const rows = new Map<string, BoxPart>();
  for (const dado of p.dados) {
    const part = partOf(dado, p, given);
    const key = JSON.stringify(part);
    const known = rows.get(key);
    rows.set(key, known ? { ...known, count: known.count + 1 } : part);
  }
  return [...rows.values()];
}
