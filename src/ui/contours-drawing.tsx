import type { Extents } from '#shared/kernel/contour/contour.ts';

/** Room around the frame, as a share of its longer side, for the width of the line. */
const MARGIN = 0.02;

interface ContoursDrawingProps {
  /** Path data of the frame's outer contour, Y up. */
  readonly perimeter: string;
  /** Path data of each opening. */
  readonly openings: readonly string[];
  /** Of the perimeter. */
  readonly extents: Extents;
}

/** The front of a frame, small: perimeter and openings, to no stated scale. Size and count stand beside it in words. */
export function ContoursDrawing({ perimeter, openings, extents }: ContoursDrawingProps) {
  const { minX, minY, maxX, maxY } = extents;
  const margin = MARGIN * Math.max(maxX - minX, maxY - minY);
  const box = [minX - margin, -maxY - margin, maxX - minX + 2 * margin, maxY - minY + 2 * margin];
  return (
    <svg viewBox={box.join(' ')} aria-hidden="true" className="h-full w-full">
      <g transform="scale(1,-1)" strokeWidth="1">
        <path d={perimeter} className="fill-board-light stroke-ink" vectorEffect="non-scaling-stroke" />
        {openings.map((path) => (
          <path key={path} d={path} className="fill-paper stroke-front" vectorEffect="non-scaling-stroke" />
        ))}
      </g>
    </svg>
  );
}
