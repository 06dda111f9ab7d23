import { cutterSilhouette } from '#shared/kernel/cutter-drawer/cutter-profile.ts';
import type { Cutter } from '#shared/kernel/cutters/cutter.ts';
import { describeCutter } from '#shared/kernel/cutters/describe-cutter.ts';
import type { Unit } from '#shared/kernel/units/unit.ts';

interface CutterShapeProps {
  readonly cutter: Cutter;
  readonly unit: Unit;
  readonly large?: boolean;
}

/** Fine enough that no chord shows at the sizes drawn here, as a part of the flute's length. */
const CHORD = 1 / 400;

/** The outline of a cutter from its numbers, tip down, as far as the flute goes; each fills its own box. */
export function CutterShape({ cutter, unit, large = false }: CutterShapeProps) {
  const points = cutterSilhouette(cutter, cutter.fluteLength * CHORD);
  const reach = Math.max(...points.map(({ x }) => x));
  const { fluteLength: flute } = cutter;
  const margin = Math.max(2 * reach, flute) * 0.06;
  const box = [-reach - margin, -flute - margin, 2 * (reach + margin), flute + 2 * margin];
  return (
    <svg
      role="img"
      aria-label={describeCutter(cutter, unit)}
      viewBox={box.join(' ')}
      preserveAspectRatio="xMidYMid meet"
      className={large ? 'h-44 w-full' : 'h-12 w-14'}
    >
      <polygon
        points={points.map(({ x, y }) => `${x},${-y}`).join(' ')}
        vectorEffect="non-scaling-stroke"
        className="fill-board stroke-ink stroke-[1.25]"
      />
      <line
        x1={0}
        x2={0}
        y1={margin}
        y2={-flute - margin}
        vectorEffect="non-scaling-stroke"
        strokeDasharray="5 2 1 2"
        className="stroke-pencil stroke-[0.75]"
      />
    </svg>
  );
}
