import { useState } from 'react';
import type { Job } from '#shared/contracts/jobs.ts';
import { Button } from '../../ui/button.tsx';
import { useChangeJob } from './api/change-job.ts';
import { NameDialog } from './name-dialog.tsx';

export function RenameJob({ job }: { readonly job: Job }) {
  const [open, setOpen] = useState(false);
  const change = useChangeJob();
  const close = () => {
    setOpen(false);
    change.reset();
  };
  return (
    <>
      <Button kind="quiet" onClick={() => setOpen(true)}>
        Rename
      </Button>
      {open && (
        <NameDialog
          title={`Rename ${job.name}`}
          action="Rename"
          working="Renaming"
          name={job.name}
          hint="Revisions released already keep their files; new downloads carry the new name."
          busy={change.isPending}
          error={change.error}
          onName={(name) => change.mutate({ jobId: job.id, change: { name } }, { onSuccess: close })}
          onClose={close}
        />
      )}
    </>
  );
}
