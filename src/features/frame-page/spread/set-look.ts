import type { SetName } from '#shared/kernel/line-sets/line-set.ts';

/** Class names of a line set's lines on screen, by what it is: colour, weight, dashes. */
export const SET_LOOK: Record<SetName, string> = {
  DADO: 'fill-back/40 stroke-back [stroke-width:1.25]',
  SQUARING: 'fill-none stroke-back [stroke-width:2.5]',
  BLANK: 'fill-none stroke-pencil [stroke-width:1]',
  BEAD_INNER: 'fill-none stroke-bead [stroke-width:1.25]',
  BEAD_OUTER: 'fill-none stroke-bead [stroke-width:1.25]',
  QUIRK: 'fill-none stroke-bead [stroke-width:1.25]',
  QUIRK_CORNER: 'fill-none stroke-lift [stroke-width:1.5]',
  OPENING: 'fill-none stroke-front [stroke-width:1.75]',
  OPENING_AXIS: 'fill-none stroke-front [stroke-width:1] [stroke-dasharray:7_3_1.5_3]',
  CORNER_LIFT: 'fill-none stroke-lift [stroke-width:2]',
  CORNER_VEE: 'fill-none stroke-lift [stroke-width:1.5]',
  PERIMETER: 'fill-none stroke-ink [stroke-width:2]',
};
