import { useMutation } from '@tanstack/react-query';
import { session, type SignUpRequest } from '#shared/contracts/session.ts';
import { callApi } from '../../../lib/call-api.ts';
import { useEnterSession } from '../use-enter-session.ts';

const signUp = (body: SignUpRequest) => callApi({ method: 'POST', path: '/api/sign-up', body, answer: session });

export function useSignUp() {
  const onSuccess = useEnterSession();
  return useMutation({ mutationFn: signUp, onSuccess });
}
