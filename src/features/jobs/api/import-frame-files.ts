import { useMutation, useQueryClient } from '@tanstack/react-query';
import { frameFilesTaken } from '#shared/contracts/frames.ts';
import { callApi } from '../../../lib/call-api.ts';

interface ImportCall {
  readonly jobId: string;
  readonly files: readonly File[];
  readonly signal: AbortSignal;
}

function importFrameFiles({ jobId, files, signal }: ImportCall) {
  const body = new FormData();
  for (const file of files) body.append('files', file, file.name);
  return callApi({
    method: 'POST',
    path: `/api/jobs/${encodeURIComponent(jobId)}/frame-files`,
    body,
    answer: frameFilesTaken,
    signal,
  });
}

/** Sends frame files; each is taken whole or refused with what is wrong in it. */
export function useImportFrameFiles() {
  const client = useQueryClient();
  return useMutation({
    mutationFn: importFrameFiles,
    onSettled: () => client.invalidateQueries({ queryKey: ['jobs'] }),
  });
}
