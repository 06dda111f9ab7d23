import { useNavigate, useParams } from 'react-router';
import { useAddFrameTable } from '../../features/frame-table/api/add-frame-table.ts';
import { FrameTablePage } from '../../features/frame-table/frame-table-page.tsx';
import { useJob } from '../../features/jobs/api/get-job.ts';
import { useSignedIn } from '../../features/session/signed-in.tsx';
import { Fetched } from '../../ui/fetched.tsx';
import { Sheet } from '../../ui/sheet.tsx';

/** /jobs/:jobId/table */
export function FrameTableRoute() {
  const { jobId = '' } = useParams();
  const { shop, mayDo } = useSignedIn();
  const query = useJob(jobId);
  const add = useAddFrameTable();
  const navigate = useNavigate();
  if (query.data === undefined) {
    return (
      <Sheet title="Frames from a table">
        <Fetched query={query} what="the job">
          {() => null}
        </Fetched>
      </Sheet>
    );
  }
  return (
    <FrameTablePage
      shopName={shop.name}
      unit={shop.unit}
      job={query.data.job}
      names={query.data.frames.map(({ name }) => name)}
      mayEdit={mayDo('edit-frames')}
      busy={add.isPending}
      error={add.error}
      onAdd={(frames) => add.mutate({ jobId, frames }, { onSuccess: () => void navigate(`/jobs/${jobId}`) })}
      onReset={() => add.reset()}
    />
  );
}
