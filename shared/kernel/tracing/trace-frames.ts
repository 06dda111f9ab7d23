import type { Particulars } from '../particulars/particulars.ts';
import { applyRoles } from './frames/apply-roles.ts';
import type { LoopRole } from './frames/loop-role.ts';
import { NotTraceable } from './not-traceable.ts';
import { healFound, readFound } from './trace-drawing.ts';
import type { TraceOptions } from './traced-drawing.ts';
import { tracedParticulars } from './traced-particulars.ts';

export interface TraceFramesInput {
  readonly bytes: Uint8Array;
  readonly options: TraceOptions;
  /** A person has looked at a drawing whose end is missing, and goes on with it. */
  readonly confirmed: boolean;
  /** One a loop, in the order of traceDrawing with the same options. */
  readonly roles: readonly LoopRole[];
  /** One a perimeter, in the order of applyRoles. */
  readonly frames: readonly { readonly name: string; readonly asMembers: boolean }[];
}

/**
 * The frames of a drawing with the roles that a person gave its loops. The file is read anew: nothing is taken from a page but
 * words. Throws NotTraceable: for what readFound refuses, without a unit, for an unconfirmed incomplete drawing, and where roles
 * or frames are of another reading.
 */
export function traceFrames({ bytes, options, confirmed, roles, frames }: TraceFramesInput): Particulars[] {
  const found = readFound(bytes, options);
  const unit = options.unit ?? found.unit;
  if (unit === null)
    throw new NotTraceable('unit-unknown', 'The file does not say its unit. Choose inches or millimetres.');
  if (found.incomplete && !confirmed)
    throw new NotTraceable(
      'not-confirmed',
      'The end of the file is missing. Look at the drawing and confirm that it is whole enough.',
    );
  const { loops } = healFound(found.curves, unit, options);
  if (roles.length !== loops.length)
    throw new NotTraceable(
      'other-reading',
      `This drawing has ${loops.length} loops, and roles came for ${roles.length}. Load the page again.`,
    );
  const traced = applyRoles(loops, roles, unit, { view: options.view }).frames;
  if (traced.length !== frames.length)
    throw new NotTraceable(
      'other-reading',
      `These roles make ${traced.length} frames, and ${frames.length} were named. Load the page again.`,
    );
  return traced.map((frame, i) => tracedParticulars(frame, frames[i]!.name, unit, frames[i]!.asMembers));
}
