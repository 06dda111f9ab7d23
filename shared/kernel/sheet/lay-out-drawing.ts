import { chooseScale, millimetresPerUnit } from './drawing-scale.ts';
import { dimensionBand, layOutDimensions } from './lay-out-dimensions.ts';
import { layOutLabels } from './lay-out-labels.ts';
import type { PaperPicture, PaperShape } from './paper-picture.ts';
import { contourOnPaper, pointOnPaper, type OnPaper } from './paper-shapes.ts';
import { scaleBar } from './scale-bar.ts';
import { cornerMark, originMark, pinMark } from './setup-marks.ts';
import type { DrawingItem, SheetDrawing } from './sheet-drawing.ts';

/** Left free above and at the right of the drawing, for corners that reach out and figures that are moved apart. */
const MARGIN = 3;
const FOOTER = 6;

export interface LaidOutDrawing {
  readonly picture: PaperPicture;
  /** 8 for 1 : 8. */
  readonly denominator: number;
  /** Places that had no room for a figure. */
  readonly leftOut: number;
}

/**
 * A drawing at the largest standard scale that fits `room` (millimetres of paper), with its figures, labels, pins and a
 * scale bar. The picture is as wide as the room and as high as it must be. Throws when the room holds no drawing at all.
 */
export function layOutDrawing(
  drawing: SheetDrawing,
  room: { readonly width: number; readonly height: number },
): LaidOutDrawing {
  const { extents, unit } = drawing;
  const leftBand = dimensionBand(drawing.up);
  const bottomBand = dimensionBand(drawing.across);
  const width = extents.maxX - extents.minX;
  const height = extents.maxY - extents.minY;
  const free = { width: room.width - leftBand - MARGIN, height: room.height - bottomBand - 2 * MARGIN - FOOTER };
  const denominator = chooseScale(width, height, unit, free);
  const scale = millimetresPerUnit(unit) / denominator;
  const left = leftBand + (free.width - width * scale) / 2;
  const top = MARGIN;
  const to: OnPaper = { left: left - extents.minX * scale, bottom: top + extents.maxY * scale, scale };
  const bottom = top + height * scale;

  const across = layOutDimensions(drawing.across, {
    axis: 'across',
    along: (x) => to.left + x * scale,
    outward: (y) => to.bottom - y * scale,
    edge: bottom,
    low: left - MARGIN,
    high: Math.min(room.width - 2, left + width * scale + MARGIN),
  });
  const up = layOutDimensions(drawing.up, {
    axis: 'up',
    along: (y) => to.bottom - y * scale,
    outward: (x) => to.left + x * scale,
    edge: left,
    low: top - MARGIN + 1.5,
    high: bottom + MARGIN,
  });
  const leftOut = across.leftOut + up.leftOut;
  const footer = bottom + bottomBand + MARGIN;
  const shapes = [
    ...drawContours(drawing.items, to),
    ...across.shapes,
    ...up.shapes,
    ...drawMarks(drawing.items, to),
    ...layOutLabels(
      drawing.items.filter((i) => i.kind === 'label'),
      drawing.keepClear,
      to,
    ),
    ...scaleBar(denominator, unit, 0, footer),
    ...(leftOut > 0 ? [sayLeftOut(leftOut, room.width, footer + 3)] : []),
  ];
  return {
    picture: { width: room.width, height: footer + FOOTER, shapes, description: drawing.description },
    denominator,
    leftOut,
  };
}

const drawContours = (items: readonly DrawingItem[], to: OnPaper): PaperShape[] =>
  items.flatMap((item) =>
    item.kind === 'contour'
      ? [
          {
            kind: 'path' as const,
            d: contourOnPaper(to, item.contour),
            line: item.line,
            fill: item.fill,
            of: item.of,
            set: item.set,
          },
        ]
      : [],
  );

const drawMarks = (items: readonly DrawingItem[], to: OnPaper): PaperShape[] =>
  items.flatMap((item) => {
    if (item.kind === 'pin') return pinMark(pointOnPaper(to, item.at), item.side);
    if (item.kind === 'origin') return originMark(pointOnPaper(to, item.at));
    if (item.kind === 'corner mark') return [cornerMark(pointOnPaper(to, item.at), item.inward, item.colour, 3)];
    return [];
  });

const sayLeftOut = (count: number, right: number, baseline: number): PaperShape => ({
  kind: 'text',
  text: `${count} places have no room here: see the table`,
  x: right,
  y: baseline,
  size: 2.4,
  anchor: 'end',
  colour: 'pencil',
});
