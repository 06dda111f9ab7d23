import { useMutation, useQueryClient } from '@tanstack/react-query';
import { callApi } from '../../../lib/call-api.ts';

const deleteProfile = (profileId: string) =>
  callApi({ method: 'DELETE', path: `/api/profiles/${encodeURIComponent(profileId)}` });

export function useDeleteProfile() {
  const client = useQueryClient();
  return useMutation({
    mutationFn: deleteProfile,
    onSuccess: () => client.invalidateQueries({ queryKey: ['profiles'] }),
  });
}
