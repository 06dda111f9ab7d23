import { useMutation, useQueryClient } from '@tanstack/react-query';
import type { StoredCutter } from '#shared/contracts/cutters.ts';
import { draftSaved, frame, type DraftRequest } from '#shared/contracts/frames.ts';
import { refreshCutters } from '#shared/kernel/cutter-drawer/refresh-cutters.ts';
import { refsByNumbers } from '#shared/kernel/cutter-drawer/refs-by-numbers.ts';
import { callApi } from '../../../lib/call-api.ts';

interface UpdateDraft {
  readonly frameId: string;
  /** The cutter as the draft carries it. */
  readonly before: StoredCutter;
  readonly after: StoredCutter;
}

/** Saves the draft as it is now with fresh copies of the cutter. False when it no longer carries the old numbers. */
async function updateDraft({ frameId, before, after }: UpdateDraft): Promise<boolean> {
  const path = `/api/frames/${encodeURIComponent(frameId)}`;
  const { particulars, version } = await callApi({ path, answer: frame });
  const fresh = refreshCutters(particulars, refsByNumbers(particulars, [before]), [after]);
  if (fresh === particulars) return false;
  const body = { version, particulars: fresh as DraftRequest['particulars'] };
  await callApi({ method: 'PUT', path: `${path}/draft`, body, answer: draftSaved });
  return true;
}

export function useUpdateDraft() {
  const client = useQueryClient();
  return useMutation({
    mutationFn: updateDraft,
    onSuccess: (_saved, { frameId }) =>
      Promise.all([
        client.invalidateQueries({ queryKey: ['frames', frameId] }),
        client.invalidateQueries({ queryKey: ['jobs'] }),
      ]),
  });
}
