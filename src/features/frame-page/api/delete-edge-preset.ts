import { useMutation, useQueryClient } from '@tanstack/react-query';
import { callApi } from '../../../lib/call-api.ts';

const deleteEdgePreset = (presetId: string) =>
  callApi({ method: 'DELETE', path: `/api/edge-presets/${encodeURIComponent(presetId)}` });

export function useDeleteEdgePreset() {
  const client = useQueryClient();
  return useMutation({
    mutationFn: deleteEdgePreset,
    onSuccess: () => client.invalidateQueries({ queryKey: ['edge-presets'] }),
  });
}
