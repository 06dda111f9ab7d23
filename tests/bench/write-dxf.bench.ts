import DxfWriter from 'dxf-writer';
import type { Drawing, DrawingEntity } from '#shared/kernel/drawing/drawing.ts';
import { writeDxf } from '../../server/dxf/write-dxf.ts';
import type { BenchRow } from './bench-row.ts';

const CONTOURS = 1000;
const WARM_UPS = 15;
const RUNS = 41;

/** Rounded rectangles, eight vertices and four arcs each, at places that are no neat decimals. */
function thousandContours(): Drawing {
  const quarter = Math.tan(Math.PI / 8);
  const entities = Array.from({ length: CONTOURS }, (_, i): DrawingEntity => {
    const x = (i % 40) * 1.7 + i / 64;
    const y = Math.floor(i / 40) * 1.3 + i / 96;
    const corners = [
      [0.1, 0, 0],
      [0.9, 0, quarter],
      [1, 0.1, 0],
      [1, 0.7, quarter],
      [0.9, 0.8, 0],
      [0.1, 0.8, quarter],
      [0, 0.7, 0],
      [0, 0.1, quarter],
    ] as const;
    return {
      kind: 'polyline',
      layer: 'BACK_DADO',
      closed: true,
      vertices: corners.map(([dx, dy, bulge]) => ({ x: x + dx, y: y + dy, bulge })),
    };
  });
  return {
    unit: 'in',
    decimals: 6,
    layers: [{ name: 'BACK_DADO', colour: 1 }],
    entities,
    extents: { minX: 0, minY: 0, maxX: 84, maxY: 44 },
  };
}

/** The same contours with dxf-writer and nothing else: numbers as they come, no header, handles as they come. */
function writeAlone(drawing: Drawing): string {
  const file = new DxfWriter();
  file.setUnits('Inches');
  for (const { name, colour } of drawing.layers) file.addLayer(name, colour, 'CONTINUOUS');
  for (const entity of drawing.entities) {
    if (entity.kind !== 'polyline') continue;
    file.setActiveLayer(entity.layer);
    // dxf-writer's types leave out the bulge, which it takes as a third number.
    const points = entity.vertices.map((v) => (v.bulge === 0 ? [v.x, v.y] : [v.x, v.y, v.bulge])) as [number, number][];
    file.drawPolyline(points, entity.closed);
  }
  return file.toDxfString();
}

const time = (work: () => string): number => {
  const from = performance.now();
  if (work().length === 0) throw new Error('nothing written');
  return performance.now() - from;
};

const median = (numbers: number[]): number => numbers.sort((a, b) => a - b)[Math.floor(numbers.length / 2)]!;

/** Writing 1,000 contours as R2007, against dxf-writer alone: the two take turns, and the middle one of their ratios counts. */
export async function run(): Promise<BenchRow[]> {
  const drawing = thousandContours();
  const ratios: number[] = [];
  for (let i = 0; i < WARM_UPS + RUNS; i++) {
    const alone = time(() => writeAlone(drawing));
    const ours = time(() => writeDxf(drawing, 'R2007'));
    if (i >= WARM_UPS) ratios.push(ours / alone);
    // Lets the collector's work fall between the runs.
    await new Promise((done) => setImmediate(done));
  }
  const ratio = median(ratios);
  const limit = 1.3;
  return [{ name: 'write 1,000 contours as R2007', against: 'dxf-writer alone', ratio, limit, ok: ratio <= limit }];
}
