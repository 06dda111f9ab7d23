import { useMutation, useQueryClient } from '@tanstack/react-query';
import { frame } from '#shared/contracts/frames.ts';
import { callApi } from '../../../lib/call-api.ts';
import { createFrame } from './create-frame.ts';

async function copyFrame({ frameId, name }: { frameId: string; name: string }) {
  const { jobId, particulars } = await callApi({ path: `/api/frames/${encodeURIComponent(frameId)}`, answer: frame });
  return createFrame({ jobId, particulars: { ...particulars, name } });
}

/** A new frame in the same job with another's draft under a new name. */
export function useCopyFrame() {
  const client = useQueryClient();
  return useMutation({ mutationFn: copyFrame, onSuccess: () => client.invalidateQueries({ queryKey: ['jobs'] }) });
}
