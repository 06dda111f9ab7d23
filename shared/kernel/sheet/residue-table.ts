import type { CornerResidue } from '../line-sets/corner-residue.ts';
import { SAME } from '../tolerances.ts';
import { formatLength } from '../units/format-length.ts';
import type { WorkedFrame } from '../worked-frame.ts';
import type { SheetCell, SheetTable } from './sheet-model.ts';

/** Corners that are left alike are told once. */
interface Alike {
  readonly residue: CornerResidue;
  count: number;
}

const signature = (r: CornerResidue) =>
  [r.angle, ...r.levels.flatMap((l) => [l.depth, l.lifted.radius, l.unlifted.radius])]
    .map((n) => n.toFixed(6))
    .join(' ');

function alikeCorners(residues: readonly CornerResidue[]): Alike[] {
  const groups = new Map<string, Alike>();
  for (const residue of residues) {
    const key = signature(residue);
    const known = groups.get(key);
    if (known) known.count += residue.count;
    else groups.set(key, { residue, count: residue.count });
  }
  return [...groups.values()];
}

/** What a round cutter leaves in the corners of the openings, at the face and below it. */
export function residueTable(worked: WorkedFrame): SheetTable {
  const { unit } = worked.particulars;
  const length = (value: number): SheetCell => ({ text: formatLength(value, unit), value });
  const follows = worked.residues.some(({ levels }) => levels.some(({ followed }) => followed !== undefined));
  const rows = alikeCorners(worked.residues).flatMap(({ residue, count }) =>
    residue.levels.map((level, i): SheetCell[] => [
      { text: i === 0 ? `${count} of ${formatDegrees(residue.angle)}` : '' },
      level.depth === 0 ? { text: 'at the face', value: 0 } : length(level.depth),
      ...(follows ? [level.followed === undefined ? { text: '' } : length(level.followed)] : []),
      length(level.lifted.radius),
      length(level.lifted.diagonal),
      length(level.unlifted.radius),
      length(level.unlifted.diagonal),
    ]),
  );
  const right = (key: string, heading: string) => ({ key, heading, align: 'right' }) as const;
  const columns = [
    { key: 'corners', heading: 'Corners', align: 'left' } as const,
    right('depth', 'Below the face'),
    ...(follows ? [right('followed', 'After the V: diagonal')] : []),
    right('lifted', 'Lifted: radius'),
    right('liftedDiagonal', 'diagonal'),
    right('unlifted', 'Not lifted: radius'),
    right('unliftedDiagonal', 'diagonal'),
  ];
  return { columns, rows, whenEmpty: 'No inside corners.' };
}

function formatDegrees(radians: number): string {
  const degrees = (radians * 180) / Math.PI;
  const shown = Number(degrees.toFixed(2));
  return `${Math.abs(shown - degrees) < SAME ? '' : '≈'}${shown}°`;
}
