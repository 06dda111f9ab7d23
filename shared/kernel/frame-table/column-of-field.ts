import { WHOLE_ROW, type TableHeading } from './table-columns.ts';

/** Paths of the particulars and the column that fills them, the first that fits. */
const COLUMNS: readonly (readonly [path: RegExp, heading: TableHeading])[] = [
  [/^name$/, 'name'],
  [/^unit$/, 'unit'],
  [/^thickness$/, 'board thickness'],
  [/^outline\.width$/, 'width'],
  [/^outline\.height$/, 'height'],
  [/^outline\.stiles\.left$/, 'left stile'],
  [/^outline\.stiles\.right$/, 'right stile'],
  [/^outline\.rails\.top$/, 'top rail'],
  [/^outline\.rails\.bottom$/, 'bottom rail'],
  [/^outline\.feet$/, 'feet'],
  [/^outline\.layout.*\.arch$/, 'arch'],
  [/^outline\.layout.*\.rows$/, 'rows'],
  [/^outline\.layout/, 'columns'],
  [/^dados\b/, 'box thickness'],
  [/^edge\.bead\.radius$/, 'bead radius'],
  [/^edge\.bead\.drop$/, 'bead drop'],
  [/^edge\.bead\.quirk$/, 'quirk'],
  [/^edge\b/, 'edge'],
  [/^cutters\.bead\b/, 'bead radius'],
  [/^cutters\.(quirk|corner)\b/, 'quirk'],
  [/^cutters\b/, 'board thickness'],
];

/** The column to mend for an entry of the particulars, such as 'outline.stiles.left'; the whole row where no one column fills it. */
export const columnOfField = (path: string): TableHeading | typeof WHOLE_ROW =>
  COLUMNS.find(([pattern]) => pattern.test(path))?.[1] ?? WHOLE_ROW;
