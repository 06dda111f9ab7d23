import { sayError } from '../../lib/say-error.ts';
import { Button } from '../../ui/button.tsx';
import { Notice } from '../../ui/notice.tsx';
import { plural } from '../../ui/plural.ts';
import { ProgressText } from '../../ui/progress-text.tsx';
import type { DraftOutcome, useSaveDrafts } from './api/save-drafts.ts';

interface SavingDraftsProps {
  readonly save: ReturnType<typeof useSaveDrafts>;
  /** How many there are to save. */
  readonly drafts: number;
  /** So far. */
  readonly outcomes: readonly DraftOutcome[];
  readonly onStop: () => void;
}

/** How far the saving of many drafts is, and how it ended. */
export function SavingDrafts({ save, drafts, outcomes, onStop }: SavingDraftsProps) {
  const count = (became: DraftOutcome['became']) => outcomes.filter((outcome) => outcome.became === became).length;
  const left = count('left');
  return (
    <>
      {save.isPending && (
        <ProgressText
          done={outcomes.length / drafts}
          cancel={
            <Button kind="quiet" onClick={onStop}>
              Stop after this one
            </Button>
          }
        >
          {`Saving: ${outcomes.length} of ${drafts} done.`}
        </ProgressText>
      )}
      {save.isError && (
        <Notice level="stop" word="Stopped" live>
          {sayError(save.error)} Only frames that say “saved” below are changed.
        </Notice>
      )}
      {save.isSuccess && (
        <p role="status" className="mb-2 font-bold">
          {`${plural(count('saved'), 'frame')} saved, ${count('stale')} stale, ${count('refused')} refused${left > 0 ? `, ${left} left` : ''}.`}
        </p>
      )}
    </>
  );
}
