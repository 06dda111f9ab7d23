import { useState } from 'react';
import { Link } from 'react-router';
import type { Tracing } from '#shared/contracts/tracings.ts';
import { sayError } from '../../lib/say-error.ts';
import { Button } from '../../ui/button.tsx';
import { Notice } from '../../ui/notice.tsx';
import { UndoNotice } from '../../ui/undo-notice.tsx';
import { When } from '../../ui/when.tsx';
import { useChangeTracing } from './api/change-tracing.ts';

interface TracingsListProps {
  /** Newest first. */
  readonly tracings: readonly Tracing[];
  readonly mayEdit: boolean;
  /** Where there is little room: only so many, and a link to the page with all of them. */
  readonly most?: { readonly count: number; readonly to: string };
}

const LINK = 'underline decoration-rule underline-offset-4 wrap-anywhere hover:decoration-ink';

/** The drawings of a job and the frames that came of them. */
export function TracingsList({ tracings, mayEdit, most }: TracingsListProps) {
  const [putAway, setPutAway] = useState<{ id: string; fileName: string } | null>(null);
  const change = useChangeTracing();
  const move = (tracing: { id: string; fileName: string }, removed: boolean) =>
    change.mutate(
      { tracingId: tracing.id, removed },
      { onSuccess: () => setPutAway(removed ? { id: tracing.id, fileName: tracing.fileName } : null) },
    );
  return (
    <>
      {change.isError && (
        <Notice level="stop" word="Not done" live>
          {sayError(change.error)}
        </Notice>
      )}
      {putAway && (
        <UndoNotice busy={change.isPending} onUndo={() => move(putAway, false)}>
          {`“${putAway.fileName}” is put away.`}
        </UndoNotice>
      )}
      {tracings.length === 0 && <p className="text-12 text-pencil">None yet.</p>}
      <ul aria-label="Drawings">
        {tracings.slice(0, most?.count).map((tracing) => (
          <li key={tracing.id} className="border-b border-rule py-1.5 text-12">
            <div className="flex items-baseline justify-between gap-3">
              <Link to={`/drawings/${tracing.id}`} className={`inline-block py-0.5 font-bold ${LINK}`}>
                {tracing.fileName}
              </Link>
              {mayEdit && (
                <Button kind="quiet" aria-label={`Put away ${tracing.fileName}`} onClick={() => move(tracing, true)}>
                  Put away
                </Button>
              )}
            </div>
            <p className="text-11 text-pencil">
              {tracing.uploadedBy}, <When iso={tracing.uploadedAt} />
            </p>
            {tracing.frames.length === 0 ? (
              <p className="text-11 text-pencil">No frame came of it yet.</p>
            ) : (
              <ul aria-label={`Frames of ${tracing.fileName}`} className="flex flex-wrap gap-x-3">
                {tracing.frames.map(({ id, name }) => (
                  <li key={id}>
                    <Link to={`/frames/${id}`} className={`inline-block min-h-6 py-0.5 ${LINK}`}>
                      {name}
                    </Link>
                  </li>
                ))}
              </ul>
            )}
          </li>
        ))}
      </ul>
      {most !== undefined && tracings.length > most.count && (
        <p className="mt-1.5 text-12">
          <Link to={most.to} className={`inline-block min-h-6 ${LINK}`}>
            All {tracings.length} drawings
          </Link>
        </p>
      )}
    </>
  );
}
