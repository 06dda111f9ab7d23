import { useMutation, useQueryClient } from '@tanstack/react-query';
import { storedCutter, type DrawerEntryInput } from '#shared/contracts/cutters.ts';
import { callApi } from '../../../lib/call-api.ts';

const createCutter = (body: DrawerEntryInput) =>
  callApi({ method: 'POST', path: '/api/cutters', body, answer: storedCutter });

export function useCreateCutter() {
  const client = useQueryClient();
  return useMutation({
    mutationFn: createCutter,
    onSuccess: () => client.invalidateQueries({ queryKey: ['cutters'] }),
  });
}
