import type { Extents } from '#shared/kernel/contour/contour.ts';
import type { FeatureId } from '#shared/kernel/frame/members.ts';
import type { DrawnFrame } from '#shared/kernel/worked-frame.ts';
import type { Face } from '#shared/kernel/line-sets/line-set.ts';
import { useDesk, useEditor, type Lit } from '../model/desk.ts';
import { useStore } from '../model/store.ts';
import { frameMap, type PageMap } from '../model/view.ts';
import { contourPath, extentsPath } from './shape-path.ts';

/** Where a feature lies, as SVG path data in the page's pixels; '' for one that is not there. */
function pathOf({ contours, dados }: DrawnFrame, id: FeatureId, map: PageMap): string {
  if (id === 'perimeter') return contourPath(contours.perimeter, map);
  const opening = contours.openings.find((o) => o.id === id);
  if (opening) return contourPath(opening.contour, map);
  const at: Extents | undefined =
    dados.find((d) => d.id === id)?.extents ?? contours.members.find((m) => m.id === id)?.extents;
  return at ? extentsPath(at, map) : '';
}

/** Grows a place by half the reach each way, so that the frame drawn about it does not hide it. */
const grown = (e: Extents, by: number): Extents => ({
  minX: e.minX - by,
  minY: e.minY - by,
  maxX: e.maxX + by,
  maxY: e.maxY + by,
});

function Places({ face, features, places }: Lit & { readonly face: Face }) {
  const desk = useDesk();
  const worked = useEditor((s) => s.drawn);
  const view = useStore(desk.shown, (value) => value);
  const page = useStore(desk.page, (value) => value);
  const map = frameMap(view, worked[face].placement, page);
  return (
    <g>
      {features.map((id) => (
        <path
          key={id}
          data-lit={id}
          d={pathOf(worked, id, map)}
          className={
            id.startsWith('dado-')
              ? 'fill-back/55 stroke-ink [stroke-width:2]'
              : 'fill-front/20 stroke-front [stroke-width:2]'
          }
        />
      ))}
      {places.map((place, i) => (
        <path
          key={i}
          data-lit="place"
          d={extentsPath(grown(place, 8 / view.scale), map)}
          className="fill-none stroke-stop [stroke-dasharray:6_3] [stroke-width:2.5]"
        />
      ))}
    </g>
  );
}

/** What is lit up: drawn alike on both faces. Follows the frame only while something is. */
export function LitPlaces({ face }: { readonly face: Face }) {
  const lit = useStore(useDesk().lit, (value) => value);
  return lit.features.length === 0 && lit.places.length === 0 ? null : <Places face={face} {...lit} />;
}
