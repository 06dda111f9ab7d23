import type { Drawing } from '#shared/kernel/drawing/drawing.ts';
import type { FileProfile } from '#shared/kernel/profiles/file-profile.ts';
import { checkDrawing } from './check-drawing.ts';
import { writeR12 } from './write-r12.ts';
import { writeR2007 } from './write-r2007.ts';

/**
 * A drawing as the text of a DXF file (UTF-8). The same drawing gives the same text. Throws RangeError before anything
 * is written when the drawing is not fit to be (check-drawing.ts), or the flavour is unknown.
 */
export function writeDxf(drawing: Drawing, flavour: FileProfile['flavour']): string {
  checkDrawing(drawing);
  switch (flavour) {
    case 'R2007':
      return writeR2007(drawing);
    case 'R12':
      return writeR12(drawing);
    default:
      throw new RangeError(`DXF flavour: got ${JSON.stringify(flavour)}, takes "R2007" or "R12"`);
  }
}
