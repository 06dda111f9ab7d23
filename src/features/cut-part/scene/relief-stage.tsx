import { useEffect, useRef } from 'react';
import type { Relief } from '../sweeping/picture.ts';

interface ReliefStageProps {
  readonly relief: Relief | null;
  readonly label: string;
  readonly describedBy: string;
}

/** One face as a shaded picture, where the browser has no WebGL. */
export function ReliefStage({ relief, label, describedBy }: ReliefStageProps) {
  const canvas = useRef<HTMLCanvasElement>(null);
  useEffect(() => {
    const context = canvas.current?.getContext('2d');
    if (relief && context) context.putImageData(new ImageData(relief.pixels, relief.width, relief.height), 0, 0);
  }, [relief]);
  return (
    <canvas
      ref={canvas}
      role="img"
      aria-label={label}
      aria-describedby={describedBy}
      width={relief?.width ?? 1}
      height={relief?.height ?? 1}
      className="absolute inset-0 size-full object-contain p-4"
    />
  );
}
