import { useMutation, useQueryClient } from '@tanstack/react-query';
import { callApi } from '../../../lib/call-api.ts';
import { peopleQuery } from './list-people.ts';

const revokeInvitation = (id: string) =>
  callApi({ method: 'DELETE', path: `/api/invitations/${encodeURIComponent(id)}` });

export function useRevokeInvitation() {
  const client = useQueryClient();
  return useMutation({
    mutationFn: revokeInvitation,
    onSettled: () => client.invalidateQueries({ queryKey: peopleQuery.queryKey }),
  });
}
