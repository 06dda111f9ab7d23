import { useMutation, useQueryClient } from '@tanstack/react-query';
import { draftSaved } from '#shared/contracts/frames.ts';
import type { Particulars } from '#shared/kernel/particulars/particulars.ts';
import { isCode } from '../../../lib/api-error.ts';
import { callApi } from '../../../lib/call-api.ts';
import { sayError } from '../../../lib/say-error.ts';
import { asFrameRequest } from '../as-frame-request.ts';

export interface DraftToSave {
  readonly frameId: string;
  /** The one it started from. */
  readonly version: number;
  readonly particulars: Particulars;
}

/** What became of one draft. 'left': the person stopped before its turn. */
export type DraftOutcome =
  | { readonly frameId: string; readonly became: 'saved' | 'stale' | 'left' }
  | { readonly frameId: string; readonly became: 'refused'; readonly why: string };

interface SaveDrafts {
  readonly drafts: readonly DraftToSave[];
  /** Asked before each draft: true leaves it and all after it. */
  readonly stopped: () => boolean;
  readonly onOutcome: (outcome: DraftOutcome) => void;
}

async function saveDraft({ frameId, version, particulars }: DraftToSave): Promise<DraftOutcome> {
  try {
    const body = { version, ...asFrameRequest(particulars) };
    await callApi({
      method: 'PUT',
      path: `/api/frames/${encodeURIComponent(frameId)}/draft`,
      body,
      answer: draftSaved,
    });
    return { frameId, became: 'saved' };
  } catch (error) {
    // The session has ended: no other draft would be saved either, and the page asks to sign in again.
    if (isCode(error, 'not-signed-in')) throw error;
    return isCode(error, 'stale-draft')
      ? { frameId, became: 'stale' }
      : { frameId, became: 'refused', why: sayError(error) };
  }
}

/** Saves drafts one after the other, each with the version it started from; one that fails does not hold up the others. */
export function useSaveDrafts() {
  const client = useQueryClient();
  return useMutation({
    mutationFn: async ({ drafts, stopped, onOutcome }: SaveDrafts) => {
      for (const draft of drafts)
        onOutcome(stopped() ? { frameId: draft.frameId, became: 'left' } : await saveDraft(draft));
    },
    networkMode: 'always',
    onSettled: (_data, _error, { drafts }) => {
      for (const queryKey of [['jobs'], ...drafts.map(({ frameId }) => ['frames', frameId])])
        void client.invalidateQueries({ queryKey });
    },
  });
}
