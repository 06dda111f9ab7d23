import { queryOptions, useQuery } from '@tanstack/react-query';
import { revisionPage } from '#shared/contracts/frames.ts';
import { callApi } from '../../../lib/call-api.ts';

const revisionQuery = (frameId: string, letter: string) =>
  queryOptions({
    queryKey: ['frames', frameId, 'revisions', letter],
    queryFn: ({ signal }) =>
      callApi({
        path: `/api/frames/${encodeURIComponent(frameId)}/revisions/${encodeURIComponent(letter)}`,
        answer: revisionPage,
        signal,
      }),
    // A released revision never changes.
    staleTime: Number.POSITIVE_INFINITY,
  });

/** One frozen revision of a frame. */
export const useRevision = (frameId: string, letter: string) => useQuery(revisionQuery(frameId, letter));
