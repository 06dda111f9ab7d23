import { useEffect, useEffectEvent, useRef, type KeyboardEvent, type PointerEvent, type RefObject } from 'react';
import type { Point } from '#shared/kernel/contour/contour.ts';
import { panOn, turnOn, zoomOn, type Hold } from '../model/turning.ts';

/** Radians for a pixel of dragging, and for one press of an arrow. */
const TURN_PX = 0.008;
const TURN_KEY = Math.PI / 24;
const PAN_KEY_PX = 40;
const KEY_ZOOM = 1.25;
/** Zoom for one notch (100 px) of a wheel, and pixels to a line of one that counts in lines. */
const WHEEL_ZOOM = 1.2;
const LINE_PX = 33;

interface Turning {
  readonly hold: Hold;
  readonly onHold: (hold: Hold) => void;
  /** Holds the part as at first. */
  readonly onReset: () => void;
  /** A place was picked: pixels from the middle, right and up. */
  readonly onPick: (at: Point) => void;
  /** Length of the part to a pixel. */
  readonly pixel: () => number;
  readonly area: RefObject<HTMLElement | null>;
}

/** Turning, moving and zooming the part: by mouse (drag; right button or Shift moves; wheel zooms), by touch (one finger turns, two move and zoom), by keyboard. */
export function useTurning({ hold, onHold, onReset, onPick, pixel, area }: Turning) {
  /** Pointers that are down, where they last were. */
  const down = useRef(new Map<number, Point>());

  const fromMiddle = (event: { clientX: number; clientY: number }): Point => {
    const box = area.current!.getBoundingClientRect();
    return { x: event.clientX - box.left - box.width / 2, y: box.top + box.height / 2 - event.clientY };
  };
  const lengths = ({ x, y }: Point): Point => ({ x: x * pixel(), y: y * pixel() });

  const wheel = useEffectEvent((event: WheelEvent) => {
    event.preventDefault();
    const turned = event.deltaY * (event.deltaMode === WheelEvent.DOM_DELTA_LINE ? LINE_PX : 1);
    onHold(zoomOn(hold, WHEEL_ZOOM ** (-turned / 100), lengths(fromMiddle(event))));
  });
  useEffect(() => {
    const element = area.current;
    if (!element) return;
    // React's own wheel handlers cannot stop the page from scrolling.
    const listen = (event: WheelEvent) => wheel(event);
    element.addEventListener('wheel', listen, { passive: false });
    return () => element.removeEventListener('wheel', listen);
  }, [area]);

  function pinch(before: Point, now: Point, other: Point): void {
    const factor =
      Math.hypot(now.x - other.x, now.y - other.y) / Math.max(1, Math.hypot(before.x - other.x, before.y - other.y));
    const moved = lengths({ x: (now.x - before.x) / 2, y: (now.y - before.y) / 2 });
    onHold(
      zoomOn(panOn(hold, moved.x, moved.y), factor, lengths({ x: (now.x + other.x) / 2, y: (now.y + other.y) / 2 })),
    );
  }

  function drag(event: PointerEvent, before: Point): void {
    const now = fromMiddle(event);
    const [other] = [...down.current].filter(([id]) => id !== event.pointerId).map(([, p]) => p);
    down.current.set(event.pointerId, now);
    const [right, up] = [now.x - before.x, now.y - before.y];
    if (other) pinch(before, now, other);
    else if (event.shiftKey || event.buttons & 6) onHold(panOn(hold, right * pixel(), up * pixel()));
    else onHold(turnOn(hold, right * TURN_PX, -up * TURN_PX));
  }

  function press(key: string, moves: boolean): Hold | undefined {
    const [right, up] = ({ ArrowRight: [1, 0], ArrowLeft: [-1, 0], ArrowUp: [0, 1], ArrowDown: [0, -1] } as const)[
      key
    ] ?? [0, 0];
    if (right !== 0 || up !== 0)
      return moves
        ? panOn(hold, right * PAN_KEY_PX * pixel(), up * PAN_KEY_PX * pixel())
        : turnOn(hold, right * TURN_KEY, -up * TURN_KEY);
    if (key === '+' || key === '=') return zoomOn(hold, KEY_ZOOM);
    if (key === '-') return zoomOn(hold, 1 / KEY_ZOOM);
    return undefined;
  }

  return {
    onPointerDown(event: PointerEvent<HTMLElement>) {
      event.currentTarget.setPointerCapture(event.pointerId);
      down.current.set(event.pointerId, fromMiddle(event));
    },
    onPointerMove(event: PointerEvent<HTMLElement>) {
      const before = down.current.get(event.pointerId);
      if (before) drag(event, before);
    },
    onPointerUp(event: PointerEvent<HTMLElement>) {
      down.current.delete(event.pointerId);
    },
    onPointerCancel(event: PointerEvent<HTMLElement>) {
      down.current.delete(event.pointerId);
    },
    // The right button moves the part.
    onContextMenu(event: { preventDefault: () => void }) {
      event.preventDefault();
    },
    onDoubleClick(event: { clientX: number; clientY: number }) {
      onPick(fromMiddle(event));
    },
    onKeyDown(event: KeyboardEvent<HTMLElement>) {
      if (event.ctrlKey || event.metaKey || event.altKey || event.target !== event.currentTarget) return;
      const held = press(event.key, event.shiftKey);
      if (held) onHold(held);
      else if (event.key === '0' || event.key === 'f' || event.key === 'F') onReset();
      else if (event.key === 'Enter') onPick({ x: 0, y: 0 });
      else return;
      event.preventDefault();
    },
  };
}
