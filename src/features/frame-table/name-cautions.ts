import type { JudgedRow } from './judge-row.ts';

const alike = (name: string): string => name.toLowerCase();

/** Names may stand twice in a job; that it is meant is for the person to say. `taken`: names in the job already. */
export function nameCautions(rows: readonly JudgedRow[], taken: readonly string[]): JudgedRow[] {
  const inJob = new Set(taken.map(alike));
  const lines = new Map<string, number[]>();
  for (const { name, line } of rows) lines.set(alike(name), [...(lines.get(alike(name)) ?? []), line]);
  return rows.map((row) => {
    if (row.name === '') return row;
    const others = lines.get(alike(row.name))!.filter((line) => line !== row.line);
    const cautions = [
      ...(inJob.has(alike(row.name)) ? ['The job has a frame of this name already.'] : []),
      ...(others.length > 0
        ? [`${others.length === 1 ? 'Line' : 'Lines'} ${others.join(', ')} of the table: this name too.`]
        : []),
    ];
    return { ...row, cautions: [...cautions, ...row.cautions] };
  });
}
