import { useMutation } from '@tanstack/react-query';
import { frame, type ReleaseRequest } from '#shared/contracts/frames.ts';
import { callApi } from '../../../lib/call-api.ts';

interface Release extends ReleaseRequest {
  readonly frameId: string;
}

const releaseRevision = ({ frameId, ...body }: Release) =>
  callApi({ method: 'POST', path: `/api/frames/${encodeURIComponent(frameId)}/revisions`, body, answer: frame });

/** Freezes the draft under the next letter; answers the frame with its new revision. */
export const useReleaseRevision = () => useMutation({ mutationFn: releaseRevision });
