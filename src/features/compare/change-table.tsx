import type { Comparison } from '#shared/kernel/compare/comparison.ts';
import { featureLines, settingLine, type ChangeLine } from '#shared/kernel/compare/say-change.ts';
import { Table } from '../../ui/table.tsx';

interface Row extends ChangeLine {
  readonly key: string;
  readonly what: string;
}

interface ChangeTableProps {
  readonly comparison: Comparison;
  /** What the states are called, such as "A" and "draft". */
  readonly from: string;
  readonly to: string;
}

/** Every number and word that differs, a row each: parts first, then settings. */
export function ChangeTable({ comparison, from, to }: ChangeTableProps) {
  const { features, settings, unit } = comparison;
  const rows: Row[] = [
    ...features.flatMap((change) =>
      featureLines(change, unit).map((line) => ({
        ...line,
        what: change.label,
        key: `${change.kind} ${change.before?.id} ${change.after?.id} ${line.name}`,
      })),
    ),
    ...settings.map((change) => {
      const line = settingLine(change, unit);
      return { ...line, what: change.subject, key: `${change.subject} ${line.name}` };
    }),
  ];
  return (
    <Table
      caption={`What differs between ${from} and ${to}`}
      rows={rows}
      rowKey={({ key }) => key}
      columns={[
        { key: 'what', head: 'What', cell: ({ what }) => what, sortBy: ({ what }) => what, names: true },
        { key: 'name', head: 'Of it', cell: ({ name }) => name, sortBy: ({ name }) => name },
        { key: 'was', head: `Was, ${from}`, cell: ({ was }) => was, align: 'right' },
        { key: 'is', head: `Is, ${to}`, cell: ({ is }) => is, align: 'right' },
        { key: 'by', head: `Difference, ${unit}`, cell: ({ by }) => by, align: 'right' },
      ]}
    />
  );
}
