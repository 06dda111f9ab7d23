import { Link } from 'react-router';
import type { JobList } from '#shared/contracts/jobs.ts';
import { Button } from '../../ui/button.tsx';
import { plural } from '../../ui/plural.ts';
import { Table, type Column } from '../../ui/table.tsx';
import { When } from '../../ui/when.tsx';

type Row = JobList['jobs'][number];

interface JobsTableProps {
  readonly jobs: readonly Row[];
  /** Left out for people who may not. */
  readonly onPutAway?: (job: Row) => void;
}

export function JobsTable({ jobs, onPutAway }: JobsTableProps) {
  const columns: Column<Row>[] = [
    {
      key: 'name',
      head: 'Job',
      names: true,
      sortBy: (job) => job.name,
      cell: (job) => (
        <Link
          to={`/jobs/${job.id}`}
          className="inline-block min-w-36 py-1 font-bold underline decoration-rule underline-offset-4 wrap-anywhere hover:decoration-ink"
        >
          {job.name}
        </Link>
      ),
    },
    { key: 'frames', head: 'Frames', align: 'right', sortBy: (job) => job.frames, cell: (job) => job.frames },
    {
      key: 'released',
      head: 'Released',
      align: 'right',
      sortBy: (job) => job.released,
      cell: (job) => `${job.released} of ${job.frames}`,
    },
    {
      key: 'stops',
      head: 'Findings',
      sortBy: (job) => job.withStops,
      cell: (job) =>
        job.withStops > 0 ? (
          <span className="text-stop">{`${plural(job.withStops, 'frame')} with stops`}</span>
        ) : (
          'no stops'
        ),
    },
    { key: 'changed', head: 'Changed', sortBy: (job) => job.changedAt, cell: (job) => <When iso={job.changedAt} /> },
  ];
  if (onPutAway) {
    columns.push({
      key: 'actions',
      head: 'Actions',
      hideHead: true,
      align: 'right',
      cell: (job) => (
        <Button kind="quiet" aria-label={`Put away ${job.name}`} onClick={() => onPutAway(job)}>
          Put away
        </Button>
      ),
    });
  }
  return <Table caption="Jobs of the shop" columns={columns} rows={jobs} rowKey={(job) => job.id} />;
}
