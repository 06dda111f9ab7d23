import { LIMITS } from '#shared/contracts/limits.ts';
import {
  applyRoles,
  type RoleProblem,
  type TracedFrame,
  type TracedFrames,
} from '#shared/kernel/tracing/frames/apply-roles.ts';
import { membersFromTraced, type MembersFromTraced } from '#shared/kernel/tracing/frames/members-from-traced.ts';
import type { TraceOptions } from '#shared/kernel/tracing/traced-drawing.ts';
import type { DrawnLoop } from './loop-contours.ts';
import type { Unit } from '#shared/kernel/units/unit.ts';
import type { Review } from './review.ts';

/** A frame as it would be added. */
export interface FramePlan extends TracedFrame {
  /** As typed, or else after the file. */
  readonly name: string;
  readonly asMembers: boolean;
  /** Why there can be no such frame, with what one takes; '' when there can. */
  readonly takes: string;
  /** What it would be as stiles and rails, or why it cannot be; null where there can be no such frame at all. */
  readonly members: MembersFromTraced | null;
}

export interface FramePlans {
  readonly frames: readonly FramePlan[];
  readonly problems: readonly RoleProblem[];
}

/** "kitchen.dxf" names the frames "kitchen", or "kitchen 1", "kitchen 2" where there are several. */
export function defaultName(fileName: string, place: number, count: number): string {
  const stem = fileName.replace(/\.dxf$/i, '').trim() || 'Drawing';
  const tail = count === 1 ? '' : ` ${place + 1}`;
  return stem.slice(0, LIMITS.nameLength - tail.length) + tail;
}

function takesOf({ outline, dados }: TracedFrame): string {
  const count = outline.openings.length;
  if (count > LIMITS.openings) return `It has ${count} openings; takes at most ${LIMITS.openings}. Leave some out.`;
  return dados.length > LIMITS.dados ? `It has ${dados.length} dados; takes at most ${LIMITS.dados}.` : '';
}

/** membersFromTraced, worked out once for a frame of the same loops. For one drawing seen from one side. */
export function rememberMembers(unit: Unit): (frame: TracedFrame) => MembersFromTraced {
  const known = new Map<string, MembersFromTraced>();
  return (frame) => {
    const key = [frame.perimeterLoop, ...frame.openingLoops].join(' ');
    const members = known.get(key) ?? membersFromTraced(frame.outline, unit);
    known.set(key, members);
    return members;
  };
}

interface RolesInput {
  readonly review: Pick<Review, 'drawing' | 'roles'>;
  readonly loops: readonly DrawnLoop[];
  readonly view: TraceOptions['view'];
}

const NO_FRAMES: TracedFrames = { frames: [], problems: [] };

/** The frames that follow from the roles, in reading order; none before the unit is known. */
export const framesOfRoles = ({ review: { drawing, roles }, loops, view }: RolesInput): TracedFrames =>
  drawing.unit === null ? NO_FRAMES : applyRoles(loops, roles, drawing.unit, { view });

interface PlanInput {
  readonly traced: TracedFrames;
  readonly review: Pick<Review, 'names' | 'members'>;
  readonly fileName: string;
  readonly membersOf: (frame: TracedFrame) => MembersFromTraced;
}

/** The same frames with what was said of them. */
export function planFrames({ traced: { frames, problems }, review, fileName, membersOf }: PlanInput): FramePlans {
  const plans = frames.map((frame, i): FramePlan => {
    const takes = takesOf(frame);
    const members = takes === '' ? membersOf(frame) : null;
    return {
      ...frame,
      name: review.names.get(frame.perimeterLoop) ?? defaultName(fileName, i, frames.length),
      asMembers: members?.ok === true && review.members.has(frame.perimeterLoop),
      takes,
      members,
    };
  });
  return { frames: plans, problems };
}
