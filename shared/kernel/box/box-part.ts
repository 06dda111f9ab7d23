/** A part of the box as it is sawn, with what it grows by to plug into the frame; in the frame's unit. */
export interface BoxPart {
  readonly part: string;
  /** How many of this name and these sizes. */
  readonly count: number;
  readonly thickness: number;
  /** Front to back, growth included; `undefined` where the box's depth is not known. */
  readonly width: number | undefined;
  /** Along the dado. */
  readonly length: number;
  /** By how much it grows on its front edge: the depth of its dado. */
  readonly growth: number;
  readonly grows: 'front edge';
  /** "add 1/4 in to the front-to-back size". */
  readonly remark: string;
  /**
   * The sides where its dado runs out through the frame's edge, so that its length there follows from the overhang and
   * not from the dado.
   */
  readonly runsOut: readonly ('left' | 'right' | 'top' | 'bottom')[];
}
