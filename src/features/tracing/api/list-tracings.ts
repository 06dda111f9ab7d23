import { useQuery } from '@tanstack/react-query';
import { tracingList } from '#shared/contracts/tracings.ts';
import { callApi } from '../../../lib/call-api.ts';

/** Drawings of a job that are not put away, newest first. */
export const useTracings = (jobId: string) =>
  useQuery({
    queryKey: ['jobs', jobId, 'tracings'],
    queryFn: async ({ signal }) => {
      const path = `/api/jobs/${encodeURIComponent(jobId)}/tracings`;
      return (await callApi({ path, answer: tracingList, signal })).tracings;
    },
  });
