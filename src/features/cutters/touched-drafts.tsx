import { useState } from 'react';
import { Link } from 'react-router';
import type { CutterChanged, StoredCutter } from '#shared/contracts/cutters.ts';
import { sayError } from '../../lib/say-error.ts';
import { Button } from '../../ui/button.tsx';
import { Notice } from '../../ui/notice.tsx';
import { plural } from '../../ui/plural.ts';
import { useUpdateDraft } from './api/update-draft.ts';
import { changeWords, ROLE_WORDS } from './cutter-words.ts';

interface TouchedDraftsProps {
  /** The cutter as the drafts carry it. */
  readonly before: StoredCutter;
  readonly answer: CutterChanged;
  readonly mayEditFrames: boolean;
}

type Outcome = 'updated' | 'not needed' | { readonly why: string };

function say(outcome: Outcome): string {
  if (outcome === 'updated') return 'updated';
  return outcome === 'not needed' ? 'no longer carries the old numbers' : `not updated: ${outcome.why}`;
}

/** After a change of a cutter: the drafts that carry its numbers as they were, and the offer to give them the new ones. */
export function TouchedDrafts({ before, answer, mayEditFrames }: TouchedDraftsProps) {
  const { cutter: after, changes, drafts } = answer;
  const update = useUpdateDraft();
  const [outcomes, setOutcomes] = useState<Readonly<Record<string, Outcome>>>({});
  const [working, setWorking] = useState(false);
  if (drafts.length === 0) return null;

  // One after the other, so that each draft that fails is told by name and the others are still saved.
  async function updateAll(fresh: StoredCutter) {
    setWorking(true);
    for (const { frameId } of drafts) {
      if (outcomes[frameId] === 'updated') continue;
      let outcome: Outcome;
      try {
        outcome = (await update.mutateAsync({ frameId, before, after: fresh })) ? 'updated' : 'not needed';
      } catch (error) {
        outcome = { why: sayError(error) };
      }
      setOutcomes((now) => ({ ...now, [frameId]: outcome }));
    }
    setWorking(false);
  }

  const isOpen = drafts.some(({ frameId }) => outcomes[frameId] === undefined || typeof outcomes[frameId] === 'object');
  return (
    <Notice
      level="caution"
      word={after ? `${plural(drafts.length, 'draft')} with the old numbers` : plural(drafts.length, 'draft')}
      live
      action={
        after && mayEditFrames && isOpen ? (
          <Button busy={working ? 'Updating' : ''} onClick={() => void updateAll(after)}>
            Update {plural(drafts.length, 'draft')}
          </Button>
        ) : undefined
      }
    >
      {after
        ? `${before.cutter.name} has changed (${changes.map(changeWords).join(', ')}). These drafts keep their copy of it until they are updated; released revisions always keep theirs.`
        : `These drafts use ${before.cutter.name} and keep their copy of its numbers.`}
      <ul className="mt-1">
        {drafts.map(({ frameId, frameName, jobName, roles }) => (
          <li key={frameId}>
            <Link
              to={`/frames/${frameId}`}
              className="underline decoration-rule underline-offset-4 hover:decoration-ink"
            >
              {frameName}
            </Link>
            , {jobName}: {roles.map((role) => ROLE_WORDS[role]).join(', ')}
            {outcomes[frameId] !== undefined && <strong className="font-bold">, {say(outcomes[frameId])}</strong>}
          </li>
        ))}
      </ul>
    </Notice>
  );
}
