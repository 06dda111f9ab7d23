import { useJobs } from '../../features/jobs/api/list-jobs.ts';
import { JobsPage } from '../../features/jobs/jobs-page.tsx';
import { NewJob } from '../../features/jobs/new-job.tsx';
import { useSignedIn } from '../../features/session/signed-in.tsx';
import { Fetched } from '../../ui/fetched.tsx';
import { plural } from '../../ui/plural.ts';
import { Sheet } from '../../ui/sheet.tsx';
import { TitleBlock, TitleCell } from '../../ui/title-block.tsx';

const sum = (numbers: readonly number[]): number => numbers.reduce((total, n) => total + n, 0);

export function JobsRoute() {
  const { shop, mayDo } = useSignedIn();
  const query = useJobs();
  const jobs = query.data?.jobs.filter((job) => !job.removed);
  const mayEdit = mayDo('edit-frames');
  const unknown = query.isError ? 'not fetched' : 'fetching';
  return (
    <Sheet
      title="Jobs"
      titleBlock={
        <TitleBlock
          action={mayEdit ? <NewJob wide /> : undefined}
          actionNote={mayEdit ? 'then put frames in it' : undefined}
        >
          <TitleCell label="Shop">{shop.name}</TitleCell>
          <TitleCell label="Page" main>
            Jobs
          </TitleCell>
          <TitleCell label="Frames" detail={jobs && `${plural(sum(jobs.map((job) => job.frames)), 'frame')}`}>
            {jobs ? plural(jobs.length, 'job') : unknown}
          </TitleCell>
          <TitleCell label="Findings">
            {jobs ? `${plural(sum(jobs.map((job) => job.withStops)), 'frame')} with stops` : unknown}
          </TitleCell>
        </TitleBlock>
      }
    >
      <Fetched query={query} what="the jobs">
        {(data) => <JobsPage jobs={data.jobs} mayEdit={mayEdit} unit={shop.unit} />}
      </Fetched>
    </Sheet>
  );
}
