import { layOutDrawing } from './lay-out-drawing.ts';
import { pictureSvg } from './picture-svg.ts';
import type { SheetDrawing } from './sheet-drawing.ts';

/**
 * A drawing of the setup sheet as SVG, the same that the PDF shows. `width` × `height` is the room in millimetres of
 * paper that it is laid out for; on screen the SVG scales to its place. Throws when the room holds no drawing at all.
 */
export const sheetDrawingSvg = (
  drawing: SheetDrawing,
  room: { readonly width: number; readonly height: number },
): string => pictureSvg(layOutDrawing(drawing, room).picture);
