import { checkFrame } from './check-frame.ts';
import { drawFrame } from './draw-frame.ts';
import type { Particulars } from './particulars/particulars.ts';
import type { WorkedFrame } from './worked-frame.ts';

/** The whole pipeline with every check. Pure. Bad geometry never throws: it is a stop among the findings. */
export function workFrame(particulars: Particulars): WorkedFrame {
  const lines = drawFrame(particulars);
  return { ...lines, ...checkFrame(lines) };
}
