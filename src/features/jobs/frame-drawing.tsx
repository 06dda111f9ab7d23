import { useMemo } from 'react';
import { contourExtents } from '#shared/kernel/contour/contour-extents.ts';
import { svgPath } from '#shared/kernel/contour/svg-path.ts';
import type { Particulars } from '#shared/kernel/particulars/particulars.ts';
import { workFrame } from '#shared/kernel/work-frame.ts';
import { ContoursDrawing } from '../../ui/contours-drawing.tsx';

/** The front of a frame, small, from its particulars. */
export function FrameDrawing({ particulars }: { readonly particulars: Particulars }) {
  const { perimeter, openings } = useMemo(() => workFrame(particulars).contours, [particulars]);
  if (perimeter.vertices.length === 0) return null;
  return (
    <ContoursDrawing
      perimeter={svgPath(perimeter)}
      openings={openings.map(({ contour }) => svgPath(contour))}
      extents={contourExtents(perimeter)}
    />
  );
}
