import { useId, useMemo, useRef, useState, type KeyboardEvent } from 'react';
import type { Extents, Point } from '#shared/kernel/contour/contour.ts';
import type { LoopRole } from '#shared/kernel/tracing/frames/loop-role.ts';
import { Button } from '../../../ui/button.tsx';
import { Choice } from '../../../ui/choice.tsx';
import { classNames } from '../../../ui/class-names.ts';
import { usePageSize } from '../../../ui/use-page-size.ts';
import type { DrawnLoop } from '../model/loop-contours.ts';
import { nextPick, pickLoops } from '../model/pick-loops.ts';
import { fitPlan, keepDrawable, zoomPlan, ZOOM_STEP, type PlanView } from '../model/plan-view.ts';
import type { Review } from '../model/review.ts';
import { PlanLegend } from './plan-legend.tsx';
import { PlanLines, type Shown } from './plan-lines.tsx';
import { PlanMarks } from './plan-marks.tsx';
import { PLAN_KEYS, pressPlanKey } from './press-plan-key.ts';
import { usePlanPointer } from './use-plan-pointer.ts';

/** A place to go to; a new object each time it is asked for. */
export interface ShowPlace {
  readonly extents: Extents;
}

interface PlanDrawingProps {
  readonly review: Review;
  readonly loops: readonly DrawnLoop[];
  readonly chosen: ReadonlySet<number>;
  readonly onChosen: (chosen: ReadonlySet<number>) => void;
  /** Left out for people who may only look. */
  readonly onRole?: (role: LoopRole) => void;
  readonly pinned: number | null;
  readonly show: ShowPlace | null;
  /** Another reading is under way. */
  readonly dimmed: boolean;
}

const SHOWN = [
  { value: 'found', label: 'As found' },
  { value: 'healed', label: 'As healed' },
  { value: 'both', label: 'Both' },
] as const;

/** A place without size is shown with this share of the drawing about it. */
const PLACE_SHARE = 0.12;
const NO_EXTENTS: Extents = { minX: 0, minY: 0, maxX: 1, maxY: 1 };
const UNKNOWN_SIZE = { width: 400, height: 400 };

/** Somebody's drawing, to look at and to pick loops on, by mouse, touch and keyboard. */
export function PlanDrawing({ review, loops, chosen, onChosen, onRole, pinned, show, dimmed }: PlanDrawingProps) {
  const id = useId();
  const area = useRef<HTMLDivElement>(null);
  const svg = useRef<SVGSVGElement>(null);
  const size = usePageSize(area) ?? UNKNOWN_SIZE;
  const [moved, setMoved] = useState<PlanView | null>(null);
  const [shown, setShown] = useState<Shown>('both');
  const { drawing, roles } = review;
  const extents = drawing.extents ?? NO_EXTENTS;
  const span = Math.max(extents.maxX - extents.minX, extents.maxY - extents.minY) || 1;
  const fitted = fitPlan(extents, size, span * PLACE_SHARE);
  const view = moved ?? fitted;
  const look = (next: PlanView | null) => setMoved(next && keepDrawable(next, view, fitted));

  const [went, setWent] = useState<ShowPlace | null>(null);
  if (show !== went) {
    setWent(show);
    if (show !== null) setMoved(fitPlan(show.extents, size, span * PLACE_SHARE));
  }

  const click = (at: Point, more: boolean) => {
    const pick = nextPick(pickLoops(loops, at), more ? new Set() : chosen);
    if (pick === undefined) return more ? undefined : onChosen(new Set());
    if (!more) return onChosen(new Set([pick]));
    const next = new Set(chosen);
    if (!next.delete(pick)) next.add(pick);
    onChosen(next);
  };
  const pointer = usePlanPointer(svg, { view, size, onView: look, onClick: click });

  function press(event: KeyboardEvent<HTMLElement>) {
    if (event.ctrlKey || event.metaKey || event.altKey || event.target !== event.currentTarget) return;
    const wish = pressPlanKey(event.key, event.shiftKey, view);
    if (wish === undefined) return;
    event.preventDefault();
    if ('view' in wish) look(wish.view);
    else if ('chooseNone' in wish) onChosen(new Set());
    else if ('role' in wish) onRole?.(wish.role);
    else if (loops.length > 0) {
      const from = [...chosen].at(-1) ?? (wish.step > 0 ? -1 : 0);
      onChosen(new Set([(from + wish.step + loops.length) % loops.length]));
    }
  }

  const words = useMemo(() => {
    const count = (role: LoopRole) => roles.filter((other) => other === role).length;
    return drawing.unit === null
      ? `${drawing.segments} lines and arcs as found`
      : `${count('perimeter')} perimeters, ${count('opening')} openings, ${count('dado')} dados, ${count('leave-out')} left out, ${drawing.open.length} that do not close`;
  }, [drawing, roles]);

  const { scale, centre } = view;
  const matrix = [scale, 0, 0, -scale, size.width / 2 - scale * centre.x, size.height / 2 + scale * centre.y];
  return (
    <div className="flex min-h-0 min-w-0 flex-1 flex-col">
      <div
        ref={area}
        role="group"
        tabIndex={0}
        aria-label="Drawing: pick loops and say what they are"
        aria-describedby={id}
        onKeyDown={press}
        className="relative min-h-48 flex-1 overflow-hidden focus-visible:-outline-offset-2"
      >
        <svg
          ref={svg}
          role="img"
          aria-label={`Drawing: ${words}`}
          className={classNames('absolute inset-0 size-full touch-none select-none', dimmed && 'opacity-40')}
          {...pointer}
        >
          <g transform={`matrix(${matrix.join(' ')})`}>
            <PlanLines drawing={drawing} loops={loops} roles={roles} chosen={chosen} shown={shown} />
          </g>
          <PlanMarks problems={drawing.problems} pinned={pinned} view={view} size={size} />
        </svg>
      </div>
      <p id={id} className="sr-only">
        {PLAN_KEYS}
      </p>
      <div className="flex flex-wrap items-center gap-x-4 gap-y-1 border-t border-rule px-3 py-1 print:hidden">
        {drawing.unit !== null && (
          <div className="w-80 shrink-0 [&>fieldset]:mb-0">
            <Choice label="Shown" hideLabel options={SHOWN} value={shown} onValue={setShown} />
          </div>
        )}
        {drawing.unit !== null && <PlanLegend drawing={drawing} roles={roles} />}
        <span className="ml-auto flex gap-x-3 text-12">
          <Button kind="quiet" aria-label="Zoom in" onClick={() => look(zoomPlan(view, ZOOM_STEP))}>
            + Zoom
          </Button>
          <Button kind="quiet" aria-label="Zoom out" onClick={() => look(zoomPlan(view, 1 / ZOOM_STEP))}>
            − Zoom
          </Button>
          <Button kind="quiet" onClick={() => setMoved(null)}>
            Fit
          </Button>
        </span>
      </div>
      {drawing.found === null && (
        <p className="px-3 pb-1 text-11 text-pencil">
          {drawing.segments} lines and arcs are too many to draw as found; what they healed to is drawn.
        </p>
      )}
    </div>
  );
}
