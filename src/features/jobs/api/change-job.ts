import { useMutation, useQueryClient } from '@tanstack/react-query';
import { job, type JobChange } from '#shared/contracts/jobs.ts';
import { callApi } from '../../../lib/call-api.ts';

const changeJob = ({ jobId, change }: { jobId: string; change: JobChange }) =>
  callApi({ method: 'PATCH', path: `/api/jobs/${encodeURIComponent(jobId)}`, body: change, answer: job });

/** Renames a job, puts it away or brings it back. */
export function useChangeJob() {
  const client = useQueryClient();
  return useMutation({ mutationFn: changeJob, onSuccess: () => client.invalidateQueries({ queryKey: ['jobs'] }) });
}
