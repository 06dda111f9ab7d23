import { describe, expect, test } from 'vitest';
import { runThrough } from '#shared/kernel/height-field/sweep-face.ts';
import type { Rgb } from '../../../../src/features/cut-part/sweeping/picture.ts';
import { Workshop } from '../../../../src/features/cut-part/sweeping/workshop.ts';
import { workedExample } from '../../../builders/worked-example.ts';
import { filesOf, smallFrame } from './parts.ts';

const workshopOf = (particulars: Parameters<typeof filesOf>[0]) => {
  const { worked, profile } = filesOf(particulars);
  return new Workshop(worked, profile);
};

describe('When the workshop is asked for a slice', () => {
  const workshop = workshopOf(smallFrame());
  const slice = (at: number, steps = 5) =>
    runThrough(workshop.slice({ kind: 'slice', steps, region: null, plane: { runs: 'upright', at } }));

  /** Stretches along the slice that are board, from its outline's upright ends. */
  function stretches({ outline, outlineLooseFrom }: ReturnType<typeof slice>): [number, number][] {
    const ends: number[] = [];
    for (let i = 0; i < outlineLooseFrom; i += 6) {
      const [y1, z1, y2, z2] = [outline[i + 1]!, outline[i + 2]!, outline[i + 4]!, outline[i + 5]!];
      if (y1 === y2 && z1 !== z2) ends.push(y1);
    }
    ends.sort((a, b) => a - b);
    return ends.flatMap((y, i) => (i % 2 === 0 ? [[y, ends[i + 1]!] as [number, number]] : []));
  }

  test('then through the opening it shows both rails: 0 to 1 3/4, and 6 1/4 to 8, less the walls’ lean', () => {
    const found = stretches(slice(4));
    expect(found).toHaveLength(2);
    // At the back the walls stand 0.019639 further in (spec).
    for (const [got, wanted] of [
      [found[0]![0], 0],
      [found[0]![1], 1.75 + 0.019639],
      [found[1]![0], 6.25 - 0.019639],
      [found[1]![1], 8],
    ] as const)
      expect(Math.abs(got - wanted)).toBeLessThan(0.005);
  });

  test('then through the dado it shows the board less its depth', () => {
    const { positions } = slice(0.6);
    const points = Array.from({ length: positions.length / 3 }, (_, i) => ({
      y: positions[3 * i + 1]!,
      z: positions[3 * i + 2]!,
    }));
    const zs = new Set(points.filter(({ y }) => y > 0 && y < 8).map(({ z }) => z.toFixed(6)));
    expect([...zs].sort()).toEqual(['-0.500000', '0.000000']);
  });

  test('then before any step it shows the whole board', () => {
    const found = stretches(slice(4, 0));
    // Blank: 8 + 2 × 1 + 2 × 0.25.
    expect(found).toHaveLength(1);
    expect(found[0]![1] - found[0]![0]).toBeCloseTo(10.5, 2);
  });
});

describe('When the workshop is asked for a picture', () => {
  test('then a corner is worked out at 0.05 mm and knows the part from the offcut', () => {
    const workshop = workshopOf(smallFrame());
    const half = 25.5 / 25.4 / 2;
    const region = { minX: 1.75 - half, maxX: 1.75 + half, minY: 1.75 - half, maxY: 1.75 + half };
    const picture = runThrough(workshop.look({ kind: 'look', steps: 5, region }));
    expect(picture.cell * 25.4).toBeCloseTo(0.05, 9);
    expect(picture.front.looseFrom).toBeGreaterThan(0);
    expect(picture.front.looseFrom).toBeLessThan(picture.front.index.length);
    expect(picture.facts.loosePieces).toBe(1);
  });

  test('then it says how much of the face each layer has marked', () => {
    const workshop = workshopOf(smallFrame());
    const { facts } = runThrough(workshop.look({ kind: 'look', steps: 1, region: null }));
    // The dado is 0.76 wide and 8 + 2 × 0.1875 long, its ends round; the board is still all one.
    const round = (4 - Math.PI) * 0.1875 ** 2;
    expect(Math.abs(facts.marked.back[0]! - (0.76 * 8.375 - round))).toBeLessThan(0.1);
    expect(facts.marked.back.slice(1)).toEqual([0]);
    expect(facts.marked.front).toEqual([0, 0, 0]);
  });

  test('then a slice, picture and comparison tell their share as they go, never backwards', () => {
    const workshop = workshopOf(smallFrame());
    for (const work of [workshop.look({ kind: 'look', steps: 5, region: null }), workshop.measure()]) {
      const shares: number[] = [];
      for (let step = work.next(); !step.done; step = work.next()) shares.push(step.value);
      expect(shares.length).toBeGreaterThan(3);
      expect(shares.every((share, i) => share >= (shares[i - 1] ?? 0) && share <= 1)).toBe(true);
    }
  });
});

describe('When the workshop is asked for a flat picture', () => {
  const palette: Rgb[] = [
    [200, 200, 200],
    [255, 0, 0],
    [0, 255, 0],
    [0, 0, 255],
  ];
  const reliefOf = (flip: 'side-to-side' | 'end-over-end', face: 'front' | 'back') => {
    const setup = { ...workedExample().setup, flip };
    return runThrough(
      workshopOf(smallFrame({ setup })).relief({
        kind: 'relief',
        steps: 5,
        region: { minX: 0, minY: 0, maxX: 8, maxY: 8 },
        face,
        palette,
      }),
    );
  };
  /** Colour of a place given as shares from the left and the top. */
  const at = ({ width, height, pixels }: ReturnType<typeof reliefOf>, right: number, down: number) => {
    const to = 4 * (Math.floor(down * height) * width + Math.floor(right * width));
    return [...pixels.subarray(to, to + 4)];
  };

  test('then the dado at the frame’s left lies at the right when the board is turned side to side, and stays left end over end', () => {
    const isRed = ([r, g]: number[]) => r! > 200 && g === 0;
    // Dado x 0.245 … 1.005 of 8.
    expect(isRed(at(reliefOf('side-to-side', 'back'), 1 - 0.6 / 8, 0.5))).toBe(true);
    expect(isRed(at(reliefOf('side-to-side', 'back'), 0.6 / 8, 0.5))).toBe(false);
    expect(isRed(at(reliefOf('end-over-end', 'back'), 0.6 / 8, 0.5))).toBe(true);
  });

  test('then the opening is clear and an untouched face has its own colour', () => {
    const relief = reliefOf('side-to-side', 'front');
    expect(at(relief, 0.5, 0.5)).toEqual([0, 0, 0, 0]);
    expect(at(relief, 0.1, 0.5)).toEqual([200, 200, 200, 255]);
  });
});
