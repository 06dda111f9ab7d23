import { useMutation, useQueryClient } from '@tanstack/react-query';
import { frameTableAdded, type FrameTableRequest } from '#shared/contracts/frame-table.ts';
import { callApi } from '../../../lib/call-api.ts';

const addFrameTable = ({ jobId, ...body }: FrameTableRequest & { readonly jobId: string }) =>
  callApi({
    method: 'POST',
    path: `/api/jobs/${encodeURIComponent(jobId)}/frame-table`,
    body,
    answer: frameTableAdded,
  });

/** Adds the frames of a table to a job, all or none. */
export function useAddFrameTable() {
  const client = useQueryClient();
  return useMutation({
    mutationFn: addFrameTable,
    onSuccess: () => client.invalidateQueries({ queryKey: ['jobs'] }),
  });
}
