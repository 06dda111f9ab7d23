import { LINE_DASH, LINE_WEIGHT, type PaperPicture, type PaperShape } from '#shared/kernel/sheet/paper-picture.ts';
import { SHEET_COLOURS } from '#shared/kernel/sheet/sheet-colours.ts';
import { drawText, type Pen } from './pen.ts';

/** A picture with its upper left corner at x, y; `scale` 1 keeps its millimetres. */
export function drawPicture(pen: Pen, picture: PaperPicture, x: number, y: number, scale = 1): void {
  const { doc } = pen;
  doc.save().translate(x, y).scale(scale);
  for (const shape of picture.shapes) {
    if (shape.kind === 'path') drawPath(pen, shape);
    else drawText(pen, shape.text, shape.x, shape.y, shape);
  }
  doc.restore();
}

function drawPath({ doc }: Pen, { d, line, fill }: Extract<PaperShape, { kind: 'path' }>): void {
  if (!line && !fill) return;
  doc.path(d);
  if (line) {
    doc.lineWidth(LINE_WEIGHT[line.weight]).lineJoin('round');
    if (line.dash) {
      // The writer takes a list of lengths; its types know one length only.
      const pattern: unknown = LINE_DASH[line.dash];
      doc.dash(pattern as number, {});
    } else doc.undash();
  }
  if (line && fill) doc.fillAndStroke(SHEET_COLOURS[fill], SHEET_COLOURS[line.colour]);
  else if (line) doc.stroke(SHEET_COLOURS[line.colour]);
  else doc.fill(SHEET_COLOURS[fill!]);
  if (line?.dash) doc.undash();
}
