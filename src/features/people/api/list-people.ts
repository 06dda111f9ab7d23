import { queryOptions, useQuery } from '@tanstack/react-query';
import { people } from '#shared/contracts/people.ts';
import { callApi } from '../../../lib/call-api.ts';

export const peopleQuery = queryOptions({
  queryKey: ['people'],
  queryFn: ({ signal }) => callApi({ path: '/api/people', answer: people, signal }),
  // Others join by their links, and the owner looks to see whether they have.
  staleTime: 0,
});

/** People of the shop and open invitations, the oldest first. */
export const usePeople = () => useQuery(peopleQuery);
