import { useState } from 'react';
import type { LoopRole } from '#shared/kernel/tracing/frames/loop-role.ts';
import type { TraceOptions } from '#shared/kernel/tracing/traced-drawing.ts';
import { Checkbox } from '../../ui/checkbox.tsx';
import { Notice } from '../../ui/notice.tsx';
import { plural } from '../../ui/plural.ts';
import { CensusSection } from './census-section.tsx';
import { PlanDrawing, type ShowPlace } from './drawing/plan-drawing.tsx';
import { FramesSection } from './frames-section.tsx';
import { LoopsSection } from './loops-section.tsx';
import type { FramePlans } from './model/frame-plans.ts';
import type { DrawnLoop } from './model/loop-contours.ts';
import { chooseMembers, giveRole, nameFrame, redoRole, undoRole, type Review } from './model/review.ts';
import { useReviewKeys } from './model/use-review-keys.ts';
import { nameProblem } from './model/why-no-frames.ts';
import { loopName, ROLE_WORDS } from './model/words.ts';
import { ProblemsList } from './problems-list.tsx';
import { ReadingOptions } from './reading-options.tsx';
import { RoleBar } from './role-bar.tsx';
import { UnitQuestion } from './unit-question.tsx';

interface ReviewDeskProps {
  readonly review: Review;
  readonly onReview: (change: (review: Review) => Review) => void;
  readonly options: TraceOptions;
  readonly onOptions: (options: TraceOptions) => void;
  /** Another reading is under way: this one stays in sight, dimmed. */
  readonly isReading: boolean;
  readonly loops: readonly DrawnLoop[];
  readonly plans: FramePlans;
  readonly mayEdit: boolean;
  readonly confirmed: boolean;
  readonly onConfirmed: (confirmed: boolean) => void;
}

const NONE: ReadonlySet<number> = new Set();

/** Everything that is seen and said of a drawing: its sections at the left, the drawing at the right. */
export function ReviewDesk(props: ReviewDeskProps) {
  const { review, onReview, options, onOptions, isReading, loops, plans, mayEdit, confirmed, onConfirmed } = props;
  const { drawing, roles, lost } = review;
  const [picked, setPicked] = useState({ loops, chosen: NONE });
  const [pinned, setPinned] = useState<number | null>(null);
  const [show, setShow] = useState<ShowPlace | null>(null);
  // Places in another reading are other loops and problems.
  if (picked.loops !== loops) {
    setPicked({ loops, chosen: NONE });
    setPinned(null);
  }
  const chosen = picked.loops === loops ? picked.chosen : NONE;
  const setChosen = (next: ReadonlySet<number>) => setPicked({ loops, chosen: next });

  const undo = () => onReview(undoRole);
  const redo = () => onReview(redoRole);
  useReviewKeys(undo, redo);
  const makeThem = (which: readonly number[], role: LoopRole) => {
    const who = which.length === 1 ? loopName(which[0]!) : plural(which.length, 'loop');
    onReview((now) => giveRole(now, which, role, `${who}: ${ROLE_WORDS[role].toLowerCase()}`));
  };
  const choose = (loop: number) => {
    setChosen(new Set([loop]));
    setShow({ extents: loops[loop]!.extents });
  };
  const pin = (place: number) => {
    const at = drawing.problems[place]?.at;
    setPinned(place);
    if (at) setShow({ extents: { minX: at[0], maxX: at[0], minY: at[1], maxY: at[1] } });
  };

  const problems = (
    <ProblemsList
      problems={drawing.problems}
      origin={drawing.origin}
      unit={drawing.unit}
      counts={drawing.counts}
      pinned={pinned}
      onShow={pin}
    />
  );
  const census = (
    <CensusSection census={drawing.census} placed={drawing.placed} options={options} onOptions={onOptions} />
  );
  return (
    <div aria-busy={isReading} className="flex min-h-0 flex-1 flex-col-reverse border-t border-rule md:flex-row">
      <div
        data-fields=""
        className="relative min-h-0 shrink-0 overflow-y-auto border-t border-ink px-4 pt-4 max-md:h-1/2 md:w-84 md:border-t-0 md:border-r 2xl:w-104"
      >
        {lost > 0 && (
          <Notice level="caution" live>
            {`What you said of ${plural(lost, 'loop')} of the reading before is not carried over: there is no such loop in this one.`}
          </Notice>
        )}
        {drawing.unit === null ? (
          <>
            <UnitQuestion drawing={drawing} onUnit={(unit) => onOptions({ ...options, unit })} />
            {problems}
          </>
        ) : (
          <>
            {drawing.incomplete && mayEdit && (
              <Notice level="stop" word="Not whole">
                The end of the file is missing. What came before it is drawn here.
                <Checkbox
                  label="I have looked at it: all that belongs to the frames is there"
                  checked={confirmed}
                  onChecked={onConfirmed}
                />
              </Notice>
            )}
            <FramesSection
              plans={plans}
              unit={drawing.unit}
              mayEdit={mayEdit}
              wrongName={(i) => nameProblem(plans.frames[i]!.name)}
              onName={(perimeter, name) => onReview((now) => nameFrame(now, perimeter, name))}
              onMembers={(perimeter, on) => onReview((now) => chooseMembers(now, perimeter, on))}
              onChoose={choose}
            />
            {problems}
            <ReadingOptions drawing={drawing} options={options} onOptions={onOptions} />
            <LoopsSection
              loops={loops}
              roles={roles}
              unit={drawing.unit}
              chosen={chosen}
              onChosen={setChosen}
              mayEdit={mayEdit}
              onRole={makeThem}
            />
          </>
        )}
        {census}
      </div>
      <div className="flex min-h-0 min-w-0 flex-1 flex-col">
        {drawing.unit !== null && (
          <RoleBar
            review={review}
            loops={loops}
            unit={drawing.unit}
            chosen={chosen}
            mayEdit={mayEdit}
            onRole={(role) => makeThem([...chosen], role)}
            onUndo={undo}
            onRedo={redo}
          />
        )}
        <PlanDrawing
          review={review}
          loops={loops}
          chosen={chosen}
          onChosen={setChosen}
          onRole={mayEdit ? (role) => chosen.size > 0 && makeThem([...chosen], role) : undefined}
          pinned={pinned}
          show={show}
          dimmed={isReading}
        />
      </div>
    </div>
  );
}
