import type { Point } from '#shared/kernel/contour/contour.ts';
import type { Face } from '#shared/kernel/line-sets/line-set.ts';
import { placeExtents, placePoint, unplace } from '#shared/kernel/placing/place.ts';
import { formatLength } from '#shared/kernel/units/format-length.ts';
import type { DrawnFrame } from '#shared/kernel/worked-frame.ts';

/** Words on a page, at a place of frame view. */
export interface Label {
  readonly key: string;
  readonly text: string;
  readonly at: Point;
  /** Pixels on the page from there, X right, Y down. */
  readonly dx: number;
  readonly dy: number;
  readonly turned: boolean;
  readonly colour: 'back' | 'front' | 'ink' | 'pencil';
  /** Length in frame's unit that the words must fit into; Infinity when they stand free. */
  readonly room: number;
  /** Where the words do not fit that way they are turned, if they fit into this. 0: they are not. */
  readonly turnedRoom: number;
  /** Name of the line set that it belongs to, with which it is switched off; '' for none. */
  readonly hiddenWith: string;
  /** Lies across lines on the board. */
  readonly onBoard: boolean;
}

const free = { dx: 0, dy: 0, turned: false, room: Infinity, turnedRoom: 0, hiddenWith: '', onBoard: false } as const;

function backLabels(worked: DrawnFrame): Label[] {
  const { particulars, back, contours } = worked;
  const { unit } = particulars;
  return worked.dados.map((dado): Label => {
    const { extents: e } = dado;
    const given = particulars.dados[dado.index]!;
    const upright = given.runs === 'vertical';
    // Off the middle, where a dado that crosses is least likely to be.
    const along = upright ? 0.62 : 0.25;
    const middle = {
      x: upright ? (e.minX + e.maxX) / 2 : e.minX + along * (e.maxX - e.minX),
      y: upright ? e.minY + along * (e.maxY - e.minY) : (e.minY + e.maxY) / 2,
    };
    // Words stand on the side towards the middle of the frame, where there is board beside the dado.
    const towards = upright ? (middle.x > contours.width / 2 ? -1 : 1) : middle.y > contours.height / 2 ? -1 : 1;
    const width = formatLength(upright ? e.maxX - e.minX : e.maxY - e.minY, unit);
    return {
      ...free,
      key: dado.id,
      text: `${dado.part} ${width} × ${formatLength(dado.depth, unit)}`,
      at: upright
        ? { x: towards > 0 ? e.maxX : e.minX, y: middle.y }
        : { x: middle.x, y: towards > 0 ? e.maxY : e.minY },
      dx: upright ? towards * back.placement.sx * 10 : 0,
      dy: upright ? 0 : -towards * back.placement.sy * 10,
      turned: upright,
      colour: 'back',
      room: upright ? 2 * (1 - along) * (e.maxY - e.minY) : 2 * along * (e.maxX - e.minX),
      hiddenWith: 'DADO',
      onBoard: true,
    };
  });
}

function frontLabels({ contours, particulars, front }: DrawnFrame): Label[] {
  const { unit } = particulars;
  const board = placeExtents(unplace(front.placement), front.board);
  const openings = contours.openings.flatMap((o): Label[] => {
    const at = { x: (o.extents.minX + o.extents.maxX) / 2, y: (o.extents.minY + o.extents.maxY) / 2 };
    const common = { ...free, at, colour: 'front' as const, room: o.width, hiddenWith: 'OPENING' };
    const arch = o.arch > 0 ? `, arch ${formatLength(o.arch, unit)}` : '';
    return [
      { ...common, key: `${o.id}-label`, text: o.label, dy: -9 },
      {
        ...common,
        key: `${o.id}-size`,
        text: `${formatLength(o.width, unit)} × ${formatLength(o.height, unit)}${arch}`,
        dy: 9,
        turnedRoom: o.height / 2,
      },
    ];
  });
  return [
    ...openings,
    {
      ...free,
      key: 'width',
      text: `${formatLength(contours.width, unit)} frame`,
      at: { x: contours.width / 2, y: board.maxY },
      dy: -12,
      colour: 'ink',
    },
    {
      ...free,
      key: 'height',
      text: `${formatLength(contours.height, unit)} frame`,
      at: { x: board.maxX, y: contours.height / 2 },
      dx: 14,
      turned: true,
      colour: 'ink',
    },
  ];
}

/** Words for what is fixed to the board itself: pins and the squaring edge. */
function boardLabels(worked: DrawnFrame, face: Face): Label[] {
  const { placement, board } = worked[face];
  const toFrame = (p: Point): Point => placePoint(unplace(placement), p);
  const pins: Label = {
    ...free,
    key: 'pins',
    text: 'pins',
    at: toFrame({ x: 0, y: 0 }),
    dx: 28,
    dy: 20,
    colour: 'pencil',
  };
  if (face === 'front') return [pins];
  const squaring: Label = {
    ...free,
    key: 'squaring',
    text: 'squaring edge',
    at: toFrame({ x: board.maxX * 0.65, y: worked.blank.squaredCorner.y }),
    dy: worked.blank.flip === 'side-to-side' ? 20 : -14,
    colour: 'back',
    room: board.maxX / 2,
    hiddenWith: 'SQUARING',
  };
  return [pins, squaring];
}

/** All words of a face. */
export const labelsOf = (worked: DrawnFrame, face: Face): Label[] => [
  ...(face === 'back' ? backLabels(worked) : frontLabels(worked)),
  ...boardLabels(worked, face),
];
