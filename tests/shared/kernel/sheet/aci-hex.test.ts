import * as dxf from 'dxf';
import { describe, expect, test } from 'vitest';
import { aciHex } from '#shared/kernel/sheet/aci-hex.ts';

/** The table of npm dxf, an independent DXF reader. */
const known = (dxf as unknown as { colors: readonly (readonly [number, number, number])[] }).colors;

const channels = (hex: string) => [1, 3, 5].map((i) => parseInt(hex.slice(i, i + 2), 16));

describe('aciHex', () => {
  test('Every index agrees with the table of npm dxf to one step of 255, but for 7, which is black on paper', () => {
    expect(known).toHaveLength(256);
    for (let index = 1; index <= 255; index++) {
      if (index === 7) continue;
      const got = channels(aciHex(index));
      known[index]!.forEach((value, i) => expect(Math.abs(got[i]! - value), `index ${index}`).toBeLessThanOrEqual(1));
    }
    expect(aciHex(7)).toBe('#000000');
  });

  test('When the index is none, then it throws with it', () => {
    for (const index of [0, 256, 1.5, Number.NaN]) expect(() => aciHex(index)).toThrow(`got ${index}`);
  });
});
