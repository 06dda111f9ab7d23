import { useMutation, useQueryClient } from '@tanstack/react-query';
import { newFrame } from '#shared/kernel/particulars/new-frame.ts';
import type { Unit } from '#shared/kernel/units/unit.ts';
import { asFrameRequest } from '../as-frame-request.ts';
import { createFrame } from './create-frame.ts';
import { createJob } from './create-job.ts';

async function createSampleJob(unit: Unit) {
  const job = await createJob({ name: 'Sample kitchen' });
  await createFrame({ jobId: job.id, ...asFrameRequest(newFrame(unit, 'Two-door base')) });
  return job;
}

/** A job with one valid frame in it, to begin from. */
export function useCreateSampleJob() {
  const client = useQueryClient();
  return useMutation({
    mutationFn: createSampleJob,
    // Not waited for: the list that is fetched may put away the very button whose page goes on after this.
    onSettled: () => void client.invalidateQueries({ queryKey: ['jobs'] }),
  });
}
