import type { Sides } from '#shared/kernel/box/box.ts';

/** The sides of a box, in the order in which their entries stand. */
export const SIDES: readonly { readonly side: keyof Sides; readonly label: string }[] = [
  { side: 'left', label: 'left' },
  { side: 'right', label: 'right' },
  { side: 'top', label: 'at the top' },
  { side: 'bottom', label: 'at the bottom' },
];
