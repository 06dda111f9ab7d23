import type { Drawing } from '#shared/kernel/drawing/drawing.ts';
import { formatNumber } from './format-number.ts';

type Pair = readonly [code: number, value: string];

/** DXF Reference, $INSUNITS: 1 inches, 4 millimetres. */
export const INSUNITS = { in: 1, mm: 4 } as const;

/** DXF Reference, $MEASUREMENT: 0 English, 1 metric. */
export const MEASUREMENT = { in: 0, mm: 1 } as const;

/** Lowest and highest z of a drawing: 0, and the depths of its climbing lines. */
export function depthRange(drawing: Drawing): { minZ: number; maxZ: number } {
  let minZ = 0;
  let maxZ = 0;
  for (const entity of drawing.entities) {
    if (entity.kind !== 'polyline3d') continue;
    for (const { z } of entity.points) {
      minZ = Math.min(minZ, z);
      maxZ = Math.max(maxZ, z);
    }
  }
  return { minZ, maxZ };
}

/** Header variables of both flavours, less the version and the unit code: name without "$", then group codes and values. */
export function headerValues(drawing: Drawing): readonly (readonly [name: string, values: readonly Pair[]])[] {
  const { extents: e, unit, decimals } = drawing;
  const { minZ, maxZ } = depthRange(drawing);
  const n = (value: number) => formatNumber(value, decimals);
  return [
    ['MEASUREMENT', [[70, String(MEASUREMENT[unit])]]],
    [
      'EXTMIN',
      [
        [10, n(e.minX)],
        [20, n(e.minY)],
        [30, n(minZ)],
      ],
    ],
    [
      'EXTMAX',
      [
        [10, n(e.maxX)],
        [20, n(e.maxY)],
        [30, n(maxZ)],
      ],
    ],
    [
      'LIMMIN',
      [
        [10, n(e.minX)],
        [20, n(e.minY)],
      ],
    ],
    [
      'LIMMAX',
      [
        [10, n(e.maxX)],
        [20, n(e.maxY)],
      ],
    ],
  ];
}
