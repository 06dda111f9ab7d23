import type { Face } from '#shared/kernel/line-sets/line-set.ts';
import { useDesk, useEditor } from '../model/desk.ts';
import { useStore } from '../model/store.ts';
import { toPage } from '../model/view.ts';

const ARM_PX = 7;

/** The picked places, the line between them, and where the next pick would be; only while measuring. */
export function MeasureMarks({ face }: { readonly face: Face }) {
  const desk = useDesk();
  const measuring = useStore(desk.measuring, (value) => value);
  const view = useStore(desk.shown, (value) => value);
  const page = useStore(desk.page, (value) => value);
  const placement = useEditor((s) => s.drawn[face].placement);
  if (measuring === null) return null;
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
