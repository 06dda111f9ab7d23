import { useQuery } from '@tanstack/react-query';
import { frame, type Frame } from '#shared/contracts/frames.ts';
import { callApi } from '../../../lib/call-api.ts';

/**
 * The drafts of some frames as they are now, in the order given: never kept, since what is changed must start from the
 * newest version. Fetched once; fetching again in the background would change what somebody is looking at.
 */
export const useFrames = (frameIds: readonly string[]) =>
  useQuery({
    queryKey: ['drafts-to-change', frameIds],
    queryFn: async ({ signal }): Promise<Frame[]> => {
      const frames: Frame[] = [];
      for (const id of frameIds)
        frames.push(await callApi({ path: `/api/frames/${encodeURIComponent(id)}`, answer: frame, signal }));
      return frames;
    },
    gcTime: 0,
    staleTime: Infinity,
    refetchOnWindowFocus: false,
  });
