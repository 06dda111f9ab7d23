import type { Comparison, FeatureChange } from '#shared/kernel/compare/comparison.ts';
import type { Face } from '#shared/kernel/line-sets/line-set.ts';
import { classNames } from '../../ui/class-names.ts';
import { pictureBox } from './picture-box.ts';
import { extentsPath, StateLines } from './state-lines.tsx';

export type Side = 'before' | 'after';

/** Paper around a word, as a share of its size, so that it can be read over lines. */
const HALO = 0.3;

interface ComparedPictureProps {
  readonly comparison: Comparison;
  readonly face: Face;
  /** One state, or both over each other. */
  readonly sides: readonly Side[];
  /** For both: 0 shows the older state alone, 1 the newer. */
  readonly fade: number;
  readonly picked: FeatureChange | undefined;
  /** What the states are called, such as "A" and "draft". */
  readonly name: string;
}

/** Whether a face has the line of a change; members are seen on both. */
const isOnFace = ({ kind }: FeatureChange, face: Face) => (kind === 'dado' ? face === 'back' : true);

/** One face of one state or of both, with what came and what went named, and the picked change lit up. */
export function ComparedPicture({ comparison, face, sides, fade, picked, name }: ComparedPictureProps) {
  const { before, after, features } = comparison;
  const box = pictureBox(before, after, face);
  const overlaid = sides.length > 1;
  const strength: Record<Side, number> = overlaid
    ? { before: Math.min(1, 2 * (1 - fade)), after: Math.min(1, 2 * fade) }
    : { before: 1, after: 1 };
  const alone = (side: Side) => {
    const other = side === 'before' ? 'after' : 'before';
    return features.filter((change) => change[other] === null && change.kind !== 'member' && isOnFace(change, face));
  };
  return (
    <figure className="min-w-0">
      <figcaption className={classNames('mb-1 font-bold', face === 'back' ? 'text-back' : 'text-front')}>
        {face === 'back' ? 'Back' : 'Front'}, {name}
      </figcaption>
      <svg
        role="img"
        aria-label={`${face === 'back' ? 'Back' : 'Front'}, ${name}`}
        viewBox={box.viewBox}
        className="h-72 w-full lg:h-96 print:h-64"
      >
        {sides.toReversed().map((side) => (
          <g key={side} opacity={strength[side]}>
            <g transform={box.transform}>
              <StateLines
                state={comparison[side]}
                face={face}
                alone={new Set(alone(side).map((change) => change[side]!.id))}
                side={side}
                under={overlaid && side === 'before'}
              />
            </g>
            {alone(side).map((change) => {
              const { minX, maxX, minY, maxY } = change[side]!.extents;
              const { x, y } = box.at({ x: (minX + maxX) / 2, y: (minY + maxY) / 2 });
              return (
                <text
                  key={change[side]!.id}
                  x={x}
                  y={y}
                  fontSize={box.textSize}
                  textAnchor="middle"
                  dominantBaseline="middle"
                  strokeWidth={box.textSize * HALO}
                  className={classNames(
                    'stroke-paper [paint-order:stroke]',
                    side === 'before' ? 'fill-stop' : face === 'back' ? 'fill-back' : 'fill-front',
                  )}
                >
                  {side === 'before' ? 'went' : 'came'}
                </text>
              );
            })}
          </g>
        ))}
        {picked && (
          <g transform={box.transform}>
            {sides.map((side) => {
              const place = picked[side];
              return (
                place && (
                  <path
                    key={side}
                    data-lit={place.id}
                    d={extentsPath(place.extents)}
                    vectorEffect="non-scaling-stroke"
                    className={classNames(
                      'fill-caution/20 stroke-caution [stroke-width:4]',
                      side === 'before' && '[stroke-dasharray:9_5]',
                    )}
                  />
                )
              );
            })}
          </g>
        )}
      </svg>
    </figure>
  );
}
