import { describe, expect, test } from 'vitest';
import { DrawingTooBig } from '#shared/kernel/tracing/read/drawing-too-big.ts';
import type { ReadOptions } from '#shared/kernel/tracing/read/read-drawing.ts';
import { READ_LIMITS } from '#shared/kernel/tracing/read/read-limits.ts';
import { block, dxfText, entity, insert, line, type DxfPair } from './dxf-text.ts';
import { readText } from './found.ts';

/** The code by which a drawing is refused; the message has to say a number or what to do. */
function refusal(text: string, options: ReadOptions): string {
  try {
    readText(text, options);
  } catch (error) {
    expect(error).toBeInstanceOf(DrawingTooBig);
    expect((error as DrawingTooBig).message.length).toBeGreaterThan(30);
    return (error as DrawingTooBig).code;
  }
  throw new Error('was read');
}

const curve = entity('ELLIPSE', [10, 0], [20, 0], [11, 1000], [21, 0], [40, 0.3]);

describe('When a drawing is too big', () => {
  test('then the limits are those of the page: 32 MB and 400,000 entities', () => {
    expect(READ_LIMITS).toMatchObject({ bytes: 32 * 1024 * 1024, entities: 400_000 });
  });

  test('then its bytes are refused before they are read', () => {
    const text = dxfText({ entities: line(0, 0, 1, 0) });
    expect(refusal(text, { limits: { bytes: text.length - 1 } })).toBe('too-many-bytes');
    expect(readText(text, { limits: { bytes: text.length } }).curves.count).toBe(1);
  });

  test('then its entities are, those of blocks among them', () => {
    const text = dxfText({ entities: line(0, 0, 1, 0).repeat(10) });
    expect(refusal(text, { limits: { entities: 9 } })).toBe('too-many-entities');
    expect(readText(text, { limits: { entities: 10 } }).curves.count).toBe(10);
    const placed = dxfText({
      blocks: block('P', line(0, 0, 1, 0).repeat(5)),
      entities: insert('P', 0, 0) + line(0, 0, 1, 0).repeat(5),
    });
    expect(refusal(placed, { limits: { entities: 10 } })).toBe('too-many-entities');
    expect(readText(placed, { limits: { entities: 11 } }).curves.count).toBe(10);
  });

  test('then its blocks are, used or not', () => {
    const blocks = Array.from({ length: 11 }, (_, i) => block(`B${i}`, '')).join('');
    expect(refusal(dxfText({ blocks }), { limits: { entities: 10 } })).toBe('too-many-entities');
    expect(readText(dxfText({ blocks }), { limits: { entities: 11 } }).curves.count).toBe(0);
  });

  test('then a spline of more points than are held at once is refused, the rest is read', () => {
    const points = Array.from({ length: 100_001 }, (_, i) => `11\n${i}\n21\n${i % 2}\n`).join('');
    const found = readText(dxfText({ entities: entity('SPLINE', [71, 3]) + points + line(0, 0, 1, 0) }));
    expect(found.census).toMatchObject([
      { type: 'SPLINE', fate: 'refused', reason: 'spline-data' },
      { type: 'LINE', fate: 'kept' },
    ]);
  });

  test('then 400,001 lines are refused', () => {
    expect(refusal(dxfText({ entities: line(0, 0, 1, 0).repeat(400_001) }), {})).toBe('too-many-entities');
  });

  test('then its lines and arcs are', () => {
    const vertices = Array.from({ length: 3000 }, (_, i): DxfPair[] => [
      [10, i],
      [20, i % 2],
    ]).flat();
    const text = dxfText({ entities: entity('LWPOLYLINE', [70, 0], ...vertices) });
    expect(refusal(text, { limits: { segments: 2000 } })).toBe('too-many-segments');
    expect(readText(text, { limits: { segments: 2999 } }).curves.count).toBe(2999);
  });

  test('then curves that take more arcs than can be are', () => {
    expect(refusal(dxfText({ entities: curve.repeat(20) }), { chordTolerance: 1e-9, limits: { fits: 1000 } })).toBe(
      'too-much-to-fit',
    );
  });

  test('then one curve that takes far too many is refused alone', () => {
    const huge = entity('ELLIPSE', [10, 0], [20, 0], [11, 1e9], [21, 0], [40, 0.3]);
    const found = readText(dxfText({ entities: huge + curve }), { chordTolerance: 0.001 });
    expect(found.census).toMatchObject([
      { type: 'ELLIPSE', fate: 'refused', reason: 'curve-lost', count: 1 },
      { type: 'ELLIPSE', fate: 'kept', count: 1 },
    ]);
    expect(found.problems).toContainEqual(expect.objectContaining({ code: 'curve-lost' }));
    expect(new Set(found.curves.entityOf)).toEqual(new Set([0]));
  });

  test('then blocks read over and over are refused by name, the rest is read', () => {
    const text = dxfText({ blocks: block('P', line(0, 0, 1, 0)), entities: insert('P', 0, 0).repeat(10) });
    const found = readText(text, { limits: { placedBytes: 150 } });
    expect(found.census).toMatchObject([
      { fate: 'kept', count: expect.any(Number) },
      { fate: 'refused', reason: 'block-bomb', count: expect.any(Number) },
    ]);
  });

  test.each([0, -1, NaN, Infinity])('then a chord tolerance of %d is misuse', (chordTolerance) => {
    expect(() => readText('', { chordTolerance })).toThrow(`got ${chordTolerance}`);
  });
});
