import type { Unit } from '../../units/unit.ts';
import { applyRoles, type FramesOptions, type TracedFrames } from './apply-roles.ts';
import { guessRoles } from './guess-roles.ts';
import type { GuessedRole, RoleLoop } from './loop-role.ts';

export interface GuessedFrames extends TracedFrames {
  /** One a loop; a person may change them and have `applyRoles` make the frames again. */
  readonly roles: readonly GuessedRole[];
}

/** Frames from the loops of a drawing, in the drawing's unit, with roles taken from how the loops lie in each other. */
export function framesFromLoops(loops: readonly RoleLoop[], unit: Unit, options: FramesOptions = {}): GuessedFrames {
  const roles = guessRoles(loops);
  const made = applyRoles(
    loops,
    roles.map(({ role }) => role),
    unit,
    options,
  );
  return { ...made, roles };
}
