import { drawFrame } from '#shared/kernel/draw-frame.ts';
import { buildDrawing } from '#shared/kernel/drawing/build-drawing.ts';
import type { LayoutPart, Particulars } from '#shared/kernel/particulars/particulars.ts';
import { BUILTIN_PROFILES } from '#shared/kernel/profiles/builtin-profiles.ts';
import { workFrame } from '#shared/kernel/work-frame.ts';
import { dado, workedExample } from '../builders/worked-example.ts';
import { quietTime, type BenchRow } from './bench-row.ts';

/** One frame of an animation at 60 Hz, and how many times faster than it both drawings must be there. */
const FRAME_MS = 1000 / 60;
const TIMES_FASTER = 50;

const opening = (label: string): LayoutPart => ({ opening: { label } });
const column = (name: string): LayoutPart => ({
  rows: [opening(`${name}1`), opening(`${name}2`), opening(`${name}3`)],
  between: 1.5,
});

/** Four columns of three openings, with six dados. The width is another each time, as when a person types. */
function twelveOpenings(width: number): Particulars {
  return workedExample({
    outline: {
      kind: 'members',
      width,
      height: 40,
      stiles: { left: 1.75, right: 1.75 },
      rails: { top: 1.75, bottom: 1.25 },
      feet: 0,
      layout: { columns: ['A', 'B', 'C', 'D'].map(column), between: 1.5 },
    },
    dados: [0.25, 16, 32, 48, 70]
      .map((at, i) => dado({ part: `Part ${i}`, at, to: 40 }))
      .concat(dado({ part: 'Bottom', runs: 'horizontal', at: 0.5, from: 1, to: 70, ends: ['meets', 'meets'] })),
  });
}

/** Particulars to both drawings, against one frame at 60 Hz. */
export async function run(): Promise<BenchRow[]> {
  const { profile } = BUILTIN_PROFILES[0]!;
  const { findings } = workFrame(twelveOpenings(72));
  if (findings.some(({ level }) => level === 'stop')) throw new Error('the frame is to be sound');
  let typed = 0;
  const both = () => {
    typed++;
    const lines = drawFrame(twelveOpenings(72 + (typed % 512) / 64));
    return [buildDrawing(lines, 'back', profile), buildDrawing(lines, 'front', profile)];
  };
  const ratio = (await quietTime(both, { batches: 20, calls: 100 })) / FRAME_MS;
  const limit = 1 / TIMES_FASTER;
  return [
    {
      name: 'particulars to both drawings, 12 openings',
      against: 'one frame at 60 Hz',
      ratio,
      limit,
      ok: ratio <= limit,
    },
  ];
}
