import { useMutation, useQueryClient } from '@tanstack/react-query';
import { invitation, type InvitationRequest } from '#shared/contracts/people.ts';
import { callApi } from '../../../lib/call-api.ts';
import { peopleQuery } from './list-people.ts';

const invitePerson = (body: InvitationRequest) =>
  callApi({ method: 'POST', path: '/api/invitations', body, answer: invitation });

export function useInvitePerson() {
  const client = useQueryClient();
  return useMutation({
    mutationFn: invitePerson,
    onSuccess: () => client.invalidateQueries({ queryKey: peopleQuery.queryKey }),
  });
}
