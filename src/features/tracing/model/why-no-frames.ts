import { LIMITS } from '#shared/contracts/limits.ts';
import type { TracedDrawing } from '#shared/kernel/tracing/traced-drawing.ts';
import type { FramePlans } from './frame-plans.ts';

/** What is wrong with a frame's name; '' when nothing is. */
export const nameProblem = (name: string): string =>
  name.trim() === '' ? `Got nothing; takes 1 to ${LIMITS.nameLength} characters.` : '';

/** Why frames cannot be added as things stand, with what to do; '' when they can. */
export function whyNoFrames(
  { unit, extents, incomplete, loops }: TracedDrawing,
  { frames }: FramePlans,
  confirmed: boolean,
): string {
  if (extents === null) return 'There is no line in it to trace.';
  if (unit === null) return 'Choose the unit first.';
  if (loops.length > LIMITS.tracedLoops)
    return `${loops.length} loops are more than ${LIMITS.tracedLoops}, the most that are taken. Export only what belongs to the frames.`;
  if (frames.length === 0) return 'No loop is a perimeter yet.';
  if (frames.length > LIMITS.tracedFrames)
    return `${frames.length} frames are more than ${LIMITS.tracedFrames}, the most at once. Leave some perimeters out.`;
  if (incomplete && !confirmed) return 'Confirm that the drawing is whole enough.';
  const refused = frames.find(({ takes }) => takes !== '');
  if (refused) return `${refused.name}: ${refused.takes}`;
  return frames.some(({ name }) => nameProblem(name) !== '') ? 'Name every frame.' : '';
}
