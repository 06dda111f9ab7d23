import { useMutation, useQueryClient } from '@tanstack/react-query';
import type { ResetPasswordRequest } from '#shared/contracts/session.ts';
import { callApi } from '../../../lib/call-api.ts';
import { sessionQuery } from './get-session.ts';

const resetPassword = (body: ResetPasswordRequest) => callApi({ method: 'POST', path: '/api/reset-password', body });

/** It ends every session of the person, so it may have ended the one of this browser. */
export function useResetPassword() {
  const client = useQueryClient();
  return useMutation({
    mutationFn: resetPassword,
    onSuccess: () => client.invalidateQueries({ queryKey: sessionQuery.queryKey }),
  });
}
