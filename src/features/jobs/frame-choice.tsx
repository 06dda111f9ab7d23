import { useState } from 'react';
import type { FrameRow } from '#shared/contracts/jobs.ts';
import type { Unit } from '#shared/kernel/units/unit.ts';
import { Button } from '../../ui/button.tsx';
import { plural } from '../../ui/plural.ts';
import { ChangeMemberDialog } from './change-member-dialog.tsx';

interface FrameChoiceProps {
  readonly frames: readonly FrameRow[];
  readonly chosen: ReadonlySet<string>;
  readonly onChosen: (chosen: ReadonlySet<string>) => void;
}

/** Above the frames: how many are chosen, and what can be done with them. */
export function FrameChoice({ frames, chosen, onChosen }: FrameChoiceProps) {
  // Those chosen when it was opened: the list behind it may change meanwhile.
  const [changing, setChanging] = useState<{ ids: readonly string[]; unit: Unit } | null>(null);
  const rows = frames.filter(({ id }) => chosen.has(id));
  const first = rows[0];
  return (
    <div className="mb-2 flex flex-wrap items-baseline gap-x-4 gap-y-1 text-12 print:hidden">
      <span role="status">{first ? `${plural(rows.length, 'frame')} chosen` : 'No frame chosen'}</span>
      {rows.length < frames.length && (
        <Button kind="quiet" onClick={() => onChosen(new Set(frames.map(({ id }) => id)))}>
          Choose all
        </Button>
      )}
      {first && (
        <>
          <Button kind="quiet" onClick={() => onChosen(new Set())}>
            Choose none
          </Button>
          <Button kind="quiet" onClick={() => setChanging({ ids: rows.map(({ id }) => id), unit: first.unit })}>
            Change a member
          </Button>
        </>
      )}
      {changing && (
        <ChangeMemberDialog frameIds={changing.ids} unit={changing.unit} onClose={() => setChanging(null)} />
      )}
    </div>
  );
}
