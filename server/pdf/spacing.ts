/** Free space within and between blocks, in millimetres, and the pitch of lines in lists as a share of their height. */
export interface Spacing {
  /** Above and below the words of a table row. */
  readonly row: number;
  /** Above a block. */
  readonly gap: number;
  readonly line: number;
}

export const EASY: Spacing = { row: 0.65, gap: 2, line: 1.28 };

/** For pages that just fail to hold all they should. */
export const TIGHT: Spacing = { row: 0.35, gap: 1, line: 1.16 };
