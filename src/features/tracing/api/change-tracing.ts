import { useMutation, useQueryClient } from '@tanstack/react-query';
import { tracing } from '#shared/contracts/tracings.ts';
import { callApi } from '../../../lib/call-api.ts';
import { tracingQuery } from './get-tracing.ts';

const changeTracing = ({ tracingId, removed }: { tracingId: string; removed: boolean }) =>
  callApi({
    method: 'PATCH',
    path: `/api/tracings/${encodeURIComponent(tracingId)}`,
    body: { removed },
    answer: tracing,
  });

/** Puts a drawing away or brings it back. */
export function useChangeTracing() {
  const client = useQueryClient();
  return useMutation({
    mutationFn: changeTracing,
    onSuccess: async (changed) => {
      client.setQueryData(tracingQuery(changed.id).queryKey, changed);
      await client.invalidateQueries({ queryKey: ['jobs'] });
    },
  });
}
