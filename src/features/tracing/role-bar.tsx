import type { LoopRole } from '#shared/kernel/tracing/frames/loop-role.ts';
import type { Unit } from '#shared/kernel/units/unit.ts';
import { Button } from '../../ui/button.tsx';
import { plural } from '../../ui/plural.ts';
import { saySize } from './drawing-size.ts';
import { sizeOf, type DrawnLoop } from './model/loop-contours.ts';
import type { Review } from './model/review.ts';
import { loopName, ROLE_OPTIONS, ROLE_WORDS } from './model/words.ts';

interface RoleBarProps {
  readonly review: Review;
  readonly loops: readonly DrawnLoop[];
  readonly unit: Unit;
  readonly chosen: ReadonlySet<number>;
  readonly mayEdit: boolean;
  readonly onRole: (role: LoopRole) => void;
  readonly onUndo: () => void;
  readonly onRedo: () => void;
}

function chosenWords({ roles }: Review, loops: readonly DrawnLoop[], unit: Unit, chosen: ReadonlySet<number>): string {
  const [first] = chosen;
  if (first === undefined) return 'Click a loop to say what it is; click again for the one around it.';
  if (chosen.size > 1) return `${plural(chosen.size, 'loop')} chosen.`;
  const { width, height } = sizeOf(loops[first]!.extents);
  return `${loopName(first)}, ${saySize(width, height, unit)}: ${ROLE_WORDS[roles[first]!].toLowerCase()}.`;
}

/** Over the drawing: what is chosen, what it can be made, and steps back and forth. */
export function RoleBar({ review, loops, unit, chosen, mayEdit, onRole, onUndo, onRedo }: RoleBarProps) {
  const back = review.past.at(-1)?.label;
  const forth = review.future[0]?.label;
  const [first] = chosen;
  const common = first !== undefined && chosen.size === 1 ? review.roles[first] : undefined;
  return (
    <div className="flex min-h-10 flex-wrap items-center gap-x-4 gap-y-1 border-b border-rule px-3 py-1 text-12 print:hidden">
      <span role="status" className="min-w-0 flex-1 basis-60">
        {chosenWords(review, loops, unit, chosen)}
      </span>
      {mayEdit && (
        <>
          <span role="group" aria-label="Make it" className="flex flex-wrap gap-x-3">
            {ROLE_OPTIONS.map(({ value, label }) => (
              <Button
                key={value}
                kind="quiet"
                disabled={chosen.size === 0}
                aria-pressed={common === value}
                onClick={() => onRole(value)}
              >
                {label}
              </Button>
            ))}
          </span>
          <span className="flex gap-x-3">
            <Button
              kind="quiet"
              disabled={back === undefined}
              title={back && `Undo: ${back} (Ctrl+Z)`}
              onClick={onUndo}
            >
              Undo
            </Button>
            <Button
              kind="quiet"
              disabled={forth === undefined}
              title={forth && `Redo: ${forth} (Ctrl+Shift+Z)`}
              onClick={onRedo}
            >
              Redo
            </Button>
          </span>
        </>
      )}
    </div>
  );
}
