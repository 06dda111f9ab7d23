import { queryOptions, useQuery } from '@tanstack/react-query';
import { tracing } from '#shared/contracts/tracings.ts';
import { callApi } from '../../../lib/call-api.ts';

export const tracingQuery = (tracingId: string) =>
  queryOptions({
    queryKey: ['tracings', tracingId],
    queryFn: ({ signal }) =>
      callApi({ path: `/api/tracings/${encodeURIComponent(tracingId)}`, answer: tracing, signal }),
  });

/** An uploaded drawing and the frames that came of it. */
export const useTracing = (tracingId: string) => useQuery(tracingQuery(tracingId));
