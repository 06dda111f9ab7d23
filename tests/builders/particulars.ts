import { newFrame } from '../../shared/kernel/particulars/new-frame.ts';
import { setField } from '../../shared/kernel/particulars/set-field.ts';
import type { Particulars } from '../../shared/kernel/particulars/particulars.ts';

/** A valid frame in inches with neither stop nor caution; `changes` are entries by path, such as { 'outline.width': 30 }. */
export function aFrame(changes: Record<string, unknown> = {}): Particulars {
  let particulars = newFrame('in', 'Two-door base');
  for (const [path, value] of Object.entries({ 'outline.rails.bottom': 1.5, ...changes }))
    particulars = setField(particulars, path, value);
  return particulars;
}

/** Deeper than two thirds of the board: a stop. */
export const aFrameWithStop = (): Particulars => aFrame({ 'dados.0.depth': 0.6 });

/** The dado of the bottom comes within 1/8 in of the openings' lower edge: a caution. */
export const aFrameWithCaution = (): Particulars => aFrame({ 'outline.rails.bottom': 1.3 });
