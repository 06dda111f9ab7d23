import { useMutation } from '@tanstack/react-query';
import { downloadFile } from '../../lib/download-file.ts';
import { sayError } from '../../lib/say-error.ts';
import { Button } from '../../ui/button.tsx';
import { Notice } from '../../ui/notice.tsx';

const fetchTable = (jobId: string) =>
  downloadFile({ path: `/api/jobs/${encodeURIComponent(jobId)}/frames.csv`, signal: new AbortController().signal });

/** Saves the frames of a job as such a table. */
export function ExportTable({ jobId }: { readonly jobId: string }) {
  const fetched = useMutation({ mutationFn: fetchTable });
  return (
    <>
      <Button busy={fetched.isPending ? 'Fetching' : ''} onClick={() => fetched.mutate(jobId)}>
        Download this job’s frames as a table
      </Button>
      {fetched.isSuccess && (
        <p role="status" className="mt-1 text-12 wrap-anywhere">
          Saved as {fetched.data.name}
        </p>
      )}
      {fetched.isError && (
        <Notice level="stop" word="No file" live>
          {sayError(fetched.error)}
        </Notice>
      )}
    </>
  );
}
