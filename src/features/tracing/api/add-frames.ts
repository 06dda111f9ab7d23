import { useMutation, useQueryClient } from '@tanstack/react-query';
import { tracedFramesAdded, type TracedFramesRequest } from '#shared/contracts/tracings.ts';
import { callApi } from '../../../lib/call-api.ts';

const addFrames = ({ tracingId, ...body }: TracedFramesRequest & { tracingId: string }) =>
  callApi({
    method: 'POST',
    path: `/api/tracings/${encodeURIComponent(tracingId)}/frames`,
    body,
    answer: tracedFramesAdded,
  });

/** Adds a frame for each perimeter of a drawing, all or none. */
export function useAddFrames() {
  const client = useQueryClient();
  return useMutation({
    mutationFn: addFrames,
    onSuccess: (_, { tracingId }) =>
      Promise.all([
        client.invalidateQueries({ queryKey: ['jobs'] }),
        client.invalidateQueries({ queryKey: ['tracings', tracingId], exact: true }),
      ]),
  });
}
