import type { Box } from '../box/box.ts';
import { frameFromBox } from '../box/frame-from-box.ts';
import { newBox } from '../box/new-box.ts';
import { withChildren } from '../particulars/layout-parts.ts';
import type { LayoutPart, MembersOutline, Particulars } from '../particulars/particulars.ts';
import type { Unit } from '../units/unit.ts';
import { applyEdgePreset } from './apply-edge-preset.ts';
import type { EdgePreset } from './edge-preset.ts';

export interface StarterFrame {
  readonly name: string;
  /** What differs from the box to begin from. */
  readonly box: Partial<Box>;
  /** What each opening between the uprights is divided into, left to right; labels follow from their order. */
  readonly fill: readonly LayoutPart[];
}

/** The frame of a starter: the box laid out, its openings divided. Throws when that box cannot be, which only a wrong number in a starter brings about. */
export function frameOf(unit: Unit, { name, box, fill }: StarterFrame, edge?: EdgePreset): Particulars {
  const made = frameFromBox({ ...newBox(unit, name), ...box });
  if (!made.ok)
    throw new Error(
      `starter ${name}: ${made.problems.map((p) => `${p.field} got ${p.got}, takes ${p.takes}`).join('; ')}`,
    );
  const outline = made.particulars.outline as MembersOutline;
  const layout = fillLayout(outline.layout, fill);
  const particulars = { ...made.particulars, outline: { ...outline, layout } };
  return edge ? applyEdgePreset(particulars, edge) : particulars;
}

/** Each part takes over the place and size of the opening that it divides. */
function fillLayout(layout: LayoutPart, fill: readonly LayoutPart[]): LayoutPart {
  const columns = 'columns' in layout ? layout.columns : [layout];
  if (columns.length !== fill.length)
    throw new Error(`starter: got ${fill.length} parts for ${columns.length} openings`);
  const filled = fill.map((part, i): LayoutPart => {
    const { size } = columns[i]!;
    return size === undefined ? part : { ...part, size };
  });
  return 'columns' in layout ? withChildren(layout, filled) : filled[0]!;
}

const opening = (label: string, size?: number): LayoutPart =>
  size === undefined ? { opening: { label } } : { opening: { label }, size };

/** Openings one above another, top to bottom, labelled in order; those with a size keep it. */
export const stack = (between: number, openings: readonly (readonly [label: string, size?: number])[]): LayoutPart => ({
  rows: openings.map(([label, size]) => opening(label, size)),
  between,
});
