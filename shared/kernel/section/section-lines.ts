import type { Point } from '../contour/contour.ts';
import { heightAtRadius } from '../cutters/height-at-radius.ts';
import { radiusAtHeight } from '../cutters/radius-at-height.ts';
import type { BeadedEdge } from '../particulars/particulars.ts';
import { BESIDE_STEP } from '../tolerances.ts';
import { envelopeDepth } from './envelope-depth.ts';
import { intendedDepth } from './intended-depth.ts';
import type { SectionPass } from './section-passes.ts';
import type { SectionWindow } from './section-window.ts';

/** Points drawn along a curve of the section. */
const STEPS = 360;

/** Where the envelope may jump or bend: axes, flat tips and full widths of all passes, within the window. */
function breaks(passes: readonly SectionPass[], { minY, maxY }: SectionWindow): number[] {
  const at = new Set<number>([minY, maxY]);
  for (let i = 1; i < STEPS; i++) at.add(minY + ((maxY - minY) * i) / STEPS);
  for (const { cutter, offset, tipDepth } of passes) {
    const flat = cutter.kind === 'beading' ? cutter.tipFlat / 2 : cutter.kind === 'straight' ? cutter.diameter / 2 : 0;
    for (const reach of [0, flat, radiusAtHeight(cutter, tipDepth)])
      for (const side of [-1, 1])
        for (const beside of [-BESIDE_STEP, 0, BESIDE_STEP]) at.add(offset + side * reach + beside);
  }
  return [...at].filter((y) => y >= minY && y <= maxY).sort((a, b) => a - b);
}

/** The true section as points (y, depth below the face). */
export const envelopeLine = (passes: readonly SectionPass[], window: SectionWindow, thickness: number): Point[] =>
  breaks(passes, window).map((y) => ({ x: y, y: envelopeDepth(passes, y, thickness) }));

/** The entered bead and quirk as points (y, depth below the face), from the opening's edge to the face. */
export function intendedLine({ bead }: BeadedEdge): Point[] {
  const { radius: R, quirk: q, drop: e } = bead;
  const line = Array.from({ length: 97 }, (_, i) => {
    const y = R - R * Math.cos((Math.PI * i) / 96);
    return { x: y, y: intendedDepth(bead, y) };
  });
  return [...line, { x: 2 * R + q, y: e + R }, { x: 2 * R + q, y: 0 }];
}

/** A cutter's profile as it stands in the section: one side up, then the other down, as points (y, depth), from the top of the window to its tip. */
export function profileLine({ cutter, offset, tipDepth }: SectionPass, top: number): Point[] {
  const highest = tipDepth - top;
  const side: Point[] = [];
  for (let i = 0; i <= STEPS / 2; i++) {
    // Denser at the tip, where noses and beads curve.
    const h = highest * (i / (STEPS / 2)) ** 2;
    side.push({ x: radiusAtHeight(cutter, h), y: tipDepth - h });
  }
  if (cutter.kind === 'beading') {
    const { profileRadius: R, tipFlat: t } = cutter;
    // Where the profile turns upright.
    if (R < highest) side.push({ x: t / 2 + R, y: tipDepth - heightAtRadius(cutter, t / 2 + R) });
    side.sort((a, b) => b.y - a.y || a.x - b.x);
  }
  return [
    ...side.map((p) => ({ x: offset - p.x, y: p.y })).reverse(),
    ...side.map((p) => ({ x: offset + p.x, y: p.y })),
  ];
}
