import { memo } from 'react';
import { svgPath } from '#shared/kernel/contour/svg-path.ts';
import type { WorkedFrame } from '#shared/kernel/worked-frame.ts';
import { useDesk } from '../model/desk.ts';
import { findSelected } from '../model/selection.ts';
import { useStore } from '../model/store.ts';
import { extentsPath } from '../spread/shape-path.ts';

/** Outline of what is selected, drawn alike on both faces. `transform` from frame view to the page. */
export const SelectionOutline = memo(function SelectionOutline({
  worked,
  transform,
}: {
  readonly worked: WorkedFrame;
  readonly transform: string;
}) {
  const { selection: store, editor } = useDesk();
  const selection = useStore(store, (value) => value);
  const selected = selection && findSelected(worked.contours, editor.store.get().history.present, selection);
  if (!selected) return null;
  const { feature } = selected;
  const d = 'contour' in feature ? svgPath(feature.contour) : extentsPath(feature.extents);
  return (
    <g transform={transform} data-selected={feature.id} className="pointer-events-none fill-none">
      {/* Paper beneath the ink, so that it stands out from lines of any colour. */}
      <path d={d} vectorEffect="non-scaling-stroke" className="stroke-paper [stroke-width:8]" />
      <path d={d} vectorEffect="non-scaling-stroke" className="stroke-ink [stroke-width:4]" />
    </g>
  );
});
