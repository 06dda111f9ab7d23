import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { DrawingTooBig } from '#shared/kernel/tracing/read/drawing-too-big.ts';
import { readDrawing } from '#shared/kernel/tracing/read/read-drawing.ts';
import { sniffFile } from '#shared/kernel/tracing/read/sniff-file.ts';
import { block, bytesOf, circle, dxfText, entity, insert, layer, layerTable, line, type DxfPair } from './dxf-text.ts';
import { countOf, rowsOf } from './found.ts';

/** How many mutated files are read; FUZZ_FILES=20000 for a long run. */
const FILES = Number(process.env['FUZZ_FILES'] ?? 2000);
/** No file of a few kilobytes may take longer, on a machine that does other things too. Milliseconds. */
const LONGEST = 5000;

const vertices = (count: number): DxfPair[] =>
  Array.from({ length: count }, (_, i): DxfPair[] => [
    [10, i * 3],
    [20, (i * i) % 7],
    [42, i % 2],
  ]).flat();

/** One of everything, so that whatever is changed is something that is read. */
const SEED = dxfText({
  tables: layerTable(layer('A', 0, 7), layer('OFF', 0, -7), layer('ICE', 1, 7)),
  blocks:
    block('P', line(0, 0, 1, 0, [8, '0']) + circle(2, 2, 1), 1, 1) +
    block(
      'Q',
      insert('P', 5, 5, [41, -2], [42, 1], [50, 30]) + insert('P', 9, 9, [70, 3], [71, 2], [44, 10], [45, 10]),
    ),
  entities:
    line(1, 2, 3, 4, [8, 'A'], [60, 0]) +
    circle(0, 0, 5, [8, 'OFF'], [67, 0]) +
    entity('ARC', [10, 1], [20, 2], [40, 3], [50, 350], [51, 20], [230, -1]) +
    entity('ELLIPSE', [10, 1], [20, 2], [11, 10], [21, 1], [40, 0.4], [41, 0], [42, 4]) +
    entity('LWPOLYLINE', [8, 'ICE'], [90, 5], [70, 1], [43, 0], ...vertices(5)) +
    entity('POLYLINE', [66, 1], [70, 1]) +
    entity('VERTEX', [10, 1], [20, 1], [42, 0.5]) +
    entity('VERTEX', [10, 9], [20, 1]) +
    entity('SEQEND') +
    entity(
      'SPLINE',
      [70, 12],
      [71, 3],
      [72, 8],
      [73, 4],
      [40, 0],
      [40, 0],
      [40, 0],
      [40, 0],
      [40, 1],
      [40, 1],
      [40, 1],
      [40, 1],
      [41, 1],
      [41, 2],
      [41, 2],
      [41, 1],
      [10, 0],
      [20, 0],
      [10, 3],
      [20, 9],
      [10, 9],
      [20, -3],
      [10, 12],
      [20, 0],
    ) +
    entity(
      'SPLINE',
      [70, 1],
      [71, 3],
      [74, 4],
      [11, 0],
      [21, 0],
      [11, 5],
      [21, 5],
      [11, 9],
      [21, 1],
      [11, 4],
      [21, -6],
    ) +
    entity('TEXT', [1, 'A'], [10, 0], [20, 0]) +
    insert('Q', 3, 3, [8, 'A'], [66, 1]) +
    entity('ATTRIB', [1, 'B']) +
    entity('SEQEND'),
});

const SEED_LINES = SEED.split('\n');
const WORDS = [
  '0',
  '1',
  '-1',
  '2',
  '10',
  '20',
  '40',
  '41',
  '70',
  '90',
  '210',
  '230',
  '1e308',
  '-1e11',
  '4294967295',
  '32767',
  'nan',
  '1,5',
  '',
  ' ',
  '0.0000001',
  '1e-300',
  'LINE',
  'INSERT',
  'VERTEX',
  'POLYLINE',
  'SEQEND',
  'SPLINE',
  'ELLIPSE',
  'BLOCK',
  'ENDBLK',
  'SECTION',
  'ENDSEC',
  'EOF',
  'ENTITIES',
  'BLOCKS',
  'P',
  'Q',
  '\\U+00FC',
  '\ud83d',
];

/** A change of the file's lines: put, change, leave out, repeat or swap. */
const change = fc.tuple(
  fc.constantFrom('put', 'set', 'drop', 'repeat', 'swap', 'cut'),
  fc.nat(SEED_LINES.length - 1),
  fc.nat(40),
  fc.oneof({ weight: 3, arbitrary: fc.constantFrom(...WORDS) }, fc.string({ maxLength: 8 }), fc.double().map(String)),
);

function mutate(changes: readonly (readonly [string, number, number, string])[]): string {
  const lines = [...SEED_LINES];
  for (const [how, at, size, word] of changes) {
    if (how === 'put') lines.splice(at, 0, word);
    else if (how === 'set') lines.splice(at, 1, word);
    else if (how === 'drop') lines.splice(at, 1 + (size % 4));
    else if (how === 'repeat') lines.splice(at, 0, ...lines.slice(at, at + size));
    else if (how === 'swap')
      lines.splice(at, 0, ...lines.splice((at * 7 + size) % Math.max(lines.length, 1), size % 6));
    else if (size === 0) lines.length = Math.min(lines.length, at);
  }
  return lines.join('\n');
}

/** Reads a file; whatever is in it, a sound drawing or a named refusal comes of it. */
function expectSound(bytes: Uint8Array): void {
  const from = performance.now();
  try {
    const found = readDrawing(bytes, { limits: { fits: 50_000, entities: 20_000 } });
    expect(found.curves.segments.every((value) => Number.isFinite(value))).toBe(true);
    expect(rowsOf(found).every((row) => Math.abs(row[4]) <= 1 + 1e-9)).toBe(true);
    const kept = [...found.census, ...found.placed].filter((row) => row.fate === 'kept' && row.type !== 'INSERT');
    expect(new Set(found.curves.entityOf).size).toBe(countOf(kept));
    for (const problem of found.problems) expect(problem.code).toMatch(/^[a-z0-9-]+$/);
  } catch (error) {
    if (!(error instanceof DrawingTooBig)) throw error;
  }
  sniffFile(bytes);
  expect(performance.now() - from).toBeLessThan(LONGEST);
}

describe('When files are changed at random', () => {
  test('then lines that are changed, moved or lost give a sound drawing or a named refusal', () => {
    expect(readDrawing(bytesOf(SEED)).problems.filter((problem) => problem.line === undefined)).toEqual([]);
    fc.assert(
      fc.property(fc.array(change, { minLength: 1, maxLength: 6 }), (changes) => expectSound(bytesOf(mutate(changes)))),
      { numRuns: FILES },
    );
  }, 600_000);

  test('then so do bytes that are changed', () => {
    const seed = bytesOf(SEED);
    const spot = fc.tuple(fc.nat(seed.length - 1), fc.nat(255));
    fc.assert(
      fc.property(fc.array(spot, { minLength: 1, maxLength: 20 }), (spots) => {
        const bytes = seed.slice();
        for (const [at, value] of spots) bytes[at] = value;
        expectSound(bytes);
      }),
      { numRuns: FILES / 2 },
    );
  }, 600_000);

  test('then so do bytes that never were a drawing', () => {
    fc.assert(fc.property(fc.uint8Array({ maxLength: 300 }), expectSound), { numRuns: FILES / 4 });
  }, 600_000);
});
