import type { Contour, Extents } from '../contour/contour.ts';
import { rectangle } from '../contour/make-contour.ts';
import type { DrawingLayer } from '../drawing/drawing.ts';
import { placeContour, placeExtents } from '../placing/place.ts';
import { formatLength } from '../units/format-length.ts';
import type { WorkedFrame } from '../worked-frame.ts';
import { boardDimensions, boardItems, dimensionAt, lineSetItems, workExtents } from './setup-items.ts';
import type { DrawingItem, SheetDrawing } from './sheet-drawing.ts';

/** An opening as it lies in the front setup. */
export interface PlacedOpening {
  readonly tag: string;
  readonly id: string;
  readonly label: string;
  readonly contour: Contour;
  readonly extents: Extents;
  readonly width: number;
  readonly height: number;
  readonly arch: number;
}

export const placedOpenings = (worked: WorkedFrame): PlacedOpening[] =>
  worked.contours.openings.map((o, i) => ({
    tag: `O${i + 1}`,
    id: o.id,
    label: o.label,
    contour: placeContour(worked.front.placement, o.contour),
    extents: placeExtents(worked.front.placement, o.extents),
    width: o.width,
    height: o.height,
    arch: o.arch,
  }));

/** The front in its setup: squared edges on the pins, openings and perimeter measured from the pins, dados on the far side dotted. */
export function frontDrawing(worked: WorkedFrame, layers: ReadonlyMap<string, DrawingLayer>): SheetDrawing {
  const { unit } = worked.particulars;
  const { board, placement } = worked.front;
  const openings = placedOpenings(worked);
  const perimeter = placeContour(placement, worked.contours.perimeter);
  const around = placeExtents(placement, {
    minX: 0,
    minY: 0,
    maxX: worked.contours.width,
    maxY: worked.contours.height,
  });
  // A notch between feet is measured too; a traced perimeter may have any number of corners, so only its extents are.
  const edges = worked.particulars.outline.kind === 'members' ? perimeter.vertices : rectangle(around).vertices;
  const of = (id: string) => ({ colour: 'front', of: [id] }) as const;
  const frameSize = { colour: 'ink', of: ['perimeter'], always: true } as const;
  const size = boardDimensions(board, unit);

  const labels = openings.map(({ id, label, tag, extents: e, width, height }): DrawingItem => {
    const words = `${formatLength(width, unit)} × ${formatLength(height, unit)}`;
    const area = {
      minX: e.minX + 0.03 * width,
      maxX: e.maxX - 0.03 * width,
      minY: e.minY + 0.03 * height,
      maxY: e.maxY - 0.03 * height,
    };
    const texts = [`${label}\n${words}`, label, tag];
    return {
      kind: 'label',
      texts,
      spots: [
        { area, onFeature: true },
        { area, onFeature: true, turned: true },
      ],
      colour: 'front',
      bold: true,
      of: [id],
    };
  });
  const filled: DrawingItem[] = [
    { kind: 'contour', contour: perimeter, fill: 'board light', of: ['perimeter'], set: '' },
    ...openings.map((o): DrawingItem => ({ kind: 'contour', contour: o.contour, fill: 'white', of: [o.id], set: '' })),
    ...worked.dados.map((d): DrawingItem => ({
      kind: 'contour',
      contour: rectangle(placeExtents(placement, d.extents)),
      line: { colour: 'back', weight: 'hairline', dash: 'dotted' },
      of: [d.id],
      set: '',
    })),
  ];
  return {
    description:
      `Front face up, ${formatLength(board.maxX, unit)} × ${formatLength(board.maxY, unit)} board with its squared edges at the pins. ` +
      `${openings.length} openings and the perimeter, measured from the pins. Dados on the face below are shown dotted.`,
    unit,
    extents: workExtents(worked.front),
    items: [...boardItems(board), ...filled, ...lineSetItems(worked.front, layers), ...labels],
    keepClear: [],
    across: [
      ...size.across,
      ...edges.map((v) => dimensionAt(v.x, v.y, unit, frameSize)),
      ...openings.flatMap(({ id, extents: e }) => [e.minX, e.maxX].map((x) => dimensionAt(x, e.minY, unit, of(id)))),
    ],
    up: [
      ...size.up,
      ...edges.map((v) => dimensionAt(v.y, v.x, unit, frameSize)),
      ...openings.flatMap(({ id, extents: e, arch }) =>
        [e.minY, ...(arch > 0 ? [e.maxY - arch] : []), e.maxY].map((y) => dimensionAt(y, e.minX, unit, of(id))),
      ),
    ],
  };
}
