import type { SetName } from '../line-sets/line-set.ts';
import type { LineLook } from './sheet-drawing.ts';

/** How each line set is drawn on the sheet and on screen. */
const LOOKS: Record<SetName, LineLook> = {
  DADO: { colour: 'back', weight: 'thin' },
  SQUARING: { colour: 'back', weight: 'heavy' },
  BLANK: { colour: 'pencil', weight: 'thin' },
  BEAD_INNER: { colour: 'bead', weight: 'thin' },
  BEAD_OUTER: { colour: 'bead', weight: 'thin' },
  QUIRK: { colour: 'bead', weight: 'thin', dash: 'dashed' },
  QUIRK_CORNER: { colour: 'lift', weight: 'thin' },
  OPENING: { colour: 'front', weight: 'thick' },
  OPENING_AXIS: { colour: 'front', weight: 'hairline', dash: 'dashed' },
  CORNER_LIFT: { colour: 'lift', weight: 'thick' },
  CORNER_VEE: { colour: 'lift', weight: 'thin', dash: 'dashed' },
  PERIMETER: { colour: 'ink', weight: 'thick' },
};

export const lineLook = (set: SetName): LineLook => LOOKS[set];
