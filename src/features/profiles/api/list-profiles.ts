import { queryOptions, useQuery } from '@tanstack/react-query';
import { profileList } from '#shared/contracts/profiles.ts';
import { callApi } from '../../../lib/call-api.ts';

export const profilesQuery = queryOptions({
  queryKey: ['profiles'],
  queryFn: async ({ signal }) => (await callApi({ path: '/api/profiles', answer: profileList, signal })).profiles,
});

/** File profiles of the shop, the built-in ones first. */
export const useProfiles = () => useQuery(profilesQuery);
