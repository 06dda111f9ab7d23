import { useMutation, useQueryClient } from '@tanstack/react-query';
import { job, type JobRequest } from '#shared/contracts/jobs.ts';
import { callApi } from '../../../lib/call-api.ts';

export const createJob = (body: JobRequest) => callApi({ method: 'POST', path: '/api/jobs', body, answer: job });

export function useCreateJob() {
  const client = useQueryClient();
  return useMutation({ mutationFn: createJob, onSuccess: () => client.invalidateQueries({ queryKey: ['jobs'] }) });
}
