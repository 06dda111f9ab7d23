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
    // Not waited for: the list that is fetched may put away the very button whose page goes on after this.
    onSuccess: () => void client.invalidateQueries({ queryKey: ['jobs'] }),
  });
}
