import type { CsvRow, CuttersRead } from '#shared/contracts/cutters.ts';
import { Section } from '../../ui/section.tsx';
import { Table } from '../../ui/table.tsx';

type Problem = CuttersRead['problems'][number];

const IS_WORDS: Record<CsvRow['is'], string> = { new: 'new', changed: 'changed', same: 'as it is' };

const Changes = ({ changes }: Pick<CsvRow, 'changes'>) => (
  <ul>
    {changes.map(({ column, was, is }) => (
      <li key={column} className="wrap-anywhere">
        {column}: {is || 'nothing'}, was {was || 'nothing'}
      </li>
    ))}
  </ul>
);

/** What each row of a file is to the drawer, and what is wrong with the others. */
export function ImportPreview({ rows, problems }: Pick<CuttersRead, 'rows' | 'problems'>) {
  return (
    <>
      {problems.length > 0 && (
        <Section heading="What is wrong in the file" level={3}>
          <Table
            caption="What is wrong in the file"
            rows={problems}
            rowKey={({ line, column }: Problem) => `${line} ${column}`}
            columns={[
              { key: 'line', head: 'Line', align: 'right', cell: ({ line }) => line, names: true },
              { key: 'column', head: 'Column', cell: ({ column }) => column },
              { key: 'got', head: 'Got', cell: ({ got }) => <span className="wrap-anywhere">{got}</span> },
              { key: 'takes', head: 'Takes', cell: ({ takes }) => takes },
            ]}
          />
        </Section>
      )}
      {rows.length > 0 && (
        <Section heading="Rows against the drawer" level={3}>
          <Table
            caption="Rows against the drawer"
            rows={rows}
            rowKey={({ line }) => String(line)}
            columns={[
              { key: 'line', head: 'Line', align: 'right', cell: ({ line }) => line, sortBy: ({ line }) => line },
              {
                key: 'name',
                head: 'Cutter',
                names: true,
                cell: ({ name }) => <span className="font-bold wrap-anywhere">{name}</span>,
                sortBy: ({ name }) => name,
              },
              {
                key: 'is',
                head: 'In the drawer',
                cell: ({ is }) => (is === 'same' ? <span className="text-pencil">{IS_WORDS[is]}</span> : IS_WORDS[is]),
                sortBy: ({ is }) => is,
              },
              { key: 'changes', head: 'Changes', cell: ({ changes }) => <Changes changes={changes} /> },
            ]}
          />
        </Section>
      )}
    </>
  );
}
