import { useMutation, useQueryClient } from '@tanstack/react-query';
import { storedEdgePreset, type EdgePresetInput } from '#shared/contracts/edge-presets.ts';
import { callApi } from '../../../lib/call-api.ts';

const saveEdgePreset = (body: EdgePresetInput) =>
  callApi({ method: 'POST', path: '/api/edge-presets', body, answer: storedEdgePreset });

export function useSaveEdgePreset() {
  const client = useQueryClient();
  return useMutation({
    mutationFn: saveEdgePreset,
    onSuccess: () => client.invalidateQueries({ queryKey: ['edge-presets'] }),
  });
}
