import { frame, type FrameRequest } from '#shared/contracts/frames.ts';
import { callApi } from '../../../lib/call-api.ts';

export const createFrame = ({ jobId, ...body }: FrameRequest & { jobId: string }) =>
  callApi({ method: 'POST', path: `/api/jobs/${encodeURIComponent(jobId)}/frames`, body, answer: frame });
