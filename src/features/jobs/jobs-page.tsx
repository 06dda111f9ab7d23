import { useState } from 'react';
import type { JobList } from '#shared/contracts/jobs.ts';
import type { Unit } from '#shared/kernel/units/unit.ts';
import { sayError } from '../../lib/say-error.ts';
import { Notice } from '../../ui/notice.tsx';
import { UndoNotice } from '../../ui/undo-notice.tsx';
import { useChangeJob } from './api/change-job.ts';
import { JobsTable } from './jobs-table.tsx';
import { NoJobs } from './no-jobs.tsx';
import { PutAwayJobs } from './put-away-jobs.tsx';

interface JobsPageProps {
  readonly jobs: JobList['jobs'];
  readonly mayEdit: boolean;
  readonly unit: Unit;
}

/** The list of jobs, with putting away and its undoing. */
export function JobsPage({ jobs, mayEdit, unit }: JobsPageProps) {
  const [putAway, setPutAway] = useState<{ id: string; name: string } | null>(null);
  const change = useChangeJob();
  const bringBack = (jobId: string) =>
    change.mutate({ jobId, change: { removed: false } }, { onSuccess: () => setPutAway(null) });
  const here = jobs.filter((job) => !job.removed);
  return (
    <>
      {change.isError && (
        <Notice level="stop" word="Not done" live>
          {sayError(change.error)}
        </Notice>
      )}
      {putAway && (
        <UndoNotice busy={change.isPending} onUndo={() => bringBack(putAway.id)}>
          {`“${putAway.name}” is put away.`}
        </UndoNotice>
      )}
      {here.length === 0 ? (
        <NoJobs mayEdit={mayEdit} unit={unit} />
      ) : (
        <JobsTable
          jobs={here}
          onPutAway={
            mayEdit
              ? (job) =>
                  change.mutate(
                    { jobId: job.id, change: { removed: true } },
                    { onSuccess: () => setPutAway({ id: job.id, name: job.name }) },
                  )
              : undefined
          }
        />
      )}
      {mayEdit && (
        <PutAwayJobs jobs={jobs.filter((job) => job.removed && job.id !== putAway?.id)} onBringBack={bringBack} />
      )}
    </>
  );
}
