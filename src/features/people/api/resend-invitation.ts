import { useMutation, useQueryClient } from '@tanstack/react-query';
import { invitation } from '#shared/contracts/people.ts';
import { callApi } from '../../../lib/call-api.ts';
import { peopleQuery } from './list-people.ts';

const resendInvitation = (id: string) =>
  callApi({ method: 'POST', path: `/api/invitations/${encodeURIComponent(id)}/resend`, answer: invitation });

export function useResendInvitation() {
  const client = useQueryClient();
  return useMutation({
    mutationFn: resendInvitation,
    onSettled: () => client.invalidateQueries({ queryKey: peopleQuery.queryKey }),
  });
}
