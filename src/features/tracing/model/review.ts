import type { LoopRole } from '#shared/kernel/tracing/frames/loop-role.ts';
import type { TracedDrawing } from '#shared/kernel/tracing/traced-drawing.ts';
import { matchLoops } from './match-loops.ts';

/** How many steps can be taken back. */
const LONGEST = 300;

type Roles = readonly LoopRole[];

interface Step {
  readonly roles: Roles;
  /** What was done next, as in "Undo: Loop 3 is a dado". */
  readonly label: string;
}

/** What a person has said of one reading of a drawing. Loops are named by their places in it. */
export interface Review {
  readonly drawing: TracedDrawing;
  readonly roles: Roles;
  /** Oldest first. */
  readonly past: readonly Step[];
  /** Next one first. */
  readonly future: readonly Step[];
  /** Names of frames as typed, by the loop of their perimeter. */
  readonly names: ReadonlyMap<number, string>;
  /** Perimeters whose frame is to be made of stiles and rails. */
  readonly members: ReadonlySet<number>;
  /** What was said of loops of the reading before that this one does not have. */
  readonly lost: number;
}

const NO_NAMES: ReadonlyMap<number, string> = new Map();
const NO_MEMBERS: ReadonlySet<number> = new Set();

const guessed = (drawing: TracedDrawing): Roles => drawing.loops.map(({ role }) => role);

export const startReview = (drawing: TracedDrawing): Review => ({
  drawing,
  roles: guessed(drawing),
  past: [],
  future: [],
  names: NO_NAMES,
  members: NO_MEMBERS,
  lost: 0,
});

/** Gives loops a role, as one step. What was taken back before is gone. */
export function giveRole(review: Review, loops: Iterable<number>, role: LoopRole, label: string): Review {
  const roles = [...review.roles];
  let changed = false;
  for (const i of loops) {
    if (roles[i] === undefined) throw new RangeError(`loop: got ${i}, takes one of ${roles.length}`);
    changed ||= roles[i] !== role;
    roles[i] = role;
  }
  if (!changed) return review;
  const past = [...review.past, { roles: review.roles, label }].slice(-LONGEST);
  return { ...review, roles, past, future: [] };
}

export function undoRole(review: Review): Review {
  const step = review.past.at(-1);
  if (step === undefined) return review;
  return {
    ...review,
    roles: step.roles,
    past: review.past.slice(0, -1),
    future: [{ roles: review.roles, label: step.label }, ...review.future],
  };
}

export function redoRole(review: Review): Review {
  const [step, ...future] = review.future;
  if (step === undefined) return review;
  return { ...review, roles: step.roles, past: [...review.past, { roles: review.roles, label: step.label }], future };
}

export const nameFrame = (review: Review, perimeter: number, name: string): Review => ({
  ...review,
  names: new Map(review.names).set(perimeter, name),
});

export function chooseMembers(review: Review, perimeter: number, chosen: boolean): Review {
  const members = new Set(review.members);
  if (chosen) members.add(perimeter);
  else members.delete(perimeter);
  return { ...review, members };
}

/** Places of the loops whose role is not what the drawing was taken for. */
export const saidRoles = ({ drawing, roles }: Review): number[] =>
  roles.flatMap((role, i) => (role === drawing.loops[i]!.role ? [] : [i]));

/** Whether leaving would lose anything that was said. */
export const hasSaid = (review: Review): boolean =>
  review.names.size > 0 || review.members.size > 0 || saidRoles(review).length > 0;

/**
 * The same review on another reading of the same file: what was said of a loop holds for the loop that lies where it lay.
 * Steps cannot be taken back across readings; what finds no loop is counted in `lost`.
 */
export function carryOver(review: Review, drawing: TracedDrawing): Review {
  const changed = saidRoles(review);
  const said = [...new Set([...changed, ...review.names.keys(), ...review.members])];
  const found = matchLoops(review.drawing, said, drawing);
  const next = startReview(drawing);
  const roles = [...next.roles];
  for (const i of changed) {
    const at = found.get(i);
    if (at !== undefined) roles[at] = review.roles[i]!;
  }
  const names = [...review.names].flatMap(([i, name]): [number, string][] =>
    found.has(i) ? [[found.get(i)!, name]] : [],
  );
  const members = [...review.members].flatMap((i) => found.get(i) ?? []);
  return {
    ...next,
    roles,
    names: new Map(names),
    members: new Set(members),
    // Before the unit is known a reading has no loops, and nothing can have been said.
    lost: said.length - found.size,
  };
}
