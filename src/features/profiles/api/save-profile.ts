import { useMutation, useQueryClient } from '@tanstack/react-query';
import { storedProfile } from '#shared/contracts/profiles.ts';
import type { FileProfile } from '#shared/kernel/profiles/file-profile.ts';
import { callApi } from '../../../lib/call-api.ts';

const saveProfile = ({ profileId, profile }: { profileId: string; profile: FileProfile }) =>
  callApi({
    method: 'PUT',
    path: `/api/profiles/${encodeURIComponent(profileId)}`,
    body: profile,
    answer: storedProfile,
  });

export function useSaveProfile() {
  const client = useQueryClient();
  return useMutation({
    mutationFn: saveProfile,
    onSuccess: () => client.invalidateQueries({ queryKey: ['profiles'] }),
  });
}
