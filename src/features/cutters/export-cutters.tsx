import { useMutation } from '@tanstack/react-query';
import { downloadFile } from '../../lib/download-file.ts';
import { sayError } from '../../lib/say-error.ts';
import { Button } from '../../ui/button.tsx';
import { Notice } from '../../ui/notice.tsx';

const fetchCsv = () => downloadFile({ path: '/api/cutters/csv', signal: new AbortController().signal });

/** Saves the whole drawer as a CSV file. */
export function ExportCutters() {
  const fetched = useMutation({ mutationFn: fetchCsv });
  return (
    <>
      <Button busy={fetched.isPending ? 'Fetching' : ''} onClick={() => fetched.mutate()}>
        Export as CSV
      </Button>
      {fetched.isError && (
        <Notice level="stop" word="No file" live>
          {sayError(fetched.error)}
        </Notice>
      )}
    </>
  );
}
