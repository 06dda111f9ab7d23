import { useEffect, useEffectEvent, useRef, type PointerEvent, type RefObject } from 'react';
import type { Point } from '#shared/kernel/contour/contour.ts';
import type { Face } from '#shared/kernel/line-sets/line-set.ts';
import type { Placement } from '#shared/kernel/placing/placement.ts';
import type { DrawnFrame } from '#shared/kernel/worked-frame.ts';
import { light, useDesk } from '../model/desk.ts';
import { entryOfFeature, goToEntry } from '../model/find-entry.ts';
import { hitTest } from '../model/hit-test.ts';
import { pickPlace } from '../model/measure.ts';
import { nearestPoint, snapPoints } from '../model/snap-points.ts';
import { fromPage, panView, zoomView, type View } from '../model/view.ts';
import { selectionOf } from '../on-drawing/select-feature.ts';

/** Less than this is a click, more is a drag. */
const DRAG_PX = 4;
/** How near a place catches the pointer while measuring, and how near a dado counts as pointed at. */
const SNAP_PX = 10;
const POINT_PX = 3;
/** Zoom for one notch (100 px) of a wheel. */
const WHEEL_ZOOM = 1.2;

/** Pointing, clicking, dragging, pinching and wheeling on one page. What is drawn is asked when something happens. */
export function useBoardPointer(face: Face, svg: RefObject<SVGSVGElement | null>) {
  const desk = useDesk();
  const drawn = (): DrawnFrame => desk.editor.store.get().drawn;
  const placement = (): Placement => drawn()[face].placement;
  const shown = (): View => desk.shown.get();
  /** Pointers that are down, where they last were; more than one pinches. */
  const down = useRef(new Map<number, Point>());
  const dragged = useRef(false);

  const onPage = (event: { clientX: number; clientY: number }): Point => {
    const box = svg.current!.getBoundingClientRect();
    return { x: event.clientX - box.left, y: event.clientY - box.top };
  };
  const inFrame = (px: Point): Point => fromPage(shown(), placement(), desk.page.get(), px);
  const caught = (p: Point): Point => nearestPoint(snapPoints(drawn()), p, SNAP_PX / shown().scale) ?? p;

  const wheel = useEffectEvent((event: WheelEvent) => {
    event.preventDefault();
    const lines = event.deltaMode === WheelEvent.DOM_DELTA_LINE ? 33 : 1;
    desk.view.set(zoomView(shown(), WHEEL_ZOOM ** ((-event.deltaY * lines) / 100), inFrame(onPage(event))));
  });
  useEffect(() => {
    const element = svg.current;
    if (!element) return;
    // React's own wheel handlers cannot stop the page from scrolling.
    const listen = (event: WheelEvent) => wheel(event);
    element.addEventListener('wheel', listen, { passive: false });
    return () => element.removeEventListener('wheel', listen);
  }, [svg]);

  function drag(event: PointerEvent<SVGSVGElement>, before: Point): void {
    const now = onPage(event);
    const others = [...down.current].filter(([id]) => id !== event.pointerId).map(([, p]) => p);
    const [other] = others;
    if (other) {
      const ratio =
        Math.hypot(now.x - other.x, now.y - other.y) / Math.max(1, Math.hypot(before.x - other.x, before.y - other.y));
      desk.view.set(zoomView(shown(), ratio, inFrame({ x: (now.x + other.x) / 2, y: (now.y + other.y) / 2 })));
    } else {
      desk.view.set(panView(shown(), placement(), now.x - before.x, now.y - before.y));
    }
    down.current.set(event.pointerId, now);
  }

  function point(event: PointerEvent<SVGSVGElement>): void {
    const p = inFrame(onPage(event));
    const measuring = desk.measuring.get();
    if (measuring) desk.measuring.set({ ...measuring, face, at: caught(p) });
    light(desk.lit, hitTest(drawn(), p, POINT_PX / shown().scale));
  }

  function click(event: PointerEvent<SVGSVGElement>): void {
    const p = inFrame(onPage(event));
    const measuring = desk.measuring.get();
    if (measuring) return desk.measuring.set(pickPlace({ ...measuring, face }, caught(p)));
    const worked = drawn();
    const hit = hitTest(worked, p, POINT_PX / shown().scale);
    const dado = hit.find((id) => worked.dados.some((d) => d.id === id));
    // Dados are seen on the back alone.
    if (face === 'back' && dado !== undefined) return void goToEntry(entryOfFeature(worked, dado));
    const feature = [...worked.contours.openings, ...worked.contours.members].find(({ id }) => hit.includes(id));
    desk.selection.set(feature ? selectionOf(feature, face, true, p) : null);
  }

  return {
    onPointerDown(event: PointerEvent<SVGSVGElement>) {
      if (event.button !== 0) return;
      dragged.current = false;
      down.current.set(event.pointerId, onPage(event));
    },
    onPointerMove(event: PointerEvent<SVGSVGElement>) {
      const before = down.current.get(event.pointerId);
      if (before === undefined) return point(event);
      const now = onPage(event);
      if (!dragged.current && Math.hypot(now.x - before.x, now.y - before.y) < DRAG_PX) return;
      dragged.current = true;
      event.currentTarget.setPointerCapture(event.pointerId);
      drag(event, before);
    },
    onPointerUp(event: PointerEvent<SVGSVGElement>) {
      const wasDown = down.current.delete(event.pointerId);
      if (wasDown && !dragged.current) click(event);
    },
    onPointerCancel(event: PointerEvent<SVGSVGElement>) {
      down.current.delete(event.pointerId);
    },
    onPointerLeave(event: PointerEvent<SVGSVGElement>) {
      if (!event.currentTarget.hasPointerCapture(event.pointerId)) down.current.delete(event.pointerId);
      light(desk.lit, []);
    },
  };
}
