import type { Point } from '#shared/kernel/contour/contour.ts';
import type { FeatureId, FrameContours, LayoutPath, Member, Opening } from '#shared/kernel/frame/members.ts';
import type { Face } from '#shared/kernel/line-sets/line-set.ts';
import { childrenOf, partField } from '#shared/kernel/particulars/layout-parts.ts';
import type { LayoutPart, Particulars } from '#shared/kernel/particulars/particulars.ts';

/** An opening or member picked on the drawing. */
export interface Selection {
  readonly id: FeatureId;
  /** Openings of a layout are known by their place in it: their ids count on when one is added before them. */
  readonly path: LayoutPath | null;
  /** The page it was picked on: arrow keys go as that page shows the frame. */
  readonly face: Face;
  /** Where in it one stands, frame view, so that going on in one direction keeps to one line. */
  readonly at: Point;
  /** Whether its panel is open. */
  readonly open: boolean;
  /** What the last change asked for could not take; ''. */
  readonly problem: string;
}

/** What is selected, as it is drawn now. */
export interface Selected {
  readonly kind: 'opening' | 'member';
  readonly feature: Opening | Member;
  /** Path of an opening's part in the particulars, or of a member's width; '' when the outline is traced, or the frame as entered has no such part. */
  readonly field: string;
}

const OUTER: Readonly<Record<FeatureId, string>> = {
  'stile-left': 'outline.stiles.left',
  'stile-right': 'outline.stiles.right',
  'rail-top': 'outline.rails.top',
  'rail-bottom': 'outline.rails.bottom',
};

const isPrefix = (a: LayoutPath, of: LayoutPath): boolean =>
  a.length <= of.length && a.every((step, i) => step === of[i]);

/** The part at `path`; undefined where the path leads nowhere. */
function partThere(layout: LayoutPart, path: LayoutPath): LayoutPart | undefined {
  let part: LayoutPart | undefined = layout;
  for (const step of path) part = part && childrenOf(part)[step];
  return part;
}

/** The opening at `path`, else the one it has become part of, else the first one that came out of it. */
export const openingAt = ({ openings }: FrameContours, path: LayoutPath): Opening | undefined =>
  openings.find((o) => o.path && isPrefix(o.path, path)) ?? openings.find((o) => o.path && isPrefix(path, o.path));

function fieldOf({ outline }: Particulars, kind: Selected['kind'], { id, path }: Opening | Member): string {
  if (outline.kind !== 'members') return '';
  if (path === undefined) return OUTER[id] ?? '';
  const part = partThere(outline.layout, path);
  if (part === undefined || 'opening' in part !== (kind === 'opening')) return '';
  return kind === 'opening' ? partField(outline.layout, path) : `${partField(outline.layout, path)}.between`;
}

/** What a selection means in the frame as drawn and as entered; null when it is gone. */
export function findSelected(contours: FrameContours, present: Particulars, { id, path }: Selection): Selected | null {
  const opening =
    path === null ? contours.openings.find((o) => o.id === id && o.path === undefined) : openingAt(contours, path);
  if (opening) return { kind: 'opening', feature: opening, field: fieldOf(present, 'opening', opening) };
  const member = contours.members.find((m) => m.id === id);
  return member ? { kind: 'member', feature: member, field: fieldOf(present, 'member', member) } : null;
}
