import type { RefusedReason } from './entity-reasons.ts';
import { UPRIGHT } from './read-tolerances.ts';

/** Which way the extrusion of an entity points (DXF Reference, group 210): up, down, or so that it does not lie in the XY plane. */
export function faceOf(x: number, y: number, z: number): 'up' | 'down' | 'tilted' {
  const length = Math.hypot(x, y, z);
  // No direction at all is no plane either.
  if (!(length > 0) || Math.abs(x) > UPRIGHT * length || Math.abs(y) > UPRIGHT * length) return 'tilted';
  return z > 0 ? 'up' : 'down';
}

/** What an entity reader answers beside its lines: refused, or kept with what should be said of it. */
export interface Drawn {
  readonly refused: RefusedReason | null;
  /** It lay at a height that is not 0. */
  readonly lifted: boolean;
  /** It was drawn with a width; its middle was taken. */
  readonly wide: boolean;
}

export const DRAWN: Drawn = { refused: null, lifted: false, wide: false };
export const DRAWN_LIFTED: Drawn = { refused: null, lifted: true, wide: false };
export const drawn = (lifted: boolean): Drawn => (lifted ? DRAWN_LIFTED : DRAWN);

const answers = new Map<RefusedReason, Drawn>();

/** The same object each time: hundreds of thousands may be refused alike. */
export function refused(reason: RefusedReason): Drawn {
  let answer = answers.get(reason);
  if (answer === undefined) answers.set(reason, (answer = { refused: reason, lifted: false, wide: false }));
  return answer;
}
