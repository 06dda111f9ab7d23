import { queryOptions, useQuery } from '@tanstack/react-query';
import { cutterList } from '#shared/contracts/cutters.ts';
import { callApi } from '../../../lib/call-api.ts';

export const cuttersQuery = queryOptions({
  queryKey: ['cutters'],
  queryFn: async ({ signal }) => (await callApi({ path: '/api/cutters', answer: cutterList, signal })).cutters,
});

/** The shop's cutter drawer, by name. */
export const useCutters = () => useQuery(cuttersQuery);
