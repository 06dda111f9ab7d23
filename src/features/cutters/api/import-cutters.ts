import { useMutation, useQueryClient } from '@tanstack/react-query';
import { cuttersRead } from '#shared/contracts/cutters.ts';
import { callApi } from '../../../lib/call-api.ts';

function importCutters({ file, take }: { file: File; take: boolean }) {
  const body = new FormData();
  body.append('file', file, file.name);
  return callApi({
    method: 'POST',
    path: `/api/cutters/csv${take ? '?take=true' : ''}`,
    body,
    answer: cuttersRead,
  });
}

/** Sends a CSV file: to hear what each row is to the drawer, or with `take` to put in and change what is good in it. */
export function useImportCutters() {
  const client = useQueryClient();
  return useMutation({
    mutationFn: importCutters,
    onSuccess: (_answer, { take }) => (take ? client.invalidateQueries({ queryKey: ['cutters'] }) : undefined),
  });
}
