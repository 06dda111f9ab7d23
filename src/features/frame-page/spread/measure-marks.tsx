import type { Placement } from '#shared/kernel/placing/placement.ts';
import type { Measuring } from '../model/desk.ts';
import { toPage, type PageSize, type View } from '../model/view.ts';

const ARM_PX = 7;

/** The picked places, the line between them, and where the next pick would be. */
export function MeasureMarks({
  measuring,
  view,
  placement,
  page,
}: {
  measuring: Measuring;
  view: View;
  placement: Placement;
  page: PageSize;
}) {
  const { picked, at } = measuring;
  const places = picked.length < 2 && at ? [...picked, at] : picked;
  const onPage = places.map((p) => toPage(view, placement, page, p));
  const [a, b] = onPage;
  return (
    <g className="pointer-events-none stroke-ink [stroke-width:1.5]">
      {a && b && <line x1={a.x} y1={a.y} x2={b.x} y2={b.y} />}
      {onPage.map((p, i) => (
        <path key={i} d={`M${p.x - ARM_PX} ${p.y}h${2 * ARM_PX}M${p.x} ${p.y - ARM_PX}v${2 * ARM_PX}`} />
      ))}
    </g>
  );
}
