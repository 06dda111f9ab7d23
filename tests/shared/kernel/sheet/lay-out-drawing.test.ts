import { describe, expect, test } from 'vitest';
import type { Extents } from '#shared/kernel/contour/contour.ts';
import type { Particulars } from '#shared/kernel/particulars/particulars.ts';
import { nameLayers } from '#shared/kernel/profiles/name-layers.ts';
import { backDrawing } from '#shared/kernel/sheet/back-drawing.ts';
import { frontDrawing } from '#shared/kernel/sheet/front-drawing.ts';
import { layOutDrawing, type LaidOutDrawing } from '#shared/kernel/sheet/lay-out-drawing.ts';
import { CHARACTER_WIDTH, type PaperShape } from '#shared/kernel/sheet/paper-picture.ts';
import { workFrame } from '#shared/kernel/work-frame.ts';
import { workedExample } from '../../../builders/worked-example.ts';
import { archOnFeet, flipped, fullToTheLimits, inMillimetres, sheetContext, wallOfTwelve } from './sheet-frames.ts';

const room = { width: 186, height: 140 };

type Text = Extract<PaperShape, { kind: 'text' }>;
const texts = ({ picture }: LaidOutDrawing) => picture.shapes.filter((s): s is Text => s.kind === 'text');

/** The capitals of a text, as a box on paper; JetBrains Mono's capitals are 0.73 of the em high. */
function boxOf({ text, x, y, size, anchor, turned }: Text): Extents {
  const long = Array.from(text).length * CHARACTER_WIDTH * size;
  const before = anchor === 'start' ? 0 : anchor === 'middle' ? long / 2 : long;
  const high = 0.73 * size;
  return turned
    ? { minX: x - high, maxX: x, minY: y + before - long, maxY: y + before }
    : { minX: x - before, maxX: x - before + long, minY: y - high, maxY: y };
}

const overlap = (a: Extents, b: Extents) => a.minX < b.maxX && b.minX < a.maxX && a.minY < b.maxY && b.minY < a.maxY;

const both = (particulars: Particulars) => {
  const worked = workFrame(particulars);
  const layers = nameLayers(worked, sheetContext().profile);
  return [backDrawing(worked, layers), frontDrawing(worked, layers)];
};

const frames: [string, () => Particulars][] = [
  ['worked example', workedExample],
  ['arch on feet', archOnFeet],
  ['wall of twelve', wallOfTwelve],
  ['millimetres, all edges squared', inMillimetres],
  ['a hundred openings and dados', fullToTheLimits],
];

describe('layOutDrawing', () => {
  for (const [name, make] of frames)
    for (const particulars of [make(), flipped(make())])
      test(`${name}, ${particulars.setup.flip}: no two texts touch and none leaves the picture`, () => {
        for (const drawing of both(particulars)) {
          const laid = layOutDrawing(drawing, room);
          const all = texts(laid);
          expect(all.length).toBeGreaterThan(6);
          all.forEach((a, i) => {
            const box = boxOf(a);
            expect(
              box.minX >= 0 && box.maxX <= laid.picture.width && box.minY >= 0 && box.maxY <= laid.picture.height,
              a.text,
            ).toBe(true);
            for (const b of all.slice(i + 1)) expect(overlap(box, boxOf(b)), `"${a.text}" and "${b.text}"`).toBe(false);
          });
          expect(laid.picture.height).toBeLessThanOrEqual(room.height + 1e-9);
        }
      });

  test('The board is drawn to the stated scale to a millionth of a millimetre', () => {
    for (const [, make] of frames)
      for (const drawing of both(make())) {
        const { picture, denominator } = layOutDrawing(drawing, room);
        const board = picture.shapes.find((s) => s.kind === 'path' && s.of?.includes('blank'))!;
        const numbers = (board as { d: string }).d.match(/-?\d+(\.\d+)?/g)!.map(Number);
        const width =
          Math.max(...numbers.filter((_, i) => i % 2 === 0)) - Math.min(...numbers.filter((_, i) => i % 2 === 0));
        const item = drawing.items.find((i) => i.kind === 'contour' && i.of.includes('blank'))!;
        const xs = item.kind === 'contour' ? item.contour.vertices.map((v) => v.x) : [];
        const wanted = ((Math.max(...xs) - Math.min(...xs)) * (drawing.unit === 'in' ? 25.4 : 1)) / denominator;
        expect(Math.abs(width - wanted)).toBeLessThanOrEqual(2e-6);
        expect(texts({ picture, denominator, leftOut: 0 }).map((t) => t.text)).toContain(`Scale 1 : ${denominator}`);
      }
  });

  test('Worked example, back: every figure of spec 2 stands beside the drawing', () => {
    const [back] = both(workedExample());
    const said = texts(layOutDrawing(back!, room)).map((t) => t.text);
    for (const figure of ['33.245', '34.005', '1.495', '2.255', '35 1/4', '1/4', '1 1/16', '31 15/16', '35 1/2', '33'])
      expect(said).toContain(figure);
  });

  test('Worked example, front: openings from the pins, and their size in them', () => {
    const [, front] = both(workedExample());
    const said = texts(layOutDrawing(front!, room)).map((t) => t.text);
    for (const figure of ['2 3/4', '16 3/4', '2 1/4', '29 3/4', 'A', '14 × 27 1/2']) expect(said).toContain(figure);
  });

  test('When there are too many places, then those that must stay do, and the drawing says how many are missing', () => {
    const [back] = both(fullToTheLimits());
    const laid = layOutDrawing(back!, room);
    expect(laid.leftOut).toBe(200);
    expect(texts(laid).map((t) => t.text)).toEqual(
      expect.arrayContaining(['96 1/4', '96 1/2', '200 places have no room here: see the table']),
    );
  });

  test('A notch between feet is measured from the pins', () => {
    const [, front] = both(archOnFeet());
    expect(front!.up.map((d) => d.at)).toContain(5);
    expect(front!.across.map((d) => d.at)).toEqual(expect.arrayContaining([3, 35]));
  });

  test('An arch stays an arc on paper', () => {
    const [, front] = both(archOnFeet());
    const { picture, denominator } = layOutDrawing(front!, room);
    const arch = picture.shapes.find((s) => s.kind === 'path' && s.set === 'front/OPENING' && s.d.includes('A')) as {
      d: string;
    };
    // R = (c²/4 + h²) / 2h for chord 32 and rise 3: circular segments, Machinery's Handbook.
    const radius = ((32 ** 2 / 4 + 9) / 6) * (25.4 / denominator);
    expect(Number(/A(\d+\.\d+)/.exec(arch.d)![1])).toBeCloseTo(radius, 4);
  });

  test('When the room holds no drawing, then it throws', () => {
    expect(() => layOutDrawing(both(workedExample())[0]!, { width: 20, height: 20 })).toThrow(RangeError);
  });
});
