import { useState } from 'react';
import { useParams } from 'react-router';
import type { FrameRow, JobPage } from '#shared/contracts/jobs.ts';
import { BoxPartsDialog } from '../../features/box/box-parts-dialog.tsx';
import { useFrame } from '../../features/frame-page/api/get-frame.ts';
import { useJob } from '../../features/jobs/api/get-job.ts';
import { FrameDrawing } from '../../features/jobs/frame-drawing.tsx';
import { ImportFrameFiles } from '../../features/jobs/import-frame-files.tsx';
import { JobDownload } from '../../features/jobs/job-download.tsx';
import { JobFrames } from '../../features/jobs/job-frames.tsx';
import { NewFrame } from '../../features/jobs/new-frame.tsx';
import { RenameJob } from '../../features/jobs/rename-job.tsx';
import { useProfiles } from '../../features/profiles/api/list-profiles.ts';
import { useSignedIn } from '../../features/session/signed-in.tsx';
import { useTracings } from '../../features/tracing/api/list-tracings.ts';
import { TracingsList } from '../../features/tracing/tracings-list.tsx';
import { Button } from '../../ui/button.tsx';
import { ButtonLink } from '../../ui/button-link.tsx';
import { Dialog } from '../../ui/dialog.tsx';
import { Fetched } from '../../ui/fetched.tsx';
import { plural } from '../../ui/plural.ts';
import { Section } from '../../ui/section.tsx';
import { Sheet } from '../../ui/sheet.tsx';
import { TitleBlock, TitleCell } from '../../ui/title-block.tsx';

/** The rows of a job carry no particulars: a frame's own answer, which its page needs next anyhow, draws it. */
function RowDrawing({ row }: { readonly row: FrameRow }) {
  const { data } = useFrame(row.id);
  return data ? <FrameDrawing particulars={data.particulars} /> : null;
}

/** The cut list of the box behind a frame, fetched when it is asked for. */
function RowBoxParts({ row }: { readonly row: FrameRow }) {
  const [open, setOpen] = useState(false);
  return (
    <>
      <Button kind="quiet" aria-label={`Box parts of ${row.name}`} onClick={() => setOpen(true)}>
        Box parts
      </Button>
      {open && <FrameBoxParts frameId={row.id} name={row.name} onClose={() => setOpen(false)} />}
    </>
  );
}

interface FrameBoxPartsProps {
  readonly frameId: string;
  readonly name: string;
  readonly onClose: () => void;
}

function FrameBoxParts({ frameId, name, onClose }: FrameBoxPartsProps) {
  const query = useFrame(frameId);
  if (query.data) return <BoxPartsDialog particulars={query.data.particulars} onClose={onClose} />;
  return (
    <Dialog title={`Box parts of ${name}`} onClose={onClose}>
      <Fetched query={query} what="the frame">
        {() => null}
      </Fetched>
    </Dialog>
  );
}

const FromABox = ({ jobId }: { readonly jobId: string }) => (
  <ButtonLink kind="quiet" to={`/jobs/${jobId}/box`}>
    From a box
  </ButtonLink>
);

const FromATable = ({ jobId }: { readonly jobId: string }) => (
  <ButtonLink kind="quiet" to={`/jobs/${jobId}/table`}>
    From a table
  </ButtonLink>
);

const FromADrawing = ({ jobId }: { readonly jobId: string }) => (
  <ButtonLink kind="quiet" to={`/jobs/${jobId}/drawings`}>
    From a drawing
  </ButtonLink>
);

/** How many drawings the job's page names; their own page has all. */
const DRAWINGS_SHOWN = 4;

function Drawings({ jobId, mayEdit }: { readonly jobId: string; readonly mayEdit: boolean }) {
  const tracings = useTracings(jobId);
  return (
    <Section heading="Drawings">
      {mayEdit && (
        <>
          <p className="mb-2 text-12">Frames traced from somebody’s DXF.</p>
          <ButtonLink to={`/jobs/${jobId}/drawings`}>Add from a drawing</ButtonLink>
        </>
      )}
      <Fetched query={tracings} what="the drawings">
        {(list) => (
          <TracingsList
            tracings={list}
            mayEdit={mayEdit}
            most={{ count: DRAWINGS_SHOWN, to: `/jobs/${jobId}/drawings` }}
          />
        )}
      </Fetched>
    </Section>
  );
}

function findingsText(frames: readonly FrameRow[]): string {
  const total = (of: (row: FrameRow) => number) => frames.reduce((sum, row) => sum + of(row), 0);
  return `${plural(
    total((row) => row.findings.stops),
    'stop',
  )}, ${plural(
    total((row) => row.findings.cautions),
    'caution',
  )}`;
}

interface JobTitleBlockProps {
  readonly page: JobPage | undefined;
  readonly jobId: string;
  /** In place of what the page would say. */
  readonly unknown: string;
}

function JobTitleBlock({ page, jobId, unknown }: JobTitleBlockProps) {
  const { shop, mayDo } = useSignedIn();
  const mayEdit = mayDo('edit-frames') && page !== undefined;
  const released = page?.frames.filter((row) => row.revision !== '').length ?? 0;
  return (
    <TitleBlock
      action={
        mayEdit ? (
          <>
            <NewFrame wide jobId={jobId} unit={shop.unit} />
            <FromABox jobId={jobId} />
          </>
        ) : undefined
      }
      actionNote={mayEdit ? 'or import frame files' : undefined}
    >
      <TitleCell label="Shop">{shop.name}</TitleCell>
      <TitleCell label="Job" main>
        {page?.job.name ?? unknown}
      </TitleCell>
      <TitleCell label="Findings">{page ? findingsText(page.frames) : unknown}</TitleCell>
      <TitleCell label="Revision" detail={page && plural(page.frames.length, 'frame')}>
        {page ? `${released} released` : unknown}
      </TitleCell>
    </TitleBlock>
  );
}

export function JobRoute() {
  const { jobId = '' } = useParams();
  const { shop, mayDo } = useSignedIn();
  const query = useJob(jobId);
  const profiles = useProfiles();
  const name = query.data?.job.name ?? 'Job';
  const mayEdit = mayDo('edit-frames');
  return (
    <Sheet
      title={name}
      crumbs={[{ label: 'Jobs', to: '/jobs' }, { label: name }]}
      aside={mayEdit && query.data ? <RenameJob job={query.data.job} /> : undefined}
      titleBlock={
        <JobTitleBlock page={query.data} jobId={jobId} unknown={query.isError ? 'not fetched' : 'fetching'} />
      }
    >
      <Fetched query={query} what="the job">
        {({ frames }) => (
          <div className="grid gap-x-6 gap-y-6 xl:grid-cols-[minmax(0,1fr)_18rem] print:block">
            <div className="min-w-0">
              <JobFrames
                frames={frames}
                mayEdit={mayEdit}
                drawing={(row) => <RowDrawing row={row} />}
                actions={(row) => <RowBoxParts row={row} />}
                newFrame={
                  <>
                    <NewFrame jobId={jobId} unit={shop.unit} />
                    <FromABox jobId={jobId} />
                    <FromATable jobId={jobId} />
                    <FromADrawing jobId={jobId} />
                  </>
                }
              />
            </div>
            <aside className="grid content-start gap-x-8 sm:grid-cols-2 xl:grid-cols-1 print:hidden">
              {mayEdit && (
                <Section heading="Import frame files">
                  <ImportFrameFiles jobId={jobId} />
                </Section>
              )}
              <Section heading="Table of frames">
                <p className="mb-2 text-12">
                  {mayEdit ? 'A whole kitchen from one CSV file, or this job as one.' : 'This job as a CSV file.'}
                </p>
                <ButtonLink to={`/jobs/${jobId}/table`}>{mayEdit ? 'Frames from a table' : 'To the table'}</ButtonLink>
              </Section>
              <Drawings jobId={jobId} mayEdit={mayEdit} />
              <Section heading="Layer sets of the job">
                <Fetched query={profiles} what="the file profiles">
                  {(list) => (
                    <JobDownload
                      jobId={jobId}
                      frames={frames}
                      profiles={list}
                      defaultProfileId={shop.defaultProfileId}
                    />
                  )}
                </Fetched>
              </Section>
            </aside>
          </div>
        )}
      </Fetched>
    </Sheet>
  );
}
