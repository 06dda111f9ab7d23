import { useMutation, useQueryClient } from '@tanstack/react-query';
import type { PersonChange } from '#shared/contracts/people.ts';
import { callApi } from '../../../lib/call-api.ts';
import { peopleQuery } from './list-people.ts';

const changePerson = ({ id, change }: { readonly id: string; readonly change: PersonChange }) =>
  callApi({ method: 'PATCH', path: `/api/people/${encodeURIComponent(id)}`, body: change });

/** Another role, or access taken away or given back. */
export function useChangePerson() {
  const client = useQueryClient();
  return useMutation({
    mutationFn: changePerson,
    onSuccess: () => client.invalidateQueries({ queryKey: peopleQuery.queryKey }),
  });
}
