import { useState } from 'react';
import { useNavigate } from 'react-router';
import { Button } from '../../ui/button.tsx';
import { useCreateJob } from './api/create-job.ts';
import { NameDialog } from './name-dialog.tsx';

/** The button and its dialog; ends on the new job's page. */
export function NewJob({ wide = false }: { readonly wide?: boolean }) {
  const [open, setOpen] = useState(false);
  const create = useCreateJob();
  const navigate = useNavigate();
  return (
    <>
      <Button kind="main" wide={wide} onClick={() => setOpen(true)}>
        New job
      </Button>
      {open && (
        <NameDialog
          title="New job"
          action="Create the job"
          working="Creating"
          hint="One customer's work, such as a street or a family name."
          busy={create.isPending}
          error={create.error}
          onName={(name) => create.mutate({ name }, { onSuccess: (job) => void navigate(`/jobs/${job.id}`) })}
          onClose={() => {
            setOpen(false);
            create.reset();
          }}
        />
      )}
    </>
  );
}
