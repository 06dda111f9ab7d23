import { useNavigate, useParams } from 'react-router';
import { BoxPage } from '../../features/box/box-page.tsx';
import { useCreateFrames } from '../../features/jobs/api/create-frames.ts';
import { useJob } from '../../features/jobs/api/get-job.ts';
import { asFrameRequest } from '../../features/jobs/as-frame-request.ts';
import { useSignedIn } from '../../features/session/signed-in.tsx';
import { Fetched } from '../../ui/fetched.tsx';
import { Sheet } from '../../ui/sheet.tsx';

/** /jobs/:jobId/box */
export function BoxRoute() {
  const { jobId = '' } = useParams();
  const { shop, mayDo } = useSignedIn();
  const query = useJob(jobId);
  const create = useCreateFrames();
  const navigate = useNavigate();
  if (query.data === undefined) {
    return (
      <Sheet title="Frame from a box">
        <Fetched query={query} what="the job">
          {() => null}
        </Fetched>
      </Sheet>
    );
  }
  return (
    <BoxPage
      shopName={shop.name}
      job={query.data.job}
      unit={shop.unit}
      mayEdit={mayDo('edit-frames')}
      busy={create.isPending}
      error={create.error}
      onCreate={(particulars) =>
        create.mutate(
          { jobId, frames: [asFrameRequest(particulars)] },
          { onSuccess: ([made]) => void navigate(made ? `/frames/${made.id}` : `/jobs/${jobId}`) },
        )
      }
    />
  );
}
