import { useMemo, useState } from 'react';
import { Link } from 'react-router';
import type { TracedFramesAdded, Tracing } from '#shared/contracts/tracings.ts';
import { PLAIN_TRACE } from '#shared/kernel/tracing/traced-drawing.ts';
import { UNIT_WORDS } from '#shared/kernel/units/unit.ts';
import { isCode } from '../../lib/api-error.ts';
import { fieldMessagesOf } from '../../lib/field-messages.ts';
import { sayError } from '../../lib/say-error.ts';
import { Button } from '../../ui/button.tsx';
import { ButtonLink } from '../../ui/button-link.tsx';
import { LeaveUnsavedDialog } from '../../ui/leave-unsaved-dialog.tsx';
import { Notice } from '../../ui/notice.tsx';
import { plural } from '../../ui/plural.ts';
import { ProgressText } from '../../ui/progress-text.tsx';
import { Sheet } from '../../ui/sheet.tsx';
import { TitleBlock, TitleCell } from '../../ui/title-block.tsx';
import { useAddFrames } from './api/add-frames.ts';
import { drawnLoops } from './model/loop-contours.ts';
import { framesOfRoles, planFrames, rememberMembers, type FramePlans } from './model/frame-plans.ts';
import { hasSaid } from './model/review.ts';
import { useDrawingReview } from './model/use-drawing-review.ts';
import { whyNoFrames } from './model/why-no-frames.ts';
import { ReviewDesk } from './review-desk.tsx';

interface TracingPageProps {
  readonly tracing: Tracing;
  readonly shopName: string;
  readonly mayEdit: boolean;
  readonly onAdded: (frames: TracedFramesAdded['frames']) => void;
}

const NO_PLANS: FramePlans = { frames: [], problems: [] };

const sayFields = (error: Error): string =>
  Object.entries(fieldMessagesOf(error))
    .map(([path, message]) => `${path}: ${message}`)
    .join(' ');

/** The review of an uploaded drawing: how it is read, what each loop is, and the frames that come of it. */
export function TracingPage({ tracing, shopName, mayEdit, onAdded }: TracingPageProps) {
  const work = useDrawingReview(tracing.id);
  const add = useAddFrames();
  const [confirmed, setConfirmed] = useState(false);
  const { shown, options } = work;
  const review = shown?.review;
  const drawing = review?.drawing;
  const loops = useMemo(() => drawnLoops(drawing?.loops ?? []), [drawing]);
  const view = shown?.options.view ?? 'front';
  const unit = drawing?.unit ?? null;
  // Another drawing or another side has frames of its own, even where the loops have the same numbers.
  const membersOf = useMemo(() => ({ drawing, view, of: rememberMembers(unit ?? 'in') }), [drawing, view, unit]);
  // Working the frames out takes a while where there are thousands of loops: not with each letter of a name.
  const roles = review?.roles;
  const traced = useMemo(
    () => (drawing && roles ? framesOfRoles({ review: { drawing, roles }, loops, view }) : null),
    [drawing, roles, loops, view],
  );
  const plans = useMemo(
    () =>
      review && traced ? planFrames({ traced, review, fileName: tracing.fileName, membersOf: membersOf.of }) : NO_PLANS,
    [review, traced, tracing.fileName, membersOf],
  );
  const whyNot = drawing ? whyNoFrames(drawing, plans, confirmed) : 'The drawing is not read yet.';
  const count = plans.frames.length;
  const unread = work.error === null ? 'reading' : 'not read';

  function addFrames() {
    if (!shown || whyNot !== '' || work.isReading) return;
    add.mutate(
      {
        tracingId: tracing.id,
        options: shown.options,
        confirmed,
        roles: [...shown.review.roles],
        frames: plans.frames.map(({ name, asMembers }) => ({ name: name.trim(), asMembers })),
      },
      { onSuccess: ({ frames }) => onAdded(frames) },
    );
  }

  // Once frames are added nothing is lost by leaving.
  const unsaved = mayEdit && !add.isSuccess && review !== undefined && (hasSaid(review) || options !== PLAIN_TRACE);
  return (
    <Sheet
      bare
      title={tracing.fileName}
      showTitle={false}
      crumbs={[
        { label: 'Jobs', to: '/jobs' },
        { label: tracing.jobName, to: `/jobs/${tracing.jobId}` },
        { label: tracing.fileName },
      ]}
      titleBlock={
        <TitleBlock
          action={
            mayEdit ? (
              <Button
                kind="main"
                wide
                disabled={whyNot !== '' || work.isReading}
                busy={add.isPending ? 'Adding' : ''}
                onClick={addFrames}
              >
                {count === 0 ? 'Add frames' : `Add ${plural(count, 'frame')}`}
              </Button>
            ) : undefined
          }
          actionNote={mayEdit ? whyNot || `to ${tracing.jobName}` : 'Designers and the owner add frames'}
        >
          <TitleCell label="Shop">{shopName}</TitleCell>
          <TitleCell label="Drawing" main detail={tracing.jobName}>
            {tracing.fileName}
          </TitleCell>
          <TitleCell label="Frames" detail={drawing && plural(drawing.loops.length, 'loop')}>
            {drawing ? String(count) : unread}
          </TitleCell>
          <TitleCell label="Unit">{unit ? UNIT_WORDS[unit] : drawing ? 'not chosen' : unread}</TitleCell>
          <TitleCell label="Added so far">{plural(tracing.frames.length, 'frame')}</TitleCell>
        </TitleBlock>
      }
    >
      <div className="empty:hidden [&>*]:mx-4 [&>*]:mt-2">
        {add.isError && (
          <Notice level="stop" word="Not added" live>
            {sayError(add.error)} {sayFields(add.error)}
          </Notice>
        )}
        {work.error !== null && (
          <Notice
            level="stop"
            word="Not read"
            live
            action={
              <span className="flex flex-wrap gap-3">
                {work.goBack && <Button onClick={work.goBack}>Back to the last reading</Button>}
                {!isCode(work.error, 'drawing-refused') && <Button onClick={work.readAgain}>Try again</Button>}
                {!work.goBack && mayEdit && (
                  <ButtonLink to={`/jobs/${tracing.jobId}/drawings`}>Another drawing</ButtonLink>
                )}
              </span>
            }
          >
            {sayError(work.error)} {sayFields(work.error)}
          </Notice>
        )}
        {tracing.frames.length > 0 && (
          <Notice level="note" word="Added before">
            {tracing.frames.map(({ id, name }, i) => (
              <span key={id}>
                {i > 0 && ', '}
                <Link to={`/frames/${id}`} className="inline-block min-h-6 underline underline-offset-4">
                  {name}
                </Link>
              </span>
            ))}
          </Notice>
        )}
        {tracing.removed && (
          <Notice level="note" word="Put away">
            This drawing is put away; frames can be added all the same.
          </Notice>
        )}
        {work.isReading && (
          <div className="pb-2">
            <ProgressText
              cancel={
                work.goBack ? (
                  <Button kind="quiet" onClick={work.goBack}>
                    Cancel
                  </Button>
                ) : (
                  <ButtonLink kind="quiet" to={`/jobs/${tracing.jobId}`}>
                    Cancel
                  </ButtonLink>
                )
              }
            >
              {work.goBack ? 'Reading the drawing again.' : `Reading ${tracing.fileName}.`}
            </ProgressText>
          </div>
        )}
      </div>
      {shown && (
        <ReviewDesk
          review={shown.review}
          onReview={work.setReview}
          options={options}
          onOptions={work.setOptions}
          isReading={work.isReading}
          loops={loops}
          plans={plans}
          mayEdit={mayEdit}
          confirmed={confirmed}
          onConfirmed={setConfirmed}
        />
      )}
      <LeaveUnsavedDialog name={`What you said of ${tracing.fileName}`} unsaved={unsaved}>
        Stay and add the frames, or leave: the drawing stays with the job, what you said of its loops and how it is read
        does not.
      </LeaveUnsavedDialog>
    </Sheet>
  );
}
