import { useState } from 'react';
import type { LoopRole } from '#shared/kernel/tracing/frames/loop-role.ts';
import type { Unit } from '#shared/kernel/units/unit.ts';
import { Button } from '../../ui/button.tsx';
import { plural } from '../../ui/plural.ts';
import { Section } from '../../ui/section.tsx';
import { Select } from '../../ui/select.tsx';
import { saySize } from './drawing-size.ts';
import { sizeOf, type DrawnLoop } from './model/loop-contours.ts';
import { loopName, ROLE_OPTIONS } from './model/words.ts';

interface LoopsSectionProps {
  readonly loops: readonly DrawnLoop[];
  readonly roles: readonly LoopRole[];
  readonly unit: Unit;
  readonly chosen: ReadonlySet<number>;
  readonly onChosen: (chosen: ReadonlySet<number>) => void;
  readonly mayEdit: boolean;
  readonly onRole: (loops: readonly number[], role: LoopRole) => void;
}

/** Rows in sight at once: thousands of fields would hold up each keystroke. */
const PAGE = 50;

const KIND_WORDS: Record<DrawnLoop['kind'], string> = {
  alone: '',
  cell: 'shares a line with its neighbour',
  outline: 'round several that touch',
};

/** Every loop with its size and role; several can be chosen and given a role at once. */
export function LoopsSection({ loops, roles, unit, chosen, onChosen, mayEdit, onRole }: LoopsSectionProps) {
  const [from, setFrom] = useState(0);
  const [followed, setFollowed] = useState(chosen);
  // What is picked on the drawing comes into sight here.
  if (followed !== chosen) {
    setFollowed(chosen);
    const [first] = chosen;
    if (chosen.size === 1 && first !== undefined && (first < from || first >= from + PAGE))
      setFrom(first - (first % PAGE));
  }
  const start = from < loops.length ? from : 0;
  const places = Array.from({ length: Math.min(PAGE, loops.length - start) }, (_, k) => start + k);
  const choose = (i: number, on: boolean) => {
    const next = new Set(chosen);
    if (on) next.add(i);
    else next.delete(i);
    onChosen(next);
  };
  return (
    <Section heading="Loops" aside={String(loops.length)}>
      {loops.length === 0 && <p className="text-pencil">No line of this drawing closes to a loop.</p>}
      {loops.length > 1 && (
        <p className="mb-1 flex flex-wrap gap-x-4 text-12">
          <Button kind="quiet" onClick={() => onChosen(new Set(loops.keys()))}>
            Choose all
          </Button>
          <Button kind="quiet" disabled={chosen.size === 0} onClick={() => onChosen(new Set())}>
            Choose none
          </Button>
        </p>
      )}
      <ol aria-label="Loops" start={start + 1}>
        {places.map((i) => {
          const { width, height } = sizeOf(loops[i]!.extents);
          return (
            <li
              key={i}
              className={`flex items-center gap-2 border-b border-rule py-0.5 text-12 ${chosen.has(i) ? 'bg-board-light' : ''}`}
            >
              <label className="flex min-h-6 min-w-0 flex-1 items-center gap-2">
                <input
                  type="checkbox"
                  checked={chosen.has(i)}
                  onChange={(event) => choose(i, event.target.checked)}
                  className="size-4 shrink-0 accent-ink"
                />
                <span className="min-w-0">
                  {loopName(i)} <span className="text-pencil">{saySize(width, height, unit)}</span>
                  {KIND_WORDS[loops[i]!.kind] !== '' && (
                    <span className="block text-11 text-pencil">{KIND_WORDS[loops[i]!.kind]}</span>
                  )}
                </span>
              </label>
              <Select
                label={`${loopName(i)} is`}
                hideLabel
                options={ROLE_OPTIONS}
                value={roles[i]!}
                disabled={!mayEdit}
                onValue={(role) => onRole([i], role)}
              />
            </li>
          );
        })}
      </ol>
      {loops.length > PAGE && (
        <div className="mt-1 flex flex-wrap items-center gap-x-4 text-12">
          <Button kind="quiet" disabled={start === 0} onClick={() => setFrom(Math.max(0, start - PAGE))}>
            Earlier
          </Button>
          <span>
            {start + 1} to {start + places.length} of {plural(loops.length, 'loop')}
          </span>
          <Button kind="quiet" disabled={start + PAGE >= loops.length} onClick={() => setFrom(start + PAGE)}>
            Later
          </Button>
        </div>
      )}
    </Section>
  );
}
