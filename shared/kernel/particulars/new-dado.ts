import { contourExtents } from '../contour/contour-extents.ts';
import type { Dado, Outline, Particulars } from './particulars.ts';

/** Width and height that the new dado must span. */
function sizeOf(outline: Outline): { width: number; height: number } {
  if (outline.kind === 'members') return { width: outline.width, height: outline.height };
  const vertices = outline.perimeter.map(([x, y, bulge = 0]) => ({ x, y, bulge }));
  const e = contourExtents({ closed: true, vertices });
  return { width: e.maxX - e.minX, height: e.maxY - e.minY };
}

const named = (particulars: Particulars, part: string): Dado | undefined =>
  particulars.dados.find((d) => d.part.toLowerCase() === part.toLowerCase());

/** A name that no dado carries yet: "Partition", "Partition 2" … */
function freeName(particulars: Particulars, part: string): string {
  let name = part;
  for (let n = 2; named(particulars, name); n += 1) name = `${part} ${n}`;
  return name;
}

const isEnd = (d: Dado): boolean => d.runs === 'vertical' && /\bend\b/i.test(d.part);

/**
 * A dado to begin from: the box part that is still missing, in the order left end, right end, bottom, top,
 * then partitions in the middle. Panel, clearance and depth are those of the last dado; without one, a 3/4 in
 * (19 mm) panel, 0.010 in (0.25 mm) clearance and a third of the thickness (common practice, no source).
 * Ends run out past the frame; bottom and top end inside the dados of the two ends, when those are there.
 */
export function newDado(particulars: Particulars): Dado {
  const inch = particulars.unit === 'in';
  const { width, height } = sizeOf(particulars.outline);
  const last = particulars.dados.at(-1);
  const panel = last?.panel ?? (inch ? 0.75 : 19);
  const clearance = last?.clearance ?? (inch ? 0.01 : 0.25);
  const depth = last?.depth ?? (inch ? 0.25 : 6);
  const setback = inch ? 0.25 : 6;
  const common = { panel, clearance, depth };
  const foot = particulars.outline.kind === 'members' ? particulars.outline.feet : 0;
  const rightAt = width - setback - panel;

  const upright = (part: string, at: number): Dado => ({
    part,
    runs: 'vertical',
    at,
    ...common,
    from: 0,
    to: height,
    ends: ['open', 'open'],
  });
  if (!named(particulars, 'Left end')) return upright('Left end', setback);
  if (!named(particulars, 'Right end')) return upright('Right end', rightAt);

  const ends = particulars.dados.filter(isEnd).toSorted((a, b) => a.at - b.at);
  const from = ends[0] ? ends[0].at + ends[0].panel : setback;
  const to = ends.length > 1 ? ends[ends.length - 1]!.at : width - setback;
  const level = (part: string, at: number): Dado => ({
    part,
    runs: 'horizontal',
    at,
    ...common,
    from,
    to,
    ends: ['meets', 'meets'],
  });
  if (!named(particulars, 'Bottom')) return level('Bottom', foot + (inch ? 0.5 : 12));
  if (!named(particulars, 'Top')) return level('Top', height - setback - panel);

  const bottom = named(particulars, 'Bottom')!;
  const top = named(particulars, 'Top')!;
  return {
    part: freeName(particulars, 'Partition'),
    runs: 'vertical',
    at: width / 2 - panel / 2,
    ...common,
    from: bottom.at + bottom.panel,
    to: top.at,
    ends: ['meets', 'meets'],
  };
}
