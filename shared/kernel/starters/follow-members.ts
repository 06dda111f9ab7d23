import type { FrameContours, Member } from '../frame/members.ts';
import type { Dado } from '../particulars/particulars.ts';
import { SAME, WELD } from '../tolerances.ts';
import { tidyLength } from '../box/tidy-length.ts';
import type { MovedDado, StayedDado } from './member-change.ts';

export interface FollowedDados {
  readonly dados: readonly Dado[];
  readonly moved: readonly MovedDado[];
  readonly stayed: readonly StayedDado[];
}

/** How far something moves; 'unsure' when it could follow in more than one way. */
type Shift = number | 'unsure';

interface Range {
  readonly low: number;
  readonly high: number;
}

const across = ({ kind, extents: e }: Member): Range =>
  kind === 'stile' || kind === 'mid-stile' ? { low: e.minX, high: e.maxX } : { low: e.minY, high: e.maxY };
const along = ({ kind, extents: e }: Member): Range =>
  kind === 'stile' || kind === 'mid-stile' ? { low: e.minY, high: e.maxY } : { low: e.minX, high: e.maxX };
const panelOf = (dado: Dado): Range => ({ low: dado.at, high: dado.at + dado.panel });
const same = (a: number, b: number): boolean => Math.abs(a - b) <= WELD;
const overlaps = (a: Range, b: Range): boolean => a.low < b.high - WELD && b.low < a.high - WELD;
const agree = (shifts: readonly Shift[]): Shift =>
  shifts.reduce((a, b) => (a === 'unsure' || b === 'unsure' || Math.abs(a - b) > SAME ? 'unsure' : a), shifts[0] ?? 0);

/** Whether a panel stands behind a member; an outer member's outer side is open, for parts that stand out past the frame. */
function standsBehind(panel: Range, { id }: Member, range: Range): boolean {
  const low = id === 'stile-left' || id === 'rail-bottom' ? -Infinity : range.low - WELD;
  const high = id === 'stile-right' || id === 'rail-top' ? Infinity : range.high + WELD;
  return panel.low >= low && panel.high <= high;
}

/**
 * How far a panel goes along with its member: with both sides when they move alike; centred ones with the middle,
 * flush ones with the side that they are flush with. Behind an outer member a panel otherwise keeps its place to the
 * frame's edge.
 */
function shiftWith(panel: Range, member: Member, after: Member): Shift {
  const [was, is] = [across(member), across(after)];
  const [low, high] = [is.low - was.low, is.high - was.high];
  if (Math.abs(low - high) <= SAME) return low;
  const outer = member.kind === 'stile' || member.kind === 'rail';
  if (!outer && same(panel.low - was.low, was.high - panel.high)) return (low + high) / 2;
  const flushLow = same(panel.low, was.low) && Math.abs(low) > SAME;
  const flushHigh = same(panel.high, was.high) && Math.abs(high) > SAME;
  if (flushLow !== flushHigh) return flushLow ? low : high;
  return outer ? 0 : 'unsure';
}

function shiftOf(dado: Dado, before: FrameContours, after: FrameContours): Shift {
  const kinds = dado.runs === 'vertical' ? ['stile', 'mid-stile'] : ['rail', 'mid-rail'];
  const panel = panelOf(dado);
  const shifts = before.members.flatMap((member): Shift[] => {
    if (!kinds.includes(member.kind) || !overlaps(along(member), { low: dado.from, high: dado.to })) return [];
    if (!standsBehind(panel, member, across(member))) return [];
    const twin = after.members.find((m) => m.id === member.id);
    return twin ? [shiftWith(panel, member, twin)] : [];
  });
  return agree(shifts);
}

/** How far the end of a dado that meets others goes along with them. */
function shiftOfEnd(dado: Dado, at: number, dados: readonly Dado[], shifts: readonly Shift[]): Shift {
  const panel = panelOf(dado);
  const met = dados.flatMap((other, i): Shift[] => {
    if (other.runs === dado.runs || !overlaps(panel, { low: other.from, high: other.to })) return [];
    const { low, high } = panelOf(other);
    const slack = other.clearance / 2 + WELD;
    return at >= low - slack && at <= high + slack ? [shifts[i]!] : [];
  });
  // One that could not follow stays where it is, and what meets it stays too.
  return agree(met.map((shift) => (shift === 'unsure' ? 0 : shift)));
}

/**
 * Dados that go along when members of a frame change, frame view. `before` and `after` are the same frame's contours
 * with the same members; the frame's own size must not have changed. A dado follows the member that its panel stands
 * behind, and an end that meets another dado follows that one. What could follow in more than one way stays and is listed.
 */
export function followMembers(before: FrameContours, after: FrameContours, dados: readonly Dado[]): FollowedDados {
  const shifts = dados.map((dado) => shiftOf(dado, before, after));
  const moved: MovedDado[] = [];
  const stayed: StayedDado[] = [];
  const followed = dados.map((dado, i): Dado => {
    const id = { dado: `dado-${i}`, part: dado.part };
    const shift = shifts[i]!;
    const ends = ([0, 1] as const).map((end): Shift =>
      dado.ends[end] === 'meets' ? shiftOfEnd(dado, end === 0 ? dado.from : dado.to, dados, shifts) : 0,
    );
    if (shift === 'unsure' || ends.includes('unsure')) stayed.push(id);
    const go = (entry: 'at' | 'from' | 'to', by: Shift): number => {
      const was = dado[entry];
      if (by === 'unsure' || Math.abs(by) <= SAME) return was;
      const is = tidyLength(was + by);
      moved.push({ ...id, entry, was, is });
      return is;
    };
    return { ...dado, at: go('at', shift), from: go('from', ends[0]!), to: go('to', ends[1]!) };
  });
  return { dados: moved.length > 0 ? followed : dados, moved, stayed };
}
