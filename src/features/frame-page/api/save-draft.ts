import { useMutation } from '@tanstack/react-query';
import { draftSaved, type DraftRequest } from '#shared/contracts/frames.ts';
import { callApi } from '../../../lib/call-api.ts';

interface SaveDraft extends DraftRequest {
  readonly frameId: string;
  /** The save may outlive the page: browsers then take at most 64 KiB. */
  readonly keepalive?: boolean;
}

const saveDraft = ({ frameId, keepalive, ...body }: SaveDraft) =>
  callApi({
    method: 'PUT',
    path: `/api/frames/${encodeURIComponent(frameId)}/draft`,
    body,
    answer: draftSaved,
    keepalive,
  });

/** Saves the draft that started from `version`. Fails with 'stale-draft' when somebody else saved meanwhile. */
export const useSaveDraft = () =>
  // Without a connection it fails at once and says so, in place of waiting unseen.
  useMutation({ mutationFn: saveDraft, networkMode: 'always' });
