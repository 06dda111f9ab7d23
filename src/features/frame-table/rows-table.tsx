import { contourExtents } from '#shared/kernel/contour/contour-extents.ts';
import { svgPath } from '#shared/kernel/contour/svg-path.ts';
import type { WorkedFrame } from '#shared/kernel/worked-frame.ts';
import { ContoursDrawing } from '../../ui/contours-drawing.tsx';
import { Length } from '../../ui/length.tsx';
import { plural } from '../../ui/plural.ts';
import { Section } from '../../ui/section.tsx';
import { Table, type Column } from '../../ui/table.tsx';
import { isGood, type JudgedRow } from './judge-row.ts';

function Drawing({ worked: { contours } }: { readonly worked: WorkedFrame }) {
  return (
    <ContoursDrawing
      perimeter={svgPath(contours.perimeter)}
      openings={contours.openings.map(({ contour }) => svgPath(contour))}
      extents={contourExtents(contours.perimeter)}
    />
  );
}

function Size({ worked: { contours, particulars } }: { readonly worked: WorkedFrame }) {
  const { unit } = particulars;
  return (
    <span className="whitespace-nowrap">
      <Length value={contours.width} unit={unit} /> × <Length value={contours.height} unit={unit} /> {unit}
    </span>
  );
}

const Found = ({ row }: { readonly row: JudgedRow }) => (
  <ul className="text-12">
    {!isGood(row) && (
      <li className="font-bold text-stop">Not good: {plural(row.problems.length, 'problem')}, listed above</li>
    )}
    {row.cautions.map((caution, i) => (
      <li key={i} className="wrap-anywhere">
        <span className="font-bold text-caution">Caution: </span>
        {caution}
      </li>
    ))}
    {isGood(row) && row.cautions.length === 0 && <li>good</li>}
  </ul>
);

const COLUMNS: readonly Column<JudgedRow>[] = [
  { key: 'line', head: 'Line', align: 'right', cell: ({ line }) => line, sortBy: ({ line }) => line },
  {
    key: 'drawing',
    head: 'Front',
    hideHead: true,
    cell: ({ worked }) => <div className="h-14 w-18">{worked && <Drawing worked={worked} />}</div>,
  },
  {
    key: 'name',
    head: 'Frame',
    names: true,
    sortBy: ({ name }) => name,
    cell: ({ name, remark }) => (
      <>
        <span className="inline-block min-w-28 font-bold wrap-anywhere">{name === '' ? 'no name' : name}</span>
        {remark !== '' && <span className="block text-12 text-pencil wrap-anywhere">{remark}</span>}
      </>
    ),
  },
  {
    key: 'size',
    head: 'Width × height',
    align: 'right',
    cell: ({ worked }) => (worked ? <Size worked={worked} /> : ''),
  },
  {
    key: 'openings',
    head: 'Openings',
    align: 'right',
    spare: true,
    cell: ({ worked }) => worked?.contours.openings.length,
  },
  { key: 'edge', head: 'Edge', spare: true, cell: ({ particulars }) => particulars?.edge.style },
  {
    key: 'found',
    head: 'Findings',
    cell: (row) => <Found row={row} />,
    sortBy: ({ problems, cautions }) => -(problems.length * 1000 + cautions.length),
  },
];

/** Every row of the table, drawn small; what cannot be drawn has no picture. */
export const RowsTable = ({ rows }: { readonly rows: readonly JudgedRow[] }) => (
  <Section heading="Frames of the table">
    <Table caption="Frames of the table" rows={rows} rowKey={({ line }) => String(line)} columns={COLUMNS} />
  </Section>
);
