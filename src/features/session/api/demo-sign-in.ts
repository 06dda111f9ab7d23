import { useMutation } from '@tanstack/react-query';
import { session, type DemoSignInRequest } from '#shared/contracts/session.ts';
import { callApi } from '../../../lib/call-api.ts';
import { useEnterSession } from '../use-enter-session.ts';

const demoSignIn = (body: DemoSignInRequest) =>
  callApi({ method: 'POST', path: '/api/demo-sign-in', body, answer: session });

export function useDemoSignIn() {
  const onSuccess = useEnterSession();
  return useMutation({ mutationFn: demoSignIn, onSuccess });
}
