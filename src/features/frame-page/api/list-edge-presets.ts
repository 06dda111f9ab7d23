import { queryOptions, useQuery } from '@tanstack/react-query';
import { edgePresetList } from '#shared/contracts/edge-presets.ts';
import { callApi } from '../../../lib/call-api.ts';

const edgePresetsQuery = queryOptions({
  queryKey: ['edge-presets'],
  queryFn: async ({ signal }) => (await callApi({ path: '/api/edge-presets', answer: edgePresetList, signal })).presets,
});

/** Edges that the shop saved, by name. */
export const useEdgePresets = () => useQuery(edgePresetsQuery);
