import type { LoopRole } from '#shared/kernel/tracing/frames/loop-role.ts';
import type { TracedDrawing } from '#shared/kernel/tracing/traced-drawing.ts';
import { plural } from '../../../ui/plural.ts';
import { OPEN_LOOK, ROLE_LOOKS } from './plan-lines.tsx';

interface PlanLegendProps {
  readonly drawing: TracedDrawing;
  readonly roles: readonly LoopRole[];
}

const Swatch = ({ look }: { readonly look: string }) => (
  <svg width={22} height={10} aria-hidden="true" className="shrink-0">
    <path d="M1 5H21" className={look} />
  </svg>
);

/** What the lines mean, with how many loops there are of each. */
export function PlanLegend({ drawing, roles }: PlanLegendProps) {
  const count = (role: LoopRole) => roles.filter((other) => other === role).length;
  const words: Record<LoopRole, string> = {
    perimeter: plural(count('perimeter'), 'perimeter'),
    opening: plural(count('opening'), 'opening'),
    dado: plural(count('dado'), 'dado'),
    'leave-out': `${count('leave-out')} left out`,
  };
  const entries = [
    ...ROLE_LOOKS.map(({ role, look }) => ({ key: role, look, text: words[role] })),
    { key: 'open', look: OPEN_LOOK, text: `${drawing.open.length} not closed` },
  ];
  return (
    <ul aria-label="Lines" className="flex flex-wrap gap-x-4 text-11">
      {entries.map(({ key, look, text }) => (
        <li key={key} className="flex items-center gap-1.5 whitespace-nowrap">
          <Swatch look={look} />
          {text}
        </li>
      ))}
    </ul>
  );
}
