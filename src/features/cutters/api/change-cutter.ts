import { useMutation, useQueryClient } from '@tanstack/react-query';
import { cutterChanged, type DrawerEntryInput } from '#shared/contracts/cutters.ts';
import { callApi } from '../../../lib/call-api.ts';

const changeCutter = ({ cutterId, entry }: { cutterId: string; entry: DrawerEntryInput }) =>
  callApi({ method: 'PUT', path: `/api/cutters/${encodeURIComponent(cutterId)}`, body: entry, answer: cutterChanged });

/** Answers what was changed, and the drafts that carry the numbers as they were. */
export function useChangeCutter() {
  const client = useQueryClient();
  return useMutation({
    mutationFn: changeCutter,
    onSuccess: () => client.invalidateQueries({ queryKey: ['cutters'] }),
  });
}
