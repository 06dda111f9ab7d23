import type { Finding, FindingLevel } from '../checks/finding.ts';
import { formatLength, formatWithUnit } from '../units/format-length.ts';
import { CAUTIONS } from './cautions.ts';
import type { CoverContext, CoverFrame, CoverModel } from './cover-model.ts';
import type { SheetCell, SheetLine, SheetTable } from './sheet-model.ts';
import { dayOf } from './title-block.ts';

const left = (key: string, heading: string) => ({ key, heading, align: 'left' }) as const;
const right = (key: string, heading: string) => ({ key, heading, align: 'right' }) as const;

function countFindings(findings: readonly Finding[]): string {
  const levels: FindingLevel[] = ['stop', 'caution', 'note'];
  const counts = levels
    .map((level) => ({ level, count: findings.filter((f) => f.level === level).length }))
    .filter((c) => c.count > 0);
  return counts.length === 0
    ? 'none'
    : counts.map(({ level, count }) => `${count} ${level}${count === 1 ? '' : 's'}`).join(', ');
}

function frameTable(frames: readonly CoverFrame[]): SheetTable {
  const rows = frames.map(({ worked, revision, folder }, i): SheetCell[] => {
    const { name, unit, thickness } = worked.particulars;
    const { width, height, openings } = worked.contours;
    const { rough } = worked.blank;
    return [
      { text: String(i + 1), value: i + 1 },
      { text: name, bold: true },
      { text: revision, bold: true },
      { text: `${formatLength(width, unit)} × ${formatLength(height, unit)} ${unit}` },
      { text: formatLength(thickness, unit), value: thickness },
      { text: String(openings.length), value: openings.length },
      { text: `${formatLength(rough.maxX, unit)} × ${formatLength(rough.maxY, unit)}` },
      { text: countFindings(worked.findings) },
      { text: `${folder}/` },
    ];
  });
  const columns = [
    right('number', 'No.'),
    left('frame', 'Frame'),
    left('revision', 'Revision'),
    right('size', 'Size'),
    right('thickness', 'Thick'),
    right('openings', 'Openings'),
    right('blank', 'Board'),
    left('findings', 'Findings'),
    left('folder', 'Folder'),
  ];
  return { columns, rows, whenEmpty: 'No released frames.' };
}

/** How many boards of which size and thickness to have ready, largest first. */
function boardLines(frames: readonly CoverFrame[]): SheetLine[] {
  const boards = new Map<string, { count: number; area: number }>();
  for (const { worked } of frames) {
    const { unit, thickness } = worked.particulars;
    const { maxX, maxY } = worked.blank.rough;
    const words = `${formatLength(maxX, unit)} × ${formatLength(maxY, unit)}, ${formatWithUnit(thickness, unit)} thick`;
    boards.set(words, { count: (boards.get(words)?.count ?? 0) + 1, area: maxX * maxY });
  }
  return [...boards]
    .sort(([, a], [, b]) => b.area - a.area)
    .map(([words, { count }]) => ({ word: String(count), text: `of ${words}` }));
}

/** The cover of a job's zip: what is in it, which boards it takes, and the cautions. Throws RangeError when `releasedAt` is not a date. */
export function describeCover(frames: readonly CoverFrame[], context: CoverContext): CoverModel {
  const { jobName, shopName, author, releasedAt, profileName, leftOut } = context;
  const openings = frames.reduce((sum, f) => sum + f.worked.contours.openings.length, 0);
  return {
    releasedAt,
    title: jobName,
    lead: `${frames.length} ${frames.length === 1 ? 'frame' : 'frames'}, ${openings} openings. File profile: ${profileName}.`,
    titleBlock: {
      legalOwner: shopName,
      identification: jobName,
      title: jobName,
      documentType: 'Cover sheet',
      revision: '',
      dateOfIssue: dayOf(releasedAt),
      createdBy: author,
      approvedBy: '',
    },
    blocks: [
      { kind: 'table', id: 'frames', title: 'Frames', table: frameTable(frames), after: [] },
      ...(leftOut.length === 0
        ? []
        : [
            {
              kind: 'list',
              id: 'left-out',
              title: 'Not in this set',
              ordered: false,
              items: leftOut.map((name) => ({ word: name, text: 'has no released revision.' })),
            } as const,
          ]),
      { kind: 'list', id: 'boards', title: 'Boards', ordered: false, items: boardLines(frames) },
      {
        kind: 'list',
        id: 'files',
        title: 'Files',
        ordered: false,
        items: frames.map(({ folder, files }) => ({ word: `${folder}/`, text: files.join(', ') })),
      },
      { kind: 'list', id: 'cautions', title: 'Cautions', ordered: false, items: [{ text: CAUTIONS.join(' ') }] },
    ],
  };
}
