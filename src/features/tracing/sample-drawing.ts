type Point = readonly [x: number, y: number];

const pair = (code: number, value: number | string): string => `${code}\n${value}`;

const line = (layer: string, [x0, y0]: Point, [x1, y1]: Point): string[] => [
  pair(0, 'LINE'),
  pair(8, layer),
  pair(10, x0),
  pair(20, y0),
  pair(11, x1),
  pair(21, y1),
];

/** Lines from corner to corner and back to the first. */
const ring = (layer: string, points: readonly Point[]): string[] =>
  points.flatMap((p, i) => line(layer, p, points[(i + 1) % points.length]!));

const rectangle = (layer: string, [x0, y0]: Point, [x1, y1]: Point): string[] =>
  ring(layer, [
    [x0, y0],
    [x1, y0],
    [x1, y1],
    [x0, y1],
  ]);

const arc = (layer: string, [x, y]: Point, radius: number, from: number, to: number): string[] => [
  pair(0, 'ARC'),
  pair(8, layer),
  pair(10, x),
  pair(20, y),
  pair(40, radius),
  pair(50, from),
  pair(51, to),
];

const text = (layer: string, [x, y]: Point, words: string): string[] => [
  pair(0, 'TEXT'),
  pair(8, layer),
  pair(10, x),
  pair(20, y),
  pair(40, 1),
  pair(1, words),
];

/** An opening 14 wide whose head is an arc over the whole of it, 2 high: by circle geometry R = (14² / 4 + 2²) / (2 · 2) = 13.25. */
const RADIUS = 13.25;
const SPRING_Y = 24.75;
const CENTRE: Point = [46.75, SPRING_Y + 2 - RADIUS];
/** Half the angle of the head: sin = 7 / 13.25. */
const HALF_DEGREES = (Math.asin(7 / RADIUS) * 180) / Math.PI;

/** One end lies this far off, inches: about 0.03 mm, as a hand-drawn corner may. */
const GAP = 0.001;

/**
 * A drawing to try the page with: two frames in inches, the second with an arched opening; one corner that is not quite closed,
 * one line drawn twice, and a title that is no line to cut. R12 with the unit in its header.
 */
export function sampleDrawing(): string {
  return [
    pair(0, 'SECTION'),
    pair(2, 'HEADER'),
    pair(9, '$ACADVER'),
    pair(1, 'AC1009'),
    pair(9, '$INSUNITS'),
    pair(70, 1),
    pair(0, 'ENDSEC'),
    pair(0, 'SECTION'),
    pair(2, 'ENTITIES'),
    ...rectangle('FRAMES', [0, 0], [33, 30.5]),
    ...rectangle('FRAMES', [1.75, 1.25], [15.75, 28.75]),
    ...line('FRAMES', [17.25, 1.25], [31.25, 1.25]),
    ...line('FRAMES', [31.25, 1.25], [31.25, 28.75]),
    ...line('FRAMES', [31.25, 28.75], [17.25, 28.75]),
    ...line('FRAMES', [17.25, 28.75], [17.25, 1.25 + GAP]),
    ...line('FRAMES', [0, 0], [33, 0]),
    ...rectangle('FRAMES', [38, 0], [55.5, 30.5]),
    ...line('FRAMES', [39.75, 1.25], [53.75, 1.25]),
    ...line('FRAMES', [53.75, 1.25], [53.75, SPRING_Y]),
    ...arc('FRAMES', CENTRE, RADIUS, 90 - HALF_DEGREES, 90 + HALF_DEGREES),
    ...line('FRAMES', [39.75, SPRING_Y], [39.75, 1.25]),
    ...text('NOTES', [0, 32], 'Two frames to try'),
    pair(0, 'ENDSEC'),
    pair(0, 'EOF'),
    '',
  ].join('\n');
}
