import { useNavigate } from 'react-router';
import type { Unit } from '#shared/kernel/units/unit.ts';
import { sayError } from '../../lib/say-error.ts';
import { Button } from '../../ui/button.tsx';
import { Empty } from '../../ui/empty.tsx';
import { Notice } from '../../ui/notice.tsx';
import { useCreateSampleJob } from './api/create-sample-job.ts';
import { NewJob } from './new-job.tsx';

interface NoJobsProps {
  readonly mayEdit: boolean;
  /** Unit of the sample. */
  readonly unit: Unit;
}

/** In place of an empty list of jobs. */
export function NoJobs({ mayEdit, unit }: NoJobsProps) {
  const sample = useCreateSampleJob();
  const navigate = useNavigate();
  if (!mayEdit) return <Empty title="No jobs yet">A designer or the owner of the shop creates the first one.</Empty>;
  return (
    <>
      {sample.isError && (
        <Notice level="stop" word="No sample" live>
          {sayError(sample.error)}
        </Notice>
      )}
      <Empty
        title="No jobs yet"
        actions={
          <>
            <NewJob />
            <Button
              busy={sample.isPending ? 'Creating the sample' : ''}
              onClick={() => sample.mutate(unit, { onSuccess: (job) => void navigate(`/jobs/${job.id}`) })}
            >
              Begin with a sample
            </Button>
          </>
        }
      >
        A job is one customer's work: a list of face frames. Create one and put frames in it, or begin with a sample job
        that holds a two-door base frame.
      </Empty>
    </>
  );
}
