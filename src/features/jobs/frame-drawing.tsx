import { useMemo } from 'react';
import { contourExtents } from '#shared/kernel/contour/contour-extents.ts';
import { svgPath } from '#shared/kernel/contour/svg-path.ts';
import type { Particulars } from '#shared/kernel/particulars/particulars.ts';
import { workFrame } from '#shared/kernel/work-frame.ts';

/** Room around the frame, as a share of its longer side, for the width of the line. */
const MARGIN = 0.02;

/** The front of a frame, small: perimeter and openings, to no stated scale. Size and count stand beside it in words. */
export function FrameDrawing({ particulars }: { readonly particulars: Particulars }) {
  const { perimeter, openings } = useMemo(() => workFrame(particulars).contours, [particulars]);
  if (perimeter.vertices.length === 0) return null;
  const { minX, minY, maxX, maxY } = contourExtents(perimeter);
  const margin = MARGIN * Math.max(maxX - minX, maxY - minY);
  const box = [minX - margin, -maxY - margin, maxX - minX + 2 * margin, maxY - minY + 2 * margin];
  return (
    <svg viewBox={box.join(' ')} aria-hidden="true" className="h-full w-full">
      <g transform="scale(1,-1)" strokeWidth="1" vectorEffect="non-scaling-stroke">
        <path d={svgPath(perimeter)} className="fill-board-light stroke-ink" vectorEffect="non-scaling-stroke" />
        {openings.map((opening) => (
          <path
            key={opening.id}
            d={svgPath(opening.contour)}
            className="fill-paper stroke-front"
            vectorEffect="non-scaling-stroke"
          />
        ))}
      </g>
    </svg>
  );
}
