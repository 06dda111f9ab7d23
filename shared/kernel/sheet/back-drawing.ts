import type { Extents } from '../contour/contour.ts';
import { rectangle } from '../contour/make-contour.ts';
import type { DrawingLayer } from '../drawing/drawing.ts';
import { placeContour, placeExtents } from '../placing/place.ts';
import { formatLength } from '../units/format-length.ts';
import type { WorkedFrame } from '../worked-frame.ts';
import { boardDimensions, boardItems, dimensionAt, lineSetItems, squaredOnBack, workExtents } from './setup-items.ts';
import type { DrawingItem, LabelSpot, PinDimension, SheetDrawing } from './sheet-drawing.ts';

/** A dado as it lies in the back setup, with its tag. */
export interface PlacedDado {
  readonly tag: string;
  readonly id: string;
  readonly part: string;
  readonly depth: number;
  readonly extents: Extents;
}

export const placedDados = (worked: WorkedFrame): PlacedDado[] =>
  worked.dados.map(({ id, part, depth, extents }, i) => ({
    tag: `D${i + 1}`,
    id,
    part,
    depth,
    extents: placeExtents(worked.back.placement, extents),
  }));

const upright = (e: Extents) => e.maxY - e.minY > e.maxX - e.minX;

/** On the dado, else close beside it where there is most room up to the next dado or the board's edge. */
function dadoSpots({ extents: e }: PlacedDado, all: readonly PlacedDado[], board: Extents): LabelSpot[] {
  const turned = upright(e);
  const others = all.map((d) => d.extents).filter((o) => upright(o) === turned);
  const beside: LabelSpot[] = turned
    ? [
        {
          turned,
          close: 'right',
          area: {
            ...e,
            minX: Math.max(board.minX, ...others.map((o) => o.maxX).filter((x) => x <= e.minX)),
            maxX: e.minX,
          },
        },
        {
          turned,
          close: 'left',
          area: {
            ...e,
            minX: e.maxX,
            maxX: Math.min(board.maxX, ...others.map((o) => o.minX).filter((x) => x >= e.maxX)),
          },
        },
      ]
    : [
        {
          close: 'bottom',
          area: {
            ...e,
            minY: e.maxY,
            maxY: Math.min(board.maxY, ...others.map((o) => o.minY).filter((y) => y >= e.maxY)),
          },
        },
        {
          close: 'top',
          area: {
            ...e,
            minY: Math.max(board.minY, ...others.map((o) => o.maxY).filter((y) => y <= e.minY)),
            maxY: e.minY,
          },
        },
      ];
  const room = ({ area }: LabelSpot) => (turned ? area.maxX - area.minX : area.maxY - area.minY);
  beside.sort((a, b) => room(b) - room(a));
  return [{ area: e, turned, onFeature: true }, ...beside.flatMap((spot) => along(spot, turned))];
}

/** The middle of a long spot, then its ends, where a crossing dado may leave room. */
function along(spot: LabelSpot, turned: boolean): LabelSpot[] {
  const { area } = spot;
  const [low, high] = turned ? [area.minY, area.maxY] : [area.minX, area.maxX];
  const part = (from: number, to: number): LabelSpot => {
    const [a, b] = [low + from * (high - low), low + to * (high - low)];
    return { ...spot, area: turned ? { ...area, minY: a, maxY: b } : { ...area, minX: a, maxX: b } };
  };
  return [part(0, 1), part(0, 0.5), part(0.5, 1), part(0, 0.3), part(0.7, 1)];
}

/** Squared edges and dado sides measured from the pins; a dado across the board is measured across, its ends only where they lie on the board. */
function dadoDimensions(
  dados: readonly PlacedDado[],
  worked: WorkedFrame,
): { across: PinDimension[]; up: PinDimension[] } {
  const { unit } = worked.particulars;
  const { board } = worked.back;
  const look = (id: string) => ({ colour: 'back', of: [id] }) as const;
  const across: PinDimension[] = [];
  const up: PinDimension[] = [];
  for (const { id, extents: e } of dados) {
    const ends = upright(e) ? [e.minY, e.maxY] : [e.minX, e.maxX];
    const onBoard = ends.filter((v) =>
      upright(e) ? v > board.minY && v < board.maxY : v > board.minX && v < board.maxX,
    );
    const xs = upright(e) ? [e.minX, e.maxX] : onBoard;
    const ys = upright(e) ? onBoard : [e.minY, e.maxY];
    across.push(...xs.map((x) => dimensionAt(x, e.minY, unit, look(id))));
    up.push(...ys.map((y) => dimensionAt(y, e.minX, unit, look(id))));
  }
  return { across, up };
}

/** The squared edges in the back setup: all four for "all-edges". */
function squaredDimensions(worked: WorkedFrame): { across: PinDimension[]; up: PinDimension[] } {
  const { unit, setup } = worked.particulars;
  const { squaredCorner: corner } = worked.blank;
  const lines = squaredOnBack(worked.blank);
  const look = { colour: 'back', of: [], always: true } as const;
  const all = setup.squaring === 'all-edges';
  return {
    across: (all ? [lines.minX, lines.maxX] : [corner.x]).map((x) => dimensionAt(x, 0, unit, look)),
    up: (all ? [lines.minY, lines.maxY] : [corner.y]).map((y) => dimensionAt(y, 0, unit, look)),
  };
}

/** The back in its setup: board on the pins, squaring line, dados measured from the pins, and where the frame will be cut from the front. */
export function backDrawing(worked: WorkedFrame, layers: ReadonlyMap<string, DrawingLayer>): SheetDrawing {
  const { unit } = worked.particulars;
  const { board, placement } = worked.back;
  const dados = placedDados(worked);
  const hidden = { colour: 'pencil', weight: 'thin', dash: 'dashed' } as const;
  const frame: DrawingItem[] = [
    {
      kind: 'contour',
      contour: placeContour(placement, worked.contours.perimeter),
      line: hidden,
      fill: 'board light',
      of: ['perimeter'],
      set: '',
    },
    ...worked.contours.openings.map((o): DrawingItem => ({
      kind: 'contour',
      contour: placeContour(placement, o.contour),
      line: hidden,
      of: [o.id],
      set: '',
    })),
  ];
  // Filled one by one: merged outlines may hold islands, which are board.
  const filled = dados.map((d): DrawingItem => ({
    kind: 'contour',
    contour: rectangle(d.extents),
    fill: 'back light',
    of: [d.id],
    set: '',
  }));
  const labels = dados.map((d): DrawingItem => ({
    kind: 'label',
    texts: [`${d.tag} ${d.part}`, d.tag],
    spots: dadoSpots(d, dados, board),
    ground: 'board light',
    colour: 'back',
    of: [d.id],
  }));
  const size = boardDimensions(board, unit);
  const squared = squaredDimensions(worked);
  const measured = dadoDimensions(dados, worked);
  return {
    description:
      `Back face up, ${formatLength(board.maxX, unit)} × ${formatLength(board.maxY, unit)} board with its lower left corner at the pins. ` +
      `${dados.length} dados and the squaring line, measured from the pins. The frame is shown dashed: it is cut from the front.`,
    unit,
    extents: workExtents(worked.back),
    items: [...boardItems(board), ...frame, ...filled, ...lineSetItems(worked.back, layers), ...labels],
    keepClear: dados.map((d) => d.extents),
    across: [...size.across, ...squared.across, ...measured.across],
    up: [...size.up, ...squared.up, ...measured.up],
  };
}
