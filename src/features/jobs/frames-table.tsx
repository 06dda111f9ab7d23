import type { ReactNode } from 'react';
import { Link } from 'react-router';
import type { FrameRow } from '#shared/contracts/jobs.ts';
import { Button } from '../../ui/button.tsx';
import { ButtonLink } from '../../ui/button-link.tsx';
import { Checkbox } from '../../ui/checkbox.tsx';
import { Length } from '../../ui/length.tsx';
import { Table, type Column } from '../../ui/table.tsx';
import { When } from '../../ui/when.tsx';
import { WhenSeen } from '../../ui/when-seen.tsx';
import { FindingCounts } from './finding-counts.tsx';

interface FramesTableProps {
  readonly frames: readonly FrameRow[];
  /** A frame's small drawing; made only when its row is near. */
  readonly drawing: (row: FrameRow) => ReactNode;
  /** Frames that are chosen, and how to choose; left out where nothing can be done with them. */
  readonly choosing?: {
    readonly chosen: ReadonlySet<string>;
    readonly onChosen: (id: string, chosen: boolean) => void;
  };
  /** More to do with a frame, before copying. */
  readonly actions?: (row: FrameRow) => ReactNode;
  /** Left out for people who may not. */
  readonly onCopy?: (row: FrameRow) => void;
  readonly onPutAway?: (row: FrameRow) => void;
}

const weight = ({ findings }: FrameRow): number => findings.stops * 1e6 + findings.cautions * 1e3 + findings.notes;

const Revision = ({ row }: { readonly row: FrameRow }) =>
  row.revision === '' ? (
    <>draft</>
  ) : (
    <>
      <span className="font-bold">{row.revision}</span>
      {row.draftChanged && <span className="text-pencil"> + draft</span>}
      <div>
        <ButtonLink
          kind="quiet"
          to={`/frames/${row.id}/sheet?revision=${encodeURIComponent(row.revision)}`}
          label={`Setup sheet of ${row.name}, revision ${row.revision}`}
        >
          Setup sheet
        </ButtonLink>
      </div>
    </>
  );

const COLUMNS: readonly Column<FrameRow>[] = [
  {
    key: 'name',
    head: 'Frame',
    names: true,
    sortBy: (row) => row.name,
    cell: (row) => (
      <Link
        to={`/frames/${row.id}`}
        className="inline-block min-w-36 py-1 font-bold underline decoration-rule underline-offset-4 wrap-anywhere hover:decoration-ink"
      >
        {row.name}
      </Link>
    ),
  },
  {
    key: 'size',
    head: 'Width × height',
    align: 'right',
    sortBy: (row) => row.width * row.height * (row.unit === 'in' ? 25.4 ** 2 : 1),
    cell: (row) => (
      <span className="whitespace-nowrap">
        <Length value={row.width} unit={row.unit} /> × <Length value={row.height} unit={row.unit} /> {row.unit}
      </span>
    ),
  },
  {
    key: 'openings',
    head: 'Openings',
    align: 'right',
    spare: true,
    sortBy: (row) => row.openings,
    cell: (row) => row.openings,
  },
  { key: 'findings', head: 'Findings', sortBy: weight, cell: (row) => <FindingCounts counts={row.findings} /> },
  { key: 'revision', head: 'Revision', sortBy: (row) => row.revision, cell: (row) => <Revision row={row} /> },
  { key: 'changed', head: 'Changed', sortBy: (row) => row.changedAt, cell: (row) => <When iso={row.changedAt} /> },
];

export function FramesTable({ frames, drawing, choosing, actions, onCopy, onPutAway }: FramesTableProps) {
  const columns: Column<FrameRow>[] = [
    ...(choosing
      ? [
          {
            key: 'choose',
            head: 'Choose',
            hideHead: true,
            cell: ({ id, name }: FrameRow) => (
              <Checkbox
                label={<span className="sr-only">{`Choose ${name}`}</span>}
                checked={choosing.chosen.has(id)}
                onChecked={(chosen) => choosing.onChosen(id, chosen)}
              />
            ),
          },
        ]
      : []),
    {
      key: 'drawing',
      head: 'Front',
      hideHead: true,
      cell: (row) => <WhenSeen className="h-14 w-18">{drawing(row)}</WhenSeen>,
    },
    ...COLUMNS,
    {
      key: 'actions',
      head: 'Actions',
      hideHead: true,
      cell: (row) => (
        <div className="flex flex-col items-end gap-x-4 2xl:flex-row 2xl:justify-end">
          {actions?.(row)}
          {onCopy && (
            <Button kind="quiet" aria-label={`Copy ${row.name}`} onClick={() => onCopy(row)}>
              Copy
            </Button>
          )}
          {onPutAway && (
            <Button kind="quiet" aria-label={`Put away ${row.name}`} onClick={() => onPutAway(row)}>
              Put away
            </Button>
          )}
        </div>
      ),
    },
  ];
  return <Table caption="Frames of the job" columns={columns} rows={frames} rowKey={(row) => row.id} />;
}
