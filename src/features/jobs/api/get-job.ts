import { queryOptions, useQuery } from '@tanstack/react-query';
import { jobPage } from '#shared/contracts/jobs.ts';
import { callApi } from '../../../lib/call-api.ts';

export const jobQuery = (jobId: string) =>
  queryOptions({
    queryKey: ['jobs', jobId],
    queryFn: ({ signal }) => callApi({ path: `/api/jobs/${encodeURIComponent(jobId)}`, answer: jobPage, signal }),
  });

/** A job and its frames. */
export const useJob = (jobId: string) => useQuery(jobQuery(jobId));
