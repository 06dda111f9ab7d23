import { useQuery } from '@tanstack/react-query';
import { joinOffer } from '#shared/contracts/people.ts';
import { callApi } from '../../../lib/call-api.ts';

/** What an invitation's link leads into. Fetched once: joining uses the link up. */
export const useJoinOffer = (token: string) =>
  useQuery({
    queryKey: ['join', token],
    queryFn: ({ signal }) => callApi({ path: `/api/join/${encodeURIComponent(token)}`, answer: joinOffer, signal }),
    staleTime: Infinity,
  });
