import type { Box } from './box.ts';
import type { GivenOfBox } from './list-box-parts.ts';

/** What the cut list needs to know of a box beside its frame. */
export const givenOfBox = ({ depth, overhang, letIn, top }: Box): GivenOfBox => ({
  depth,
  overhang,
  letIn,
  ...(top?.kind === 'stretcher' ? { widths: { Stretcher: top.width } } : {}),
});
