import type { Point } from '../contour/contour.ts';
import { beadBase } from '../line-sets/held-depth.ts';
import type { Edge, Particulars } from '../particulars/particulars.ts';
import type { PaperPicture, PaperShape } from '../sheet/paper-picture.ts';
import { arrowHead, linePath, stroke } from '../sheet/paper-shapes.ts';
import type { SheetColour } from '../sheet/sheet-colours.ts';
import { SAME } from '../tolerances.ts';
import { formatLength, formatWithUnit } from '../units/format-length.ts';
import { clipLine } from './clip-line.ts';
import { chooseEnlargement } from './enlarge.ts';
import { envelopeLine, intendedLine, profileLine } from './section-lines.ts';
import { sectionPasses, type SectionPass } from './section-passes.ts';
import { sectionWindow, type SectionWindow } from './section-window.ts';

const WIDTH = 180;
const MARGIN = { left: 6, right: 40 };
const ROW = 5;
const TALLEST = 90;
const TEXT = 2.6;

const COLOURS: Partial<Record<SectionPass['set'], SheetColour>> = {
  BEAD_INNER: 'bead',
  BEAD_OUTER: 'bead',
  QUIRK: 'bead',
  OPENING_AXIS: 'front',
};
const WORDS: Partial<Record<SectionPass['set'], string>> = {
  BEAD_INNER: 'bead',
  BEAD_OUTER: 'bead',
  QUIRK: 'quirk',
  OPENING_AXIS: 'opening',
};
const hair = { colour: 'pencil', weight: 'hairline' } as const;

interface Frame {
  readonly window: SectionWindow;
  readonly x: (y: number) => number;
  readonly y: (depth: number) => number;
}

/**
 * The true section across an opening's edge, to scale: each cutter's profile at its axis, the envelope they leave, the
 * entered bead over it, offsets and depths dimensioned, and the scar of a too narrow quirk. One picture for screen, PDF and SVG.
 */
export function sectionPicture(p: Particulars, edge: Edge = p.edge): PaperPicture {
  const passes = sectionPasses(p, edge);
  const window = sectionWindow(p, edge, passes);
  const { text, scale } = chooseEnlargement(window.maxY - window.minY, window.bottom - window.top, p.unit, {
    width: WIDTH - MARGIN.left - MARGIN.right,
    height: TALLEST,
  });
  const rows = offsetsOf(edge, passes);
  const head = 7 + rows.length * ROW;
  const frame: Frame = {
    window,
    x: (y) => MARGIN.left + (y - window.minY) * scale,
    y: (depth) => head + (depth - window.top) * scale,
  };
  const bottom = frame.y(window.bottom);
  return {
    width: WIDTH,
    height: bottom + 8,
    description: `Section across ${edge.style === 'beaded' ? 'a beaded' : 'a square'} edge, scale ${text}: ${rows.map((r) => `${r.text} ${formatLength(r.to, p.unit)}`).join(', ')}`,
    shapes: [
      ...board(p, passes, frame),
      ...passes.flatMap((pass) => cutterShapes(pass, frame)),
      ...(edge.style === 'beaded' ? entered(intendedLine(edge), frame) : []),
      ...scar(p, edge, passes, frame),
      ...rows.flatMap((row, i) => offsetRow(row, 6 + i * ROW, p, frame)),
      ...depthMarks(depthsOf(p, edge, passes), p, frame),
      {
        kind: 'text',
        text: `Scale ${text}`,
        x: MARGIN.left,
        y: bottom + 6,
        size: TEXT,
        anchor: 'start',
        bold: true,
        colour: 'ink',
      },
      {
        kind: 'text',
        text: 'opening at the left, frame at the right',
        x: MARGIN.left + 30,
        y: bottom + 6,
        size: TEXT,
        anchor: 'start',
        colour: 'pencil',
      },
    ],
  };
}

const onPaper = (points: readonly Point[], { x, y }: Frame): Point[] => points.map((p) => ({ x: x(p.x), y: y(p.y) }));

/** What is left of the board, and the line where the face was. */
function board(p: Particulars, passes: readonly SectionPass[], frame: Frame): PaperShape[] {
  const { minY, maxY, bottom } = frame.window;
  const floor = Math.min(bottom, p.thickness);
  const line = envelopeLine(passes, frame.window, p.thickness).map((q) => ({ x: q.x, y: Math.min(q.y, floor) }));
  const area = [...line, { x: maxY, y: floor }, { x: minY, y: floor }];
  return [
    { kind: 'path', d: linePath(onPaper(area, frame), true), fill: 'board' },
    stroke(
      onPaper(
        [
          { x: minY, y: 0 },
          { x: maxY, y: 0 },
        ],
        frame,
      ),
      { ...hair, dash: 'dashed' },
    ),
    stroke(
      onPaper(
        line.filter((q) => q.y < floor - SAME || q.x > 0),
        frame,
      ),
      { colour: 'ink', weight: 'thick' },
    ),
  ];
}

function cutterShapes(pass: SectionPass, frame: Frame): PaperShape[] {
  const { window } = frame;
  const colour = COLOURS[pass.set] ?? 'ink';
  const axis = clipLine(
    [
      { x: pass.offset, y: window.top },
      { x: pass.offset, y: Math.min(pass.tipDepth, window.bottom) },
    ],
    window,
  );
  return [
    ...clipLine(profileLine(pass, window.top), window).map((run) =>
      stroke(onPaper(run, frame), { colour, weight: 'thin' }),
    ),
    ...axis.map((run) => stroke(onPaper(run, frame), { colour, weight: 'hairline', dash: 'chain' })),
  ];
}

const entered = (line: readonly Point[], frame: Frame): PaperShape[] =>
  clipLine(line, frame.window).map((run) =>
    stroke(onPaper(run, frame), { colour: 'stop', weight: 'thin', dash: 'dotted' }),
  );

/** The face that the bead's frame-side pass scars beyond the quirk. */
function scar(p: Particulars, edge: Edge, passes: readonly SectionPass[], frame: Frame): PaperShape[] {
  const outer = passes.find((pass) => pass.set === 'BEAD_OUTER');
  if (edge.style !== 'beaded' || outer?.cutter.kind !== 'beading') return [];
  const from = 2 * edge.bead.radius + edge.bead.quirk;
  const to = outer.offset + outer.cutter.tipFlat / 2 + outer.cutter.profileRadius;
  if (to - from <= SAME) return [];
  const y = frame.y(0) - 2.2;
  return [
    stroke(
      [
        { x: frame.x(from), y },
        { x: frame.x(to), y },
      ],
      { colour: 'caution', weight: 'heavy' },
    ),
    {
      kind: 'text',
      text: `scar ${formatWithUnit(to - from, p.unit)}`,
      x: frame.x(to) + 1,
      y: y + 0.8,
      size: TEXT,
      anchor: 'start',
      bold: true,
      colour: 'caution',
    },
  ];
}

interface Offset {
  readonly text: string;
  readonly to: number;
  readonly colour: SheetColour;
}

/** All offsets from the opening's edge, innermost first. */
function offsetsOf(edge: Edge, passes: readonly SectionPass[]): Offset[] {
  const axes = passes.map((pass): Offset => ({
    text: `${WORDS[pass.set]} axis`,
    to: pass.offset,
    colour: COLOURS[pass.set] ?? 'ink',
  }));
  const edges: Offset[] =
    edge.style === 'beaded'
      ? [
          { text: 'bead ends', to: 2 * edge.bead.radius, colour: 'ink' },
          { text: 'quirk ends', to: 2 * edge.bead.radius + edge.bead.quirk, colour: 'ink' },
        ]
      : [];
  return [...axes, ...edges].sort((a, b) => Math.abs(a.to) - Math.abs(b.to));
}

/** One offset as a dimension from the opening's edge, above the section. */
function offsetRow({ text, to, colour }: Offset, y: number, p: Particulars, frame: Frame): PaperShape[] {
  const zero = frame.x(0);
  const end = frame.x(to);
  const right = end >= zero;
  const shapes: PaperShape[] = [
    stroke(
      [
        { x: zero, y: y - 1 },
        { x: zero, y: frame.y(0) },
      ],
      hair,
    ),
    stroke(
      [
        { x: end, y: y - 1 },
        { x: end, y: frame.y(frame.window.top) },
      ],
      hair,
    ),
    stroke(
      [
        { x: zero, y },
        { x: end, y },
      ],
      { colour, weight: 'hairline' },
    ),
  ];
  if (Math.abs(end - zero) > 4) shapes.push(arrowHead({ x: end, y }, right ? 0 : Math.PI, 1.6, colour));
  const at = Math.max(zero, end) + 1.5;
  shapes.push({
    kind: 'text',
    text: `${formatLength(to, p.unit)}  ${text}`,
    x: at,
    y: y + 0.9,
    size: TEXT,
    anchor: 'start',
    colour,
  });
  return shapes;
}

interface Depth {
  readonly text: string;
  readonly depth: number;
}

function depthsOf(p: Particulars, edge: Edge, passes: readonly SectionPass[]): Depth[] {
  if (edge.style === 'beaded')
    return [
      { text: 'bead top', depth: edge.bead.drop },
      { text: 'bead base', depth: beadBase(edge) },
    ];
  return [
    { text: 'board', depth: p.thickness },
    { text: 'tip', depth: passes[passes.length - 1]!.tipDepth },
  ];
}

/** Depths below the face, at the right of the section; the words of two that are near one another keep apart. */
function depthMarks(depths: readonly Depth[], p: Particulars, frame: Frame): PaperShape[] {
  return depths.flatMap((d, i) => {
    const next = depths[i + 1];
    const crowded = next !== undefined && frame.y(next.depth) - frame.y(d.depth) < TEXT + 1;
    return depthMark(d, i, crowded, p, frame);
  });
}

function depthMark(
  { text, depth }: Depth,
  index: number,
  crowded: boolean,
  p: Particulars,
  frame: Frame,
): PaperShape[] {
  const edge = frame.x(frame.window.maxY);
  const x = edge + 4 + index * 4;
  const [face, y] = [frame.y(0), frame.y(depth)];
  const textY = index === 0 && y - face < 8 ? Math.min(y, face) - 1.6 : crowded ? y - 1.2 : y + 3.2;
  return [
    stroke(
      [
        { x: edge - 2, y },
        { x: x + 1.5, y },
      ],
      hair,
    ),
    stroke(
      [
        { x: edge, y: face },
        { x: x + 1.5, y: face },
      ],
      hair,
    ),
    stroke(
      [
        { x, y: face },
        { x, y },
      ],
      { colour: 'ink', weight: 'hairline' },
    ),
    {
      kind: 'text',
      text: `${formatLength(depth, p.unit)} ${text}`,
      // Clear of the next one's line.
      x: x + (crowded ? 6.2 : 2.2),
      y: textY,
      size: TEXT,
      anchor: 'start',
      colour: 'ink',
    },
  ];
}
