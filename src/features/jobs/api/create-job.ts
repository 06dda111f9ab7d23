import { useMutation, useQueryClient } from '@tanstack/react-query';
import { job, type JobRequest } from '#shared/contracts/jobs.ts';
import { callApi } from '../../../lib/call-api.ts';

export const createJob = (body: JobRequest) => callApi({ method: 'POST', path: '/api/jobs', body, answer: job });

export function useCreateJob() {
  const client = useQueryClient();
  return useMutation({
    mutationFn: createJob,
    // Not waited for: the list that is fetched may put away the very button whose page goes on after this.
    onSuccess: () => void client.invalidateQueries({ queryKey: ['jobs'] }),
  });
}
