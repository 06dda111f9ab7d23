import { useMutation, useQueryClient } from '@tanstack/react-query';
import { frame, type FrameChange } from '#shared/contracts/frames.ts';
import { callApi } from '../../../lib/call-api.ts';

const changeFrame = ({ frameId, change }: { frameId: string; change: FrameChange }) =>
  callApi({ method: 'PATCH', path: `/api/frames/${encodeURIComponent(frameId)}`, body: change, answer: frame });

/** Puts a frame away or brings it back. */
export function useChangeFrame() {
  const client = useQueryClient();
  return useMutation({ mutationFn: changeFrame, onSuccess: () => client.invalidateQueries({ queryKey: ['jobs'] }) });
}
