import { useMutation, useQueryClient } from '@tanstack/react-query';
import { cuttersTaken } from '#shared/contracts/cutters.ts';
import { callApi } from '../../../lib/call-api.ts';

function importCutters({ file, keepGood }: { file: File; keepGood: boolean }) {
  const body = new FormData();
  body.append('file', file, file.name);
  return callApi({
    method: 'POST',
    path: `/api/cutters/csv${keepGood ? '?keepGood=true' : ''}`,
    body,
    answer: cuttersTaken,
  });
}

/** Sends a CSV file. With a problem in it nothing is taken, unless the good rows are to be kept. */
export function useImportCutters() {
  const client = useQueryClient();
  return useMutation({
    mutationFn: importCutters,
    onSuccess: () => client.invalidateQueries({ queryKey: ['cutters'] }),
  });
}
