import { useMutation, useQueryClient } from '@tanstack/react-query';
import { storedProfile } from '#shared/contracts/profiles.ts';
import type { FileProfile } from '#shared/kernel/profiles/file-profile.ts';
import { callApi } from '../../../lib/call-api.ts';

const createProfile = (body: FileProfile) =>
  callApi({ method: 'POST', path: '/api/profiles', body, answer: storedProfile });

export function useCreateProfile() {
  const client = useQueryClient();
  return useMutation({
    mutationFn: createProfile,
    onSuccess: () => client.invalidateQueries({ queryKey: ['profiles'] }),
  });
}
