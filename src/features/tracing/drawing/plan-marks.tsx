import type { Point } from '#shared/kernel/contour/contour.ts';
import type { TraceProblem } from '#shared/kernel/tracing/traced-drawing.ts';
import { classNames } from '../../../ui/class-names.ts';
import { fromPlan, type PlanSize, type PlanView } from '../model/plan-view.ts';
import { problemLook } from '../model/words.ts';

interface PlanMarksProps {
  readonly problems: readonly TraceProblem[];
  /** Place of the problem in the list that is pinned; null: none. */
  readonly pinned: number | null;
  readonly view: PlanView;
  readonly size: PlanSize;
}

/** More marks than this hide the drawing; the list has them all. */
const MOST_MARKS = 150;

const COLOURS = { stop: 'stroke-stop', caution: 'stroke-caution', note: 'stroke-pencil' } as const;
const TEXT_COLOURS = { stop: 'fill-stop', caution: 'fill-caution', note: 'fill-ink' } as const;

const isIn = (p: Point, { width, height }: PlanSize): boolean => p.x >= 0 && p.y >= 0 && p.x <= width && p.y <= height;

/** A cross at the place of each problem, with its number in the list; the pinned one with a ring and its word. */
export function PlanMarks({ problems, pinned, view, size }: PlanMarksProps) {
  const placed = problems.flatMap(({ code, at }, i) => {
    if (at === undefined) return [];
    const p = fromPlan(view, size, { x: at[0], y: at[1] });
    return isIn(p, size) ? [{ i, p, look: problemLook(code) }] : [];
  });
  const shown = placed.filter(({ i }, k) => k < MOST_MARKS || i === pinned);
  return shown.map(({ i, p, look }) => (
    <g key={i} transform={`translate(${p.x} ${p.y})`} className={classNames('fill-none', COLOURS[look.level])}>
      <path d="M-5 -5L5 5M-5 5L5 -5" className={i === pinned ? 'stroke-[3px]' : 'stroke-[1.5px]'} />
      {i === pinned && <circle r={16} className="stroke-2" />}
      <text
        x={i === pinned ? 20 : 8}
        y={-6}
        className={classNames('stroke-none text-11', TEXT_COLOURS[look.level], i === pinned && 'font-bold')}
      >
        {i === pinned ? `${i + 1} ${look.word}` : i + 1}
      </text>
    </g>
  ));
}
