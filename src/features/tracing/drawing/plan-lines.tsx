import { memo, useMemo } from 'react';
import type { LoopRole } from '#shared/kernel/tracing/frames/loop-role.ts';
import type { TracedDrawing } from '#shared/kernel/tracing/traced-drawing.ts';
import type { DrawnLoop } from '../model/loop-contours.ts';
import { chosenPath, foundPath, openPath, rolePath } from './plan-paths.ts';

export type Shown = 'found' | 'healed' | 'both';

interface PlanLinesProps {
  readonly drawing: TracedDrawing;
  readonly loops: readonly DrawnLoop[];
  readonly roles: readonly LoopRole[];
  readonly chosen: ReadonlySet<number>;
  readonly shown: Shown;
}

/** In the order in which they are drawn: what lies in a perimeter over it. */
export const ROLE_LOOKS: readonly { readonly role: LoopRole; readonly look: string }[] = [
  { role: 'leave-out', look: 'fill-none stroke-pencil [stroke-dasharray:5_4] stroke-1' },
  { role: 'perimeter', look: 'fill-board-light stroke-ink stroke-2' },
  { role: 'opening', look: 'fill-paper stroke-front stroke-2' },
  { role: 'dado', look: 'fill-board stroke-back stroke-2' },
];

/** Of what does not close. */
export const OPEN_LOOK = 'fill-none stroke-stop stroke-[3px] [stroke-dasharray:2_3]';

const Line = ({ d, look }: { readonly d: string; readonly look: string }) =>
  d === '' ? null : <path d={d} vectorEffect="non-scaling-stroke" fillRule="evenodd" className={look} />;

/** The lines of a drawing in its own units: as found light and wide below, as healed over it. */
export const PlanLines = memo(function PlanLines({ drawing, loops, roles, chosen, shown }: PlanLinesProps) {
  const found = useMemo(() => foundPath(drawing.found), [drawing]);
  const open = useMemo(() => openPath(drawing.open), [drawing]);
  const byRole = useMemo(
    () => ROLE_LOOKS.map(({ role, look }) => ({ role, look, d: rolePath(loops, roles, role) })),
    [loops, roles],
  );
  const picked = useMemo(() => chosenPath(loops, chosen), [loops, chosen]);
  const healed = shown !== 'found' && drawing.unit !== null;
  const left = byRole.find(({ role }) => role === 'leave-out')!;
  return (
    <>
      {healed && byRole.map(({ role, look, d }) => role !== 'leave-out' && <Line key={role} d={d} look={look} />)}
      {shown === 'both' && healed && <Line d={found} look="fill-none stroke-rule stroke-[5px]" />}
      {healed &&
        byRole.map(({ role, look, d }) =>
          role === 'leave-out' || shown !== 'both' ? null : (
            <Line key={`${role}-over`} d={d} look={`${look} [fill:none]`} />
          ),
        )}
      {healed && <Line d={left.d} look={left.look} />}
      {!healed && <Line d={found} look="fill-none stroke-ink stroke-1" />}
      {healed && <Line d={open} look={OPEN_LOOK} />}
      {healed && <Line d={picked} look="fill-lift/15 stroke-lift stroke-[4px]" />}
    </>
  );
});
