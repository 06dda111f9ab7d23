import type { Extents } from '#shared/kernel/contour/contour.ts';
import { svgPath } from '#shared/kernel/contour/svg-path.ts';
import type { ComparedState } from '#shared/kernel/compare/compared-state.ts';
import type { FeatureId } from '#shared/kernel/frame/members.ts';
import type { Face } from '#shared/kernel/line-sets/line-set.ts';
import { classNames } from '../../ui/class-names.ts';

export const extentsPath = ({ minX, minY, maxX, maxY }: Extents): string => `M${minX} ${minY}H${maxX}V${maxY}H${minX}Z`;

interface StateLinesProps {
  readonly state: ComparedState;
  readonly face: Face;
  /** What the other state does not have. */
  readonly alone: ReadonlySet<FeatureId>;
  readonly side: 'before' | 'after';
  /** Under the other state: no board, the lines in pencil. */
  readonly under: boolean;
}

/** Classes of what only one of the states has: dashed where it went, in the face's colour where it came. */
const aloneLook = (side: 'before' | 'after', face: Face) =>
  side === 'before'
    ? 'stroke-stop [stroke-width:2.5] [stroke-dasharray:7_4]'
    : classNames('[stroke-width:3]', face === 'back' ? 'stroke-back' : 'stroke-front');

/** Perimeter and openings, and on the back the dados, of one state in frame view. */
export function StateLines({ state, face, alone, side, under }: StateLinesProps) {
  const usual = under ? 'stroke-pencil [stroke-width:1]' : 'stroke-ink [stroke-width:1.5]';
  const faint = 'stroke-pencil [stroke-width:1] [stroke-dasharray:2_3]';
  const openings = state.openings.map(({ id, contour }) => ({ id, d: svgPath(contour) }));
  const perimeter = svgPath(state.perimeter);
  return (
    <g>
      <path
        d={perimeter + openings.map(({ d }) => d).join('')}
        fillRule="evenodd"
        className={under ? 'fill-none' : 'fill-board-light'}
      />
      <path d={perimeter} vectorEffect="non-scaling-stroke" className={classNames('fill-none', usual)} />
      {openings.map(({ id, d }) => (
        <path
          key={id}
          d={d}
          data-feature={id}
          vectorEffect="non-scaling-stroke"
          className={classNames('fill-none', alone.has(id) ? aloneLook(side, face) : face === 'back' ? faint : usual)}
        />
      ))}
      {face === 'back' &&
        state.dados.map(({ id, extents }) => (
          <path
            key={id}
            d={extentsPath(extents)}
            data-feature={id}
            vectorEffect="non-scaling-stroke"
            className={classNames(under ? 'fill-none' : 'fill-back/20', alone.has(id) ? aloneLook(side, face) : usual)}
          />
        ))}
    </g>
  );
}
