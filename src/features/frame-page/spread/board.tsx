import { memo } from 'react';
import { svgPath } from '#shared/kernel/contour/svg-path.ts';
import type { Face, LineSet } from '#shared/kernel/line-sets/line-set.ts';
import { lineSetKey } from '#shared/kernel/line-sets/line-set.ts';
import { placeExtents, unplace } from '#shared/kernel/placing/place.ts';
import type { WorkedFrame } from '#shared/kernel/worked-frame.ts';
import { SET_LOOK } from './set-look.ts';
import { extentsPath, lineSetPath } from './shape-path.ts';

/** The board as it lies under this face, in frame view. On the front the openings show the sheet beneath. */
export const Board = memo(function Board({ worked, face }: { readonly worked: WorkedFrame; readonly face: Face }) {
  const { contours } = worked;
  const { board, placement } = worked[face];
  const outer = extentsPath(placeExtents(unplace(placement), board));
  const perimeter = svgPath(contours.perimeter);
  const openings = contours.openings.map((o) => svgPath(o.contour)).join('');
  if (face === 'back') {
    return (
      <>
        <path d={outer} className="fill-board" />
        <path
          d={perimeter + openings}
          vectorEffect="non-scaling-stroke"
          className="fill-none stroke-pencil [stroke-width:1] [stroke-dasharray:5_4]"
        />
      </>
    );
  }
  return (
    <>
      <path d={outer + openings} fillRule="evenodd" className="fill-board" />
      <path d={perimeter + openings} fillRule="evenodd" className="fill-board-light" />
    </>
  );
});

const Lines = memo(function Lines({ lineSet }: { readonly lineSet: LineSet }) {
  return (
    <path
      d={lineSetPath(lineSet)}
      fillRule="evenodd"
      vectorEffect="non-scaling-stroke"
      className={SET_LOOK[lineSet.set]}
    />
  );
});

/** The line sets of a face that are switched on, in setup coordinates. */
export const LineSets = memo(function LineSets({
  lineSets,
  hidden,
}: {
  readonly lineSets: readonly LineSet[];
  readonly hidden: ReadonlySet<string>;
}) {
  return lineSets.map((lineSet) => {
    const key = lineSetKey(lineSet);
    return hidden.has(key) ? null : <Lines key={key} lineSet={lineSet} />;
  });
});
