import { useMutation } from '@tanstack/react-query';
import { session, type SignInRequest } from '#shared/contracts/session.ts';
import { callApi } from '../../../lib/call-api.ts';
import { useEnterSession } from '../use-enter-session.ts';

const signIn = (body: SignInRequest) => callApi({ method: 'POST', path: '/api/sign-in', body, answer: session });

export function useSignIn() {
  const onSuccess = useEnterSession();
  return useMutation({ mutationFn: signIn, onSuccess });
}
