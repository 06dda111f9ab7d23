import { queryOptions, useQuery } from '@tanstack/react-query';
import { session } from '#shared/contracts/session.ts';
import { callApi } from '../../../lib/call-api.ts';

export const sessionQuery = queryOptions({
  queryKey: ['session'],
  queryFn: ({ signal }) => callApi({ path: '/api/session', answer: session, signal }),
  staleTime: 60_000,
});

/** Who is signed in, and into which shop; `user` is null when nobody is. */
export const useSession = () => useQuery(sessionQuery);
