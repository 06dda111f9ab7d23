import { useMutation, useQueryClient } from '@tanstack/react-query';
import type { Frame, FrameRequest } from '#shared/contracts/frames.ts';
import { createFrame } from './create-frame.ts';

/** Frames that belong together, one after the other, so that they stand in the job in their order. */
export function useCreateFrames() {
  const client = useQueryClient();
  return useMutation({
    mutationFn: async ({ jobId, frames }: { jobId: string; frames: readonly FrameRequest[] }) => {
      const made: Frame[] = [];
      for (const request of frames) made.push(await createFrame({ jobId, ...request }));
      return made;
    },
    // Not waited for: the list that is fetched may put away the very button whose page goes on after this.
    onSuccess: () => void client.invalidateQueries({ queryKey: ['jobs'] }),
  });
}
