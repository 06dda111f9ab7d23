import { findMeeting } from '../contour/find-crossing.ts';
import { containsPoint } from '../contour/contains-point.ts';
import { rectangle } from '../contour/make-contour.ts';
import type { Extents, Point } from '../contour/contour.ts';
import type { DadoOutline } from '../frame/dado-outline.ts';
import type { FrameContours } from '../frame/members.ts';
import type { Dado, Particulars } from '../particulars/particulars.ts';
import { boardTolerance, DEEPEST_DADO, SAME, WELD } from '../tolerances.ts';
import { formatWithUnit } from '../units/format-length.ts';
import type { Finding } from './finding.ts';
import { atDado } from './place-finding.ts';

/** Each dado by itself: against its cutter, the board, the frame, its panel and its ends. */
export function checkDados(
  p: Particulars,
  contours: FrameContours,
  outlines: readonly DadoOutline[],
  radius: number,
): Finding[] {
  return outlines.flatMap((outline) => {
    const dado = p.dados[outline.index]!;
    return [
      ...checkCutter(p, dado, outline, radius),
      ...checkDepth(p, dado, outline),
      ...checkInside(outline, contours),
      ...checkClearance(p, dado, outline),
      ...checkEnds(dado, outline, outlines, contours, radius),
    ];
  });
}

const entry = (o: DadoOutline, name: string) => `dados.${o.index}.${name}`;

function checkCutter(p: Particulars, dado: Dado, o: DadoOutline, radius: number): Finding[] {
  const width = dado.panel + dado.clearance;
  const length = dado.runs === 'vertical' ? o.extents.maxY - o.extents.minY : o.extents.maxX - o.extents.minX;
  const diameter = formatWithUnit(2 * radius, p.unit);
  const common = { level: 'stop', places: [atDado(o)] } as const;
  if (width < 2 * radius - SAME)
    return [
      {
        ...common,
        code: 'dado-narrower-than-cutter',
        text: `Dado ${dado.part} is ${formatWithUnit(width, p.unit)} wide; its cutter is ${diameter}.`,
        remedy: 'Take a smaller dado cutter, or check panel and clearance.',
        numbers: { width, diameter: 2 * radius },
        field: entry(o, 'panel'),
      },
    ];
  if (length < 2 * radius - SAME)
    return [
      {
        ...common,
        code: 'dado-shorter-than-cutter',
        text: `Dado ${dado.part} is ${formatWithUnit(length, p.unit)} long; its cutter is ${diameter}.`,
        remedy: 'Make the dado longer or take a smaller dado cutter.',
        numbers: { length, diameter: 2 * radius },
        field: entry(o, 'to'),
      },
    ];
  return [];
}

function checkDepth(p: Particulars, dado: Dado, o: DadoOutline): Finding[] {
  const most = p.thickness * DEEPEST_DADO;
  if (dado.depth <= most + SAME) return [];
  return [
    {
      code: 'dado-too-deep',
      level: 'stop',
      text: `Dado ${dado.part} is ${formatWithUnit(dado.depth, p.unit)} deep in a board of ${formatWithUnit(p.thickness, p.unit)}.`,
      remedy: `Make it at most two thirds of the board: ${formatWithUnit(most, p.unit)}.`,
      numbers: { depth: dado.depth, most },
      places: [atDado(o)],
      field: entry(o, 'depth'),
    },
  ];
}

function checkInside(o: DadoOutline, { perimeter }: FrameContours): Finding[] {
  const box = rectangle(o.extents);
  if (findMeeting(box, perimeter) || containsPoint(perimeter, box.vertices[0]!)) return [];
  return [
    {
      code: 'dado-outside-frame',
      level: 'stop',
      text: `Dado ${o.part} lies outside the frame.`,
      remedy: 'Check where it stands, from and to.',
      numbers: {},
      places: [atDado(o)],
      field: entry(o, 'at'),
    },
  ];
}

function checkClearance(p: Particulars, dado: Dado, o: DadoOutline): Finding[] {
  const thicker = boardTolerance(p.unit);
  if (dado.clearance >= thicker - SAME) return [];
  return [
    {
      code: 'tight-clearance',
      level: 'caution',
      text: `Dado ${dado.part} has ${formatWithUnit(dado.clearance, p.unit)} clearance; a panel may be ${formatWithUnit(thicker, p.unit)} thicker than it says.`,
      remedy: 'Measure the panel and enter its thickness, or give more clearance.',
      numbers: { clearance: dado.clearance, tolerance: thicker },
      places: [atDado(o)],
      field: entry(o, 'clearance'),
    },
  ];
}

const inBox = (e: Extents, q: Point) =>
  q.x >= e.minX - WELD && q.x <= e.maxX + WELD && q.y >= e.minY - WELD && q.y <= e.maxY + WELD;

/** Open ends must run out of the frame; ends that meet must lie in a dado that crosses them, over their whole width. */
function checkEnds(
  dado: Dado,
  o: DadoOutline,
  all: readonly DadoOutline[],
  { perimeter }: FrameContours,
  radius: number,
): Finding[] {
  const vertical = dado.runs === 'vertical';
  const { minX, maxX, minY, maxY } = o.extents;
  return ([0, 1] as const).flatMap((end): Finding[] => {
    const along = vertical ? (end === 0 ? minY : maxY) : end === 0 ? minX : maxX;
    const corners: Point[] = vertical
      ? [
          { x: minX, y: along },
          { x: maxX, y: along },
        ]
      : [
          { x: along, y: minY },
          { x: along, y: maxY },
        ];
    const where = vertical ? (end === 0 ? 'lower' : 'upper') : end === 0 ? 'left' : 'right';
    const common = {
      level: 'caution',
      numbers: { along, radius },
      places: [atDado(o)],
      field: entry(o, `ends.${end}`),
    } as const;
    const kind = dado.ends[end];
    if (kind === 'open') {
      // The cutter's centre, half a width in from the end, must have reached the edge.
      const back = end === 0 ? radius : -radius;
      const centres = corners.map((c) => (vertical ? { x: c.x, y: c.y + back } : { x: c.x + back, y: c.y }));
      const inside = centres.some((c) =>
        containsPoint(
          perimeter,
          vertical ? { x: c.x, y: c.y - Math.sign(back) * WELD } : { x: c.x - Math.sign(back) * WELD, y: c.y },
        ),
      );
      if (inside)
        return [
          {
            ...common,
            code: 'open-end-inside',
            text: `The ${where} end of dado ${dado.part} is open but lies inside the frame: its corners stay round.`,
            remedy: 'Let it run to the frame’s edge, or make the end stopped.',
          },
        ];
    }
    if (kind === 'meets') {
      const crossing = all.some(
        (other) => other !== o && corners.every((c) => inBox(other.extents, c)) && other.depth >= o.depth - SAME,
      );
      if (!crossing)
        return [
          {
            ...common,
            code: 'end-meets-nothing',
            text: `The ${where} end of dado ${dado.part} meets no dado that crosses it at its depth: its corners stay round.`,
            remedy: 'Let it end inside a crossing dado, or make the end stopped.',
          },
        ];
    }
    return [];
  });
}
