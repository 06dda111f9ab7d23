import { useSyncExternalStore } from 'react';
import { Button } from '../../../ui/button.tsx';
import { TitleCell } from '../../../ui/title-block.tsx';
import type { Autosave } from '../model/autosave.ts';
import { useEditor } from '../model/desk.ts';

interface SavingCellProps {
  readonly autosave: Autosave;
  /** False when the browser would not keep a copy of what is not saved. */
  readonly copyKept: boolean;
  /** Opens the choice between two drafts. */
  readonly onChoose: () => void;
}

/** Title block cell: whether the draft is saved, and if not, why. */
export function SavingCell({ autosave, copyKept, onChoose }: SavingCellProps) {
  const state = useSyncExternalStore(autosave.store.subscribe, autosave.store.get);
  const wrong = useEditor((s) => s.wrong.size);
  const detail = wrong === 0 ? undefined : `${wrong} ${wrong === 1 ? 'entry' : 'entries'} not taken`;
  switch (state.kind) {
    case 'saved':
    case 'saving':
      return (
        <TitleCell label="Draft" detail={detail}>
          <span data-saving={state.kind}>{state.kind}</span>
        </TitleCell>
      );
    case 'not-saved':
      return (
        <TitleCell label="Draft" detail={detail}>
          <span role="alert" data-saving={state.kind} className="text-12">
            <strong className="text-stop">not saved:</strong> {state.why}{' '}
            {copyKept ? '' : 'No copy could be kept in this browser: do not close the page.'}
          </span>{' '}
          <Button kind="quiet" onClick={() => void autosave.flush()}>
            {state.retries ? 'Try now' : 'Try again'}
          </Button>
        </TitleCell>
      );
    case 'stale':
      return (
        <TitleCell label="Draft" detail={detail}>
          <span role="alert" data-saving={state.kind} className="text-12">
            <strong className="text-stop">not saved:</strong> {state.stale.changedBy} saved meanwhile.
          </span>{' '}
          <Button kind="quiet" onClick={onChoose}>
            Choose
          </Button>
        </TitleCell>
      );
  }
}
