import type { Extents } from '#shared/kernel/contour/contour.ts';
import { svgPath } from '#shared/kernel/contour/svg-path.ts';
import type { FeatureId } from '#shared/kernel/frame/members.ts';
import type { WorkedFrame } from '#shared/kernel/worked-frame.ts';
import { useDesk } from '../model/desk.ts';
import { useStore } from '../model/store.ts';
import { extentsPath } from './shape-path.ts';

/** Where a feature lies, as SVG path data in frame view; '' for one that is not there. */
function pathOf({ contours, dados }: WorkedFrame, id: FeatureId): string {
  if (id === 'perimeter') return svgPath(contours.perimeter);
  const opening = contours.openings.find((o) => o.id === id);
  if (opening) return svgPath(opening.contour);
  const at: Extents | undefined =
    dados.find((d) => d.id === id)?.extents ?? contours.members.find((m) => m.id === id)?.extents;
  return at ? extentsPath(at) : '';
}

/** Grows a place by half the reach each way, so that the frame drawn about it does not hide it. */
const grown = (e: Extents, by: number): Extents => ({
  minX: e.minX - by,
  minY: e.minY - by,
  maxX: e.maxX + by,
  maxY: e.maxY + by,
});

/** What is lit up, in frame view: drawn alike on both faces. `scale` in pixels a unit, `transform` from frame view to the page. */
export function LitPlaces({
  worked,
  scale,
  transform,
}: {
  readonly worked: WorkedFrame;
  readonly scale: number;
  readonly transform: string;
}) {
  const { lit } = useDesk();
  const { features, places } = useStore(lit, (value) => value);
  if (features.length === 0 && places.length === 0) return null;
  return (
    <g transform={transform}>
      {features.map((id) => (
        <path
          key={id}
          data-lit={id}
          d={pathOf(worked, id)}
          vectorEffect="non-scaling-stroke"
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
          d={extentsPath(grown(place, 8 / scale))}
          vectorEffect="non-scaling-stroke"
          className="fill-none stroke-stop [stroke-dasharray:6_3] [stroke-width:2.5]"
        />
      ))}
    </g>
  );
}
