/** An entry of a box that cannot be: `field` is its path, such as 'ends.thickness', '' for the box as a whole. */
export interface BoxProblem {
  readonly field: string;
  readonly got: string;
  readonly takes: string;
}
