import type { LoopRole } from '#shared/kernel/tracing/frames/loop-role.ts';
import { panPlan, zoomPlan, ZOOM_STEP, type PlanView } from '../model/plan-view.ts';

const STEP_PX = 40;
const LONG_STEP_PX = 200;

/** What a key on the drawing asks for. */
export type PlanWish =
  | { readonly view: PlanView | null }
  | { readonly step: 1 | -1 }
  | { readonly role: LoopRole }
  | { readonly chooseNone: true };

const ARROWS: Readonly<Record<string, readonly [right: number, up: number]>> = {
  ArrowRight: [1, 0],
  ArrowLeft: [-1, 0],
  ArrowUp: [0, 1],
  ArrowDown: [0, -1],
};

const ROLE_KEYS: Readonly<Record<string, LoopRole>> = { p: 'perimeter', o: 'opening', d: 'dado', l: 'leave-out' };

export const PLAN_KEYS =
  'Arrows move, + and − zoom, F fits. N and B go to the next loop and back; P, O, D and L make it perimeter, opening, dado, or leave it out. Esc lets go.';

/** Arrows move, + and − zoom, F fits, N and B walk the loops, letters give a role. Undefined for keys that mean nothing here. */
export function pressPlanKey(key: string, shift: boolean, view: PlanView): PlanWish | undefined {
  const arrow = ARROWS[key];
  if (arrow) {
    const step = shift ? LONG_STEP_PX : STEP_PX;
    // The window moves over the drawing, so the drawing goes the other way.
    return { view: panPlan(view, -arrow[0] * step, arrow[1] * step) };
  }
  const low = key.toLowerCase();
  if (key === '+' || key === '=') return { view: zoomPlan(view, ZOOM_STEP) };
  if (key === '-') return { view: zoomPlan(view, 1 / ZOOM_STEP) };
  if (key === '0' || low === 'f') return { view: null };
  if (low === 'n') return { step: 1 };
  if (low === 'b') return { step: -1 };
  if (key === 'Escape') return { chooseNone: true };
  const role = ROLE_KEYS[low];
  return role === undefined ? undefined : { role };
}
