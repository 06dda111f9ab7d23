import { queryOptions, useQuery } from '@tanstack/react-query';
import { frame } from '#shared/contracts/frames.ts';
import { callApi } from '../../../lib/call-api.ts';

export const frameQuery = (frameId: string) =>
  queryOptions({
    queryKey: ['frames', frameId],
    queryFn: ({ signal }) => callApi({ path: `/api/frames/${encodeURIComponent(frameId)}`, answer: frame, signal }),
  });

/** A frame: its draft and the list of its revisions. */
export const useFrame = (frameId: string) => useQuery(frameQuery(frameId));
