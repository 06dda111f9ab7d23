import type { JobList } from '#shared/contracts/jobs.ts';
import { Button } from '../../ui/button.tsx';
import { plural } from '../../ui/plural.ts';

interface PutAwayJobsProps {
  readonly jobs: JobList['jobs'];
  readonly onBringBack: (jobId: string) => void;
}

/** Jobs that were put away, folded under the list. */
export function PutAwayJobs({ jobs, onBringBack }: PutAwayJobsProps) {
  if (jobs.length === 0) return null;
  return (
    <details className="mt-6 print:hidden">
      <summary className="inline-block min-h-6">{plural(jobs.length, 'job')} put away</summary>
      <ul className="mt-2 max-w-xl">
        {jobs.map((job) => (
          <li key={job.id} className="flex items-baseline justify-between gap-4 border-b border-rule py-1">
            <span className="wrap-anywhere">{job.name}</span>
            <Button kind="quiet" aria-label={`Bring back ${job.name}`} onClick={() => onBringBack(job.id)}>
              Bring back
            </Button>
          </li>
        ))}
      </ul>
    </details>
  );
}
