import type { Contour } from '../contour/contour.ts';
import { passDepths } from '../cutters/pass-depths.ts';
import type { Particulars } from '../particulars/particulars.ts';
import type { LineSet } from './line-set.ts';

/** Depth of cuts through board and into the spoilboard. */
const through = (p: Particulars) => p.thickness + p.setup.spoilboard;

/** The frame's outer contour, cutter outside, through, last; frame view. */
export function perimeterLineSet(p: Particulars, perimeter: Contour): LineSet {
  return {
    face: 'front',
    set: 'PERIMETER',
    variant: '',
    cutter: 'perimeter',
    side: 'outside',
    depth: through(p),
    passes: passDepths(through(p), p.cutters.perimeter.maxPass),
    shapes: [{ kind: 'contour', contour: perimeter, of: ['perimeter'] }],
  };
}

/** The squaring line, given in the back setup. */
export function squaringLineSet(p: Particulars, line: Contour): LineSet {
  return {
    face: 'back',
    set: 'SQUARING',
    variant: '',
    cutter: 'squaring',
    side: 'waste',
    depth: through(p),
    passes: passDepths(through(p), p.cutters.squaring.maxPass),
    shapes: [{ kind: 'contour', contour: line, of: ['squaring'] }],
  };
}
