import { useMutation, useQueryClient } from '@tanstack/react-query';
import { tracing } from '#shared/contracts/tracings.ts';
import { uploadFile } from '../../../lib/upload-file.ts';
import { tracingQuery } from './get-tracing.ts';

interface UploadCall {
  readonly jobId: string;
  readonly file: File;
  readonly signal: AbortSignal;
  readonly onSent: (done: number) => void;
}

const uploadDrawing = ({ jobId, ...call }: UploadCall) =>
  uploadFile({ path: `/api/jobs/${encodeURIComponent(jobId)}/tracings`, field: 'file', answer: tracing, ...call });

/** Sends one drawing; the server keeps it as it is and reads it later. */
export function useUploadDrawing() {
  const client = useQueryClient();
  return useMutation({
    mutationFn: uploadDrawing,
    onSuccess: (added) => {
      client.setQueryData(tracingQuery(added.id).queryKey, added);
      // Not waited for: the page goes on to the drawing.
      void client.invalidateQueries({ queryKey: ['jobs'] });
    },
  });
}
