import type { BoxPart } from '#shared/kernel/box/box-part.ts';
import { UNIT_WORDS, type Unit } from '#shared/kernel/units/unit.ts';
import { safeFileName, saveFile } from '../../lib/save-file.ts';
import { Button } from '../../ui/button.tsx';
import { Length } from '../../ui/length.tsx';
import { Table, type Column } from '../../ui/table.tsx';
import { boxPartsCsv } from './box-parts-csv.ts';

interface BoxPartsTableProps {
  readonly parts: readonly BoxPart[];
  readonly unit: Unit;
  /** Of the frame, for the name of the file. */
  readonly name: string;
}

const columnsIn = (unit: Unit): readonly Column<BoxPart>[] => [
  {
    key: 'part',
    head: 'Part',
    names: true,
    cell: ({ part, count }) => (
      <span className="wrap-anywhere">
        {part}
        {count > 1 && ` × ${count}`}
      </span>
    ),
  },
  {
    key: 'thickness',
    head: 'Thickness',
    align: 'right',
    cell: ({ thickness }) => <Length value={thickness} unit={unit} />,
  },
  {
    key: 'width',
    head: 'Front to back, grown',
    align: 'right',
    cell: ({ width }) => (width === undefined ? 'depth not given' : <Length value={width} unit={unit} />),
  },
  { key: 'length', head: 'Length', align: 'right', cell: ({ length }) => <Length value={length} unit={unit} /> },
  {
    key: 'grows',
    head: 'Growth in it',
    cell: ({ growth, grows }) => (
      <>
        <Length value={growth} unit={unit} /> on its {grows}
      </>
    ),
  },
];

/** The cut list of the box parts that plug into a frame, to read and to save as CSV. */
export function BoxPartsTable({ parts, unit, name }: BoxPartsTableProps) {
  if (parts.length === 0) return <p>No part plugs into this frame: it has no dados.</p>;
  return (
    <>
      <Table caption="Box parts" columns={columnsIn(unit)} rows={parts} rowKey={(part) => JSON.stringify(part)} />
      <div className="mt-2 flex flex-wrap items-baseline gap-x-4 gap-y-1">
        <Button onClick={() => saveFile(safeFileName(name, '-box-parts.csv'), boxPartsCsv(parts, unit), 'text/csv')}>
          Save as CSV
        </Button>
        <p className="text-11 text-pencil">
          In {UNIT_WORDS[unit]}. Backs, nailers and drawer boxes do not touch the frame and are not in it.
        </p>
      </div>
    </>
  );
}
