import { useEffect, useEffectEvent, useRef, type PointerEvent, type RefObject } from 'react';
import type { Point } from '#shared/kernel/contour/contour.ts';
import { panPlan, toPlan, zoomPlan, type PlanSize, type PlanView } from '../model/plan-view.ts';

/** Less than this is a click, more is a drag. */
const DRAG_PX = 4;
/** Zoom for one notch (100 px) of a wheel. */
const WHEEL_ZOOM = 1.2;
/** A wheel that counts lines: pixels a line. */
const LINE_PX = 33;

interface PlanPointer {
  readonly view: PlanView;
  readonly size: PlanSize;
  readonly onView: (view: PlanView) => void;
  /** A click at a place of the drawing; `more`: with Shift or Ctrl held. */
  readonly onClick: (at: Point, more: boolean) => void;
}

/** Clicking, dragging, pinching and wheeling on a drawing. */
export function usePlanPointer(svg: RefObject<SVGSVGElement | null>, { view, size, onView, onClick }: PlanPointer) {
  /** Pointers that are down, where they last were; more than one pinches. */
  const down = useRef(new Map<number, Point>());
  const dragged = useRef(false);

  const onPage = (event: { clientX: number; clientY: number }): Point => {
    const box = svg.current!.getBoundingClientRect();
    return { x: event.clientX - box.left, y: event.clientY - box.top };
  };

  const wheel = useEffectEvent((event: WheelEvent) => {
    event.preventDefault();
    const lines = event.deltaMode === WheelEvent.DOM_DELTA_LINE ? LINE_PX : 1;
    onView(zoomPlan(view, WHEEL_ZOOM ** ((-event.deltaY * lines) / 100), toPlan(view, size, onPage(event))));
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
    const [other] = [...down.current].filter(([id]) => id !== event.pointerId).map(([, p]) => p);
    if (other) {
      const apart = Math.max(1, Math.hypot(before.x - other.x, before.y - other.y));
      const middle = toPlan(view, size, { x: (now.x + other.x) / 2, y: (now.y + other.y) / 2 });
      onView(zoomPlan(view, Math.max(1, Math.hypot(now.x - other.x, now.y - other.y)) / apart, middle));
    } else {
      onView(panPlan(view, now.x - before.x, now.y - before.y));
    }
    down.current.set(event.pointerId, now);
  }

  return {
    onPointerDown(event: PointerEvent<SVGSVGElement>) {
      if (event.button !== 0) return;
      dragged.current = false;
      down.current.set(event.pointerId, onPage(event));
    },
    onPointerMove(event: PointerEvent<SVGSVGElement>) {
      const before = down.current.get(event.pointerId);
      if (before === undefined) return;
      const now = onPage(event);
      if (!dragged.current && Math.hypot(now.x - before.x, now.y - before.y) < DRAG_PX) return;
      dragged.current = true;
      event.currentTarget.setPointerCapture(event.pointerId);
      drag(event, before);
    },
    onPointerUp(event: PointerEvent<SVGSVGElement>) {
      const wasDown = down.current.delete(event.pointerId);
      if (wasDown && !dragged.current)
        onClick(toPlan(view, size, onPage(event)), event.shiftKey || event.ctrlKey || event.metaKey);
    },
    onPointerCancel(event: PointerEvent<SVGSVGElement>) {
      down.current.delete(event.pointerId);
    },
  };
}
