import type { StoredCutter } from '#shared/contracts/cutters.ts';
import { describeCutter } from '#shared/kernel/cutters/describe-cutter.ts';
import { formatOther, formatWithUnit } from '#shared/kernel/units/format-length.ts';
import type { Unit } from '#shared/kernel/units/unit.ts';
import { Button } from '../../ui/button.tsx';
import { Table, type Column } from '../../ui/table.tsx';
import { CutterShape } from './cutter-shape.tsx';

interface CuttersTableProps {
  readonly cutters: readonly StoredCutter[];
  readonly mayEdit: boolean;
  readonly onChange: (stored: StoredCutter) => void;
  readonly onDelete: (stored: StoredCutter) => void;
}

const Measure = ({ value, unit }: { readonly value: number; readonly unit: Unit }) => (
  <span title={formatOther(value, unit)} className="whitespace-nowrap">
    {formatWithUnit(value, unit)}
  </span>
);

const COLUMNS: readonly Column<StoredCutter>[] = [
  {
    key: 'drawing',
    head: 'Drawing',
    hideHead: true,
    cell: ({ cutter, unit }) => <CutterShape cutter={cutter} unit={unit} />,
  },
  {
    key: 'name',
    head: 'Name',
    names: true,
    cell: ({ cutter }) => <span className="font-bold wrap-anywhere">{cutter.name}</span>,
    sortBy: ({ cutter }) => cutter.name,
  },
  {
    key: 'shape',
    head: 'Shape',
    cell: ({ cutter, unit }) => describeCutter(cutter, unit),
    sortBy: ({ cutter, unit }) => describeCutter(cutter, unit),
  },
  {
    key: 'number',
    head: 'In the machine',
    align: 'right',
    cell: ({ cutter }) => cutter.number ?? 'none',
    sortBy: ({ cutter }) => cutter.number ?? Infinity,
  },
  {
    key: 'pass',
    head: 'Deepest pass',
    align: 'right',
    cell: ({ cutter, unit }) =>
      cutter.maxPass === undefined ? 'all at once' : <Measure value={cutter.maxPass} unit={unit} />,
  },
  {
    key: 'flute',
    head: 'Flute length',
    align: 'right',
    cell: ({ cutter, unit }) => <Measure value={cutter.fluteLength} unit={unit} />,
  },
  {
    key: 'remarks',
    head: 'Remarks',
    cell: ({ remarks }) => <span className="text-12 whitespace-pre-line wrap-anywhere">{remarks}</span>,
    spare: true,
  },
];

/** The drawer, a row a cutter. */
export function CuttersTable({ cutters, mayEdit, onChange, onDelete }: CuttersTableProps) {
  const acts: Column<StoredCutter> = {
    key: 'acts',
    head: 'What to do',
    hideHead: true,
    align: 'right',
    cell: (stored) => (
      <span className="inline-flex gap-x-4">
        <Button kind="quiet" aria-label={`Change ${stored.cutter.name}`} onClick={() => onChange(stored)}>
          Change
        </Button>
        <Button kind="quiet" aria-label={`Delete ${stored.cutter.name}`} onClick={() => onDelete(stored)}>
          Delete
        </Button>
      </span>
    ),
  };
  return (
    <Table
      caption="Cutters of the drawer"
      columns={mayEdit ? [...COLUMNS, acts] : COLUMNS}
      rows={cutters}
      rowKey={({ id }) => id}
    />
  );
}
