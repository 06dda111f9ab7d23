import type { Contour } from '#shared/kernel/contour/contour.ts';
import { svgPath } from '#shared/kernel/contour/svg-path.ts';
import type { Face, LineSet, SetName, Shape } from '#shared/kernel/line-sets/line-set.ts';
import { lineSetKey } from '#shared/kernel/line-sets/line-set.ts';
import { placeContour } from '#shared/kernel/placing/place.ts';
import type { WorkedFrame } from '#shared/kernel/worked-frame.ts';
import { classNames } from '../../ui/class-names.ts';

/** Room around the board, as a share of its longer side, for lines that run past it. */
const MARGIN = 0.03;

const COLOURS: Record<SetName, string> = {
  DADO: 'fill-back/40 stroke-back',
  SQUARING: 'fill-none stroke-back',
  BLANK: 'fill-none stroke-pencil',
  BEAD_INNER: 'fill-none stroke-bead',
  BEAD_OUTER: 'fill-none stroke-bead',
  QUIRK: 'fill-none stroke-bead',
  QUIRK_CORNER: 'fill-none stroke-lift',
  OPENING: 'fill-none stroke-front',
  OPENING_AXIS: 'fill-none stroke-front',
  CORNER_LIFT: 'fill-none stroke-lift',
  CORNER_VEE: 'fill-none stroke-lift',
  PERIMETER: 'fill-none stroke-ink',
};

const shapePath = (shape: Shape): string =>
  shape.kind === 'contour'
    ? svgPath(shape.contour)
    : shape.points.map(({ x, y }, i) => `${i === 0 ? 'M' : 'L'}${x} ${y}`).join('');

const Lines = ({ lineSet }: { readonly lineSet: LineSet }) => (
  <path
    d={lineSet.shapes.map(shapePath).join('')}
    fillRule="evenodd"
    vectorEffect="non-scaling-stroke"
    className={COLOURS[lineSet.set]}
  />
);

interface BoxSpreadProps {
  readonly worked: WorkedFrame;
  /** For a frame that no longer fits what is entered. */
  readonly faint?: boolean;
}

function FacePicture({ worked, faint = false, face }: BoxSpreadProps & { readonly face: Face }) {
  const { board, placement, lineSets } = worked[face];
  const { contours } = worked;
  const placed = (contour: Contour): string => svgPath(placeContour(placement, contour));
  const openings = contours.openings.map((opening) => placed(opening.contour)).join('');
  const frame = placed(contours.perimeter) + openings;
  const outer = `M${board.minX} ${board.minY}H${board.maxX}V${board.maxY}H${board.minX}Z`;
  // The board is squared between the faces: both pictures are as large as the larger one, so that they share a scale.
  const boards = [worked.back.board, worked.front.board];
  const across = Math.max(...boards.map(({ minX, maxX }) => maxX - minX));
  const up = Math.max(...boards.map(({ minY, maxY }) => maxY - minY));
  const [width, height] = [across, up].map((size) => size + 2 * MARGIN * Math.max(across, up)) as [number, number];
  const viewBox = [(board.minX + board.maxX - width) / 2, -(board.minY + board.maxY + height) / 2, width, height];
  const back = face === 'back';
  return (
    <figure className="min-w-0">
      <figcaption className={classNames('mb-1 font-bold', back ? 'text-back' : 'text-front')}>
        {back ? 'Back, cut first' : 'Front, cut second'}
      </figcaption>
      <svg
        role="img"
        aria-label={back ? 'Back face' : 'Front face'}
        viewBox={viewBox.join(' ')}
        className={classNames('h-64 w-full', faint && 'opacity-50')}
      >
        <g transform="scale(1,-1)">
          <path d={back ? outer : outer + openings} fillRule="evenodd" className="fill-board" />
          <path
            d={frame}
            fillRule="evenodd"
            vectorEffect="non-scaling-stroke"
            className={back ? 'fill-none stroke-pencil [stroke-dasharray:5_4]' : 'fill-board-light'}
          />
          {lineSets.map((lineSet) => (
            <Lines key={lineSetKey(lineSet)} lineSet={lineSet} />
          ))}
        </g>
      </svg>
    </figure>
  );
}

/** Both faces, small, about the fold; the board turns side to side, as in every new frame. */
export function BoxSpread(props: BoxSpreadProps) {
  return (
    <div className="grid gap-4 sm:grid-cols-2">
      <FacePicture {...props} face="back" />
      <div className="min-w-0 border-rule max-sm:border-t max-sm:pt-4 sm:border-l sm:border-dashed sm:pl-4">
        <FacePicture {...props} face="front" />
      </div>
    </div>
  );
}
