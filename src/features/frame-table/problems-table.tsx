import type { CellProblem } from '#shared/kernel/csv/cell-problem.ts';
import { Section } from '../../ui/section.tsx';
import { Table } from '../../ui/table.tsx';

interface ProblemsTableProps {
  readonly problems: readonly CellProblem[];
}

/** Everything wrong in a table by line and column, in the order of the file. */
export function ProblemsTable({ problems }: ProblemsTableProps) {
  const rows = problems.map((problem, i) => ({ ...problem, key: String(i) }));
  return (
    <Section heading="What is wrong in the table">
      <Table
        caption="What is wrong in the table"
        rows={rows}
        rowKey={({ key }) => key}
        columns={[
          { key: 'line', head: 'Line', align: 'right', cell: ({ line }) => line, names: true },
          {
            key: 'column',
            head: 'Column',
            cell: ({ column }) => <span className="inline-block min-w-[16ch] wrap-anywhere">{column}</span>,
          },
          { key: 'got', head: 'Got', cell: ({ got }) => <span className="wrap-anywhere">{got}</span> },
          { key: 'takes', head: 'Takes', cell: ({ takes }) => <span className="wrap-anywhere">{takes}</span> },
        ]}
      />
    </Section>
  );
}
