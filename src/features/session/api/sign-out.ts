import { useMutation, useQueryClient } from '@tanstack/react-query';
import { callApi } from '../../../lib/call-api.ts';

const signOut = () => callApi({ method: 'POST', path: '/api/sign-out' });

/** Signs out and forgets all that was fetched. `onDone` runs before, so that the page can step away first. */
export function useSignOut(onDone: () => void) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: signOut,
    onSuccess: () => {
      onDone();
      client.clear();
    },
  });
}
