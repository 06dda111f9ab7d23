import { useEffect, useEffectEvent, useRef, useState, type RefObject } from 'react';
import type { Point } from '#shared/kernel/contour/contour.ts';
import type { Slice } from '../mesh/slice.ts';
import type { Hold } from '../model/turning.ts';
import type { Picture, Plane } from '../sweeping/picture.ts';
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

/** A scene on the canvas for as long as the canvas is there, as large as the canvas is laid out. */
function useScene(canvas: RefObject<HTMLCanvasElement | null>, onLost: () => void): PartScene | null {
  const [scene, setScene] = useState<PartScene | null>(null);
  const lost = useEffectEvent(onLost);
  useEffect(() => {
    const element = canvas.current!;
    const made = new PartScene(element);
    const onContextLost = () => lost();
    element.addEventListener('webglcontextlost', onContextLost);
    const fit = () => {
      if (element.clientWidth === 0 || element.clientHeight === 0) return;
      made.resize(element.clientWidth, element.clientHeight, window.devicePixelRatio);
      setScene(made);
    };
    const watch = new ResizeObserver(fit);
    watch.observe(element);
    return () => {
      watch.disconnect();
      element.removeEventListener('webglcontextlost', onContextLost);
      made.dispose();
    };
  }, [canvas]);
  return scene;
}

/** The part in three dimensions: it can be turned, moved and zoomed by mouse, touch and keyboard. */
export function PartStage({
  picture,
  colours,
  showing,
  plane,
  slice,
  hold,
  onHold,
  onReset,
  onPick,
  onLost,
  label,
  describedBy,
}: PartStageProps) {
  const area = useRef<HTMLDivElement>(null);
  const canvas = useRef<HTMLCanvasElement>(null);
  const scene = useScene(canvas, onLost);
  const { shown, loose, flip } = showing;

  useEffect(() => {
    if (scene && picture) scene.setPicture(picture, colours);
  }, [scene, picture, colours]);
  useEffect(() => scene?.setShowing({ shown, loose, flip }), [scene, shown, loose, flip]);
  useEffect(() => scene?.setSlice(plane, plane && slice), [scene, plane, slice, picture, shown, flip]);
  useEffect(() => scene?.setHold(hold), [scene, hold]);

  const turning = useTurning({
    hold,
    onHold,
    onReset,
    onPick: (at) => {
      const place = scene?.placeUnder(at);
      if (place) onPick(place);
    },
    pixel: () => scene?.lengthOfPixel() ?? 0,
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
      className="absolute inset-0 cursor-grab touch-none select-none focus-visible:-outline-offset-2 active:cursor-grabbing"
      {...turning}
    >
      <canvas ref={canvas} aria-hidden="true" className="absolute inset-0 size-full" />
    </div>
  );
}
