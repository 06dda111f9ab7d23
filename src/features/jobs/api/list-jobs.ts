import { queryOptions, useQuery } from '@tanstack/react-query';
import { jobList } from '#shared/contracts/jobs.ts';
import { callApi } from '../../../lib/call-api.ts';

export const jobsQuery = queryOptions({
  queryKey: ['jobs'],
  queryFn: ({ signal }) => callApi({ path: '/api/jobs', answer: jobList, signal }),
});

export const useJobs = () => useQuery(jobsQuery);
