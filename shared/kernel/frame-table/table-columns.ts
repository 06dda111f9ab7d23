/** A column of the table of frames. */
interface TableColumn {
  readonly heading: string;
  /** A file must have it, and a row something in it. */
  readonly needed?: true;
  /** What its cells take, for people. */
  readonly says: string;
}

/**
 * The columns in the order in which they are written; they may be read in any. Sizes of members are never guessed: what a
 * row uses it must say. Lengths are in the row's unit, or carry their own, such as 775mm.
 */
export const TABLE_COLUMNS = [
  { heading: 'name', needed: true, says: 'what stands on the drawing, such as B33 sink base' },
  { heading: 'unit', needed: true, says: 'in or mm' },
  { heading: 'width', needed: true, says: 'of the finished frame' },
  { heading: 'height', needed: true, says: 'of the finished frame, feet included' },
  { heading: 'left stile', needed: true, says: 'its width' },
  { heading: 'right stile', needed: true, says: 'its width' },
  { heading: 'top rail', needed: true, says: 'its width' },
  { heading: 'bottom rail', needed: true, says: 'its width' },
  { heading: 'mid-stile', says: 'its width; needed where there is more than one column' },
  { heading: 'mid-rail', says: 'its width; needed where there is more than one row' },
  {
    heading: 'columns',
    needed: true,
    says: 'how many openings side by side, such as 3; or their widths left to right, * for what is left: 12 + * + 12',
  },
  {
    heading: 'rows',
    needed: true,
    says: 'how many openings one above another, such as 4; or their heights from the top: 5 + * + *',
  },
  { heading: 'edge', needed: true, says: 'square or beaded' },
  {
    heading: 'box thickness',
    needed: true,
    says: 'of the box’s ends and bottom, which get their dados; 0 for a frame without dados',
  },
  { heading: 'feet', says: 'how far the stiles run down past the bottom rail; empty is none' },
  { heading: 'arch', says: 'rise of the arch over each opening of the top row; empty is none' },
  { heading: 'board thickness', says: 'empty is 3/4 in or 19 mm, by the unit' },
  { heading: 'bead radius', says: 'of a beaded edge; empty is 3/32 in or 2.5 mm' },
  { heading: 'bead drop', says: 'how far the bead lies below the face; empty is 0.01 in or 0.25 mm' },
  { heading: 'quirk', says: 'its width; empty is 1/8 in or 3 mm' },
  { heading: 'remark', says: 'not part of the frame' },
] as const satisfies readonly TableColumn[];

export type TableHeading = (typeof TABLE_COLUMNS)[number]['heading'];

export const TABLE_HEADINGS: readonly TableHeading[] = TABLE_COLUMNS.map(({ heading }) => heading);

/** Where no one column is at fault. */
export const WHOLE_ROW = 'whole row';
