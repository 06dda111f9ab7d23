import { useEffect, useState } from 'react';
import { useNavigate, useParams } from 'react-router';
import type { TracedFramesAdded } from '#shared/contracts/tracings.ts';
import { useJob } from '../../features/jobs/api/get-job.ts';
import { useSignedIn } from '../../features/session/signed-in.tsx';
import { useTracing } from '../../features/tracing/api/get-tracing.ts';
import { useTracings } from '../../features/tracing/api/list-tracings.ts';
import { TracingPage } from '../../features/tracing/tracing-page.tsx';
import { TracingsList } from '../../features/tracing/tracings-list.tsx';
import { UploadPanel } from '../../features/tracing/upload-panel.tsx';
import { Empty } from '../../ui/empty.tsx';
import { ButtonLink } from '../../ui/button-link.tsx';
import { Fetched } from '../../ui/fetched.tsx';
import { plural } from '../../ui/plural.ts';
import { Section } from '../../ui/section.tsx';
import { Sheet } from '../../ui/sheet.tsx';
import { TitleBlock, TitleCell } from '../../ui/title-block.tsx';

/** /jobs/:jobId/drawings */
export function DrawingsRoute() {
  const { jobId = '' } = useParams();
  const { shop, mayDo } = useSignedIn();
  const navigate = useNavigate();
  const job = useJob(jobId);
  const tracings = useTracings(jobId);
  const mayEdit = mayDo('edit-frames');
  const name = job.data?.job.name ?? 'Job';
  return (
    <Sheet
      title="Frames from a drawing"
      crumbs={[{ label: 'Jobs', to: '/jobs' }, { label: name, to: `/jobs/${jobId}` }, { label: 'From a drawing' }]}
      titleBlock={
        <TitleBlock
          action={<ButtonLink to={`/jobs/${jobId}`}>Back to the job</ButtonLink>}
          actionNote={mayEdit ? 'a drawing that is uploaded stays with the job' : undefined}
        >
          <TitleCell label="Shop">{shop.name}</TitleCell>
          <TitleCell label="Job" main>
            {name}
          </TitleCell>
          <TitleCell label="Drawings">{tracings.data ? plural(tracings.data.length, 'drawing') : 'fetching'}</TitleCell>
        </TitleBlock>
      }
    >
      <Fetched query={job} what="the job">
        {() => (
          <div className="grid gap-x-10 gap-y-4 xl:grid-cols-[minmax(0,42rem)_minmax(0,24rem)]">
            {mayEdit ? (
              <UploadPanel jobId={jobId} onUploaded={(id) => void navigate(`/drawings/${id}`)} />
            ) : (
              <Empty title="To look at only">A designer or the owner of the shop uploads drawings.</Empty>
            )}
            <Section heading="Drawings of this job">
              <Fetched query={tracings} what="the drawings">
                {(list) => <TracingsList tracings={list} mayEdit={mayEdit} />}
              </Fetched>
            </Section>
          </div>
        )}
      </Fetched>
    </Sheet>
  );
}

/** /drawings/:tracingId */
export function DrawingRoute() {
  const { tracingId = '' } = useParams();
  const { shop, mayDo } = useSignedIn();
  const navigate = useNavigate();
  const query = useTracing(tracingId);
  const [added, setAdded] = useState<TracedFramesAdded['frames'] | null>(null);
  const jobId = query.data?.jobId;
  // After the page has let go of what was said: it asks before it is left otherwise.
  useEffect(() => {
    if (added === null || jobId === undefined) return;
    void navigate(added.length === 1 ? `/frames/${added[0]!.id}` : `/jobs/${jobId}`);
  }, [added, jobId, navigate]);
  if (query.data === undefined) {
    return (
      <Sheet title="Drawing">
        <Fetched query={query} what="the drawing">
          {() => null}
        </Fetched>
      </Sheet>
    );
  }
  return (
    <TracingPage
      key={tracingId}
      tracing={query.data}
      shopName={shop.name}
      mayEdit={mayDo('edit-frames')}
      onAdded={setAdded}
    />
  );
}
