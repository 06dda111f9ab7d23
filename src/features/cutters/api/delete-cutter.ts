import { useMutation, useQueryClient } from '@tanstack/react-query';
import { cutterChanged } from '#shared/contracts/cutters.ts';
import { callApi } from '../../../lib/call-api.ts';

const deleteCutter = (cutterId: string) =>
  callApi({ method: 'DELETE', path: `/api/cutters/${encodeURIComponent(cutterId)}`, answer: cutterChanged });

export function useDeleteCutter() {
  const client = useQueryClient();
  return useMutation({
    mutationFn: deleteCutter,
    onSuccess: () => client.invalidateQueries({ queryKey: ['cutters'] }),
  });
}
