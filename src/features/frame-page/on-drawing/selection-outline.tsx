import type { Face } from '#shared/kernel/line-sets/line-set.ts';
import { useDesk, useEditor } from '../model/desk.ts';
import { findSelected, type Selection } from '../model/selection.ts';
import { useStore } from '../model/store.ts';
import { frameMap } from '../model/view.ts';
import { contourPath, extentsPath } from '../spread/shape-path.ts';

function Outline({ face, selection }: { readonly face: Face; readonly selection: Selection }) {
  const desk = useDesk();
  const worked = useEditor((s) => s.drawn);
  const present = useEditor((s) => s.history.present);
  const view = useStore(desk.shown, (value) => value);
  const page = useStore(desk.page, (value) => value);
  const selected = findSelected(worked.contours, present, selection);
  if (!selected) return null;
  const { feature } = selected;
  const map = frameMap(view, worked[face].placement, page);
  const d = 'contour' in feature ? contourPath(feature.contour, map) : extentsPath(feature.extents, map);
  return (
    <g data-selected={feature.id} className="pointer-events-none fill-none">
      {/* Paper beneath the ink, so that it stands out from lines of any colour. */}
      <path d={d} className="stroke-paper [stroke-width:8]" />
      <path d={d} className="stroke-ink [stroke-width:4]" />
    </g>
  );
}

/** Outline of what is selected, drawn alike on both faces. Follows the frame only while something is. */
export function SelectionOutline({ face }: { readonly face: Face }) {
  const selection = useStore(useDesk().selection, (value) => value);
  return selection && <Outline face={face} selection={selection} />;
}
