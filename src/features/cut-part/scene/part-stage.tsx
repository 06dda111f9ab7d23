import { useEffect, useEffectEvent, useRef, useState, type RefObject } from 'react';
import type { Point } from '#shared/kernel/contour/contour.ts';
import type { Slice } from '../mesh/slice.ts';
import type { Hold } from '../model/turning.ts';
import type { Picture, Plane } from '../work/picture.ts';
import { PartScene, type SceneColours, type Showing } from './part-scene.ts';
import { useTurning } from './use-turning.ts';

interface PartStageProps {
  readonly picture: Picture | null;
  readonly colours: SceneColours;
  readonly showing: Showing;
  readonly plane: Plane | null;
  readonly slice: Slice | null;
  readonly hold: Hold;
  readonly onHold: (hold: Hold) => void;
  readonly onReset: () => void;
  readonly onPick: (place: Point) => void;
  /** The browser took the drawing away, as it may when it is short of memory. */
  readonly onLost: () => void;
  readonly label: string;
  readonly describedBy: string;
}

/** A scene on the canvas for as long as the canvas is there, as large as its area, drawn at most once a frame of the screen. */
function useScene(canvas: RefObject<HTMLCanvasElement | null>, hold: Hold, onLost: () => void) {
  const [scene, setScene] = useState<PartScene | null>(null);
  const frame = useRef(0);
  const draw = useEffectEvent((of: PartScene) => of.draw(hold));
  const lost = useEffectEvent(onLost);
  const drawSoon = useRef((of: PartScene) => {
    cancelAnimationFrame(frame.current);
    frame.current = requestAnimationFrame(() => draw(of));
  });

  useEffect(() => {
    const element = canvas.current!;
    const made = new PartScene(element);
    const onContextLost = (event: Event) => {
      event.preventDefault();
      lost();
    };
    element.addEventListener('webglcontextlost', onContextLost);
    const fit = () => {
      const { clientWidth, clientHeight } = element;
      if (clientWidth === 0 || clientHeight === 0) return;
      made.resize(clientWidth, clientHeight, window.devicePixelRatio);
      drawSoon.current(made);
    };
    fit();
    const watch = new ResizeObserver(fit);
    watch.observe(element);
    setScene(made);
    return () => {
      watch.disconnect();
      element.removeEventListener('webglcontextlost', onContextLost);
      cancelAnimationFrame(frame.current);
      made.dispose();
    };
  }, [canvas]);
  return { scene, drawSoon: drawSoon.current };
}

/** The part in three dimensions: it can be turned, moved and zoomed by mouse, touch and keyboard. */
export function PartStage({ picture, colours, showing, plane, slice, hold, onHold, onReset, onPick, onLost, label, describedBy }: PartStageProps) {
  const area = useRef<HTMLDivElement>(null);
  const canvas = useRef<HTMLCanvasElement>(null);
  const { scene, drawSoon } = useScene(canvas, hold, onLost);
  const { both, loose, flip } = showing;

  useEffect(() => {
    if (scene && picture) scene.setPicture(picture, colours);
  }, [scene, picture, colours]);
  useEffect(() => scene?.setShowing({ both, loose, flip }), [scene, both, loose, flip]);
  useEffect(() => scene?.setSlice(plane, plane && slice), [scene, plane, slice, picture, both, flip]);
  useEffect(() => {
    if (scene && picture) drawSoon(scene);
  }, [scene, drawSoon, picture, colours, both, loose, flip, plane, slice, hold]);

  const turning = useTurning({
    hold,
    onHold,
    onReset,
    onPick: (at) => {
      const place = scene?.placeUnder(hold, at);
      if (place) onPick(place);
    },
    pixel: () => scene?.lengthOfPixel(hold) ?? 0,
    area,
  });
  return (
    <div
      ref={area}
      role="application"
      tabIndex={0}
      aria-label={label}
      aria-describedby={describedBy}
      aria-keyshortcuts="ArrowLeft ArrowRight ArrowUp ArrowDown + - 0 Enter"
      className="relative size-full cursor-grab touch-none select-none focus-visible:-outline-offset-2 active:cursor-grabbing"
      {...turning}
    >
      <canvas ref={canvas} aria-hidden="true" className="absolute inset-0 size-full" />
    </div>
  );
}
