import { expect } from 'vitest';

/** Expects each number of `got` within `tolerance` of the one of the same name in `wanted`, and no other names. */
export function expectNear<T extends object>(
  got: T,
  wanted: { readonly [K in keyof T]: T[K] },
  tolerance: number,
): void {
  expect(Object.keys(got).sort()).toEqual(Object.keys(wanted).sort());
  for (const name of Object.keys(wanted) as (keyof T & string)[]) {
    const distance = Math.abs(Number(got[name]) - Number(wanted[name]));
    expect(distance, `${name}: got ${String(got[name])}, wanted ${String(wanted[name])}`).toBeLessThanOrEqual(
      tolerance,
    );
  }
}
