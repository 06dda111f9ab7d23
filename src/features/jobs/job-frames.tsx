import { useState, type ReactNode } from 'react';
import type { FrameRow } from '#shared/contracts/jobs.ts';
import { sayError } from '../../lib/say-error.ts';
import { Empty } from '../../ui/empty.tsx';
import { Notice } from '../../ui/notice.tsx';
import { ProgressText } from '../../ui/progress-text.tsx';
import { UndoNotice } from '../../ui/undo-notice.tsx';
import { useChangeFrame } from './api/change-frame.ts';
import { useCopyFrame } from './api/copy-frame.ts';
import { copyName } from './copy-name.ts';
import { FrameChoice } from './frame-choice.tsx';
import { FramesTable } from './frames-table.tsx';

interface JobFramesProps {
  readonly frames: readonly FrameRow[];
  readonly mayEdit: boolean;
  readonly drawing: (row: FrameRow) => ReactNode;
  /** More to do with a frame. */
  readonly actions?: (row: FrameRow) => ReactNode;
  /** Offered on an empty job. */
  readonly newFrame: ReactNode;
}

/** The frames of a job, with copying, putting away and its undoing. */
export function JobFrames({ frames, mayEdit, drawing, actions, newFrame }: JobFramesProps) {
  const [putAway, setPutAway] = useState<{ id: string; name: string } | null>(null);
  const [chosen, setChosen] = useState<ReadonlySet<string>>(new Set());
  const change = useChangeFrame();
  const copy = useCopyFrame();
  const failed = change.error ?? copy.error;

  const choose = (id: string, isChosen: boolean) =>
    setChosen((now) => new Set(isChosen ? [...now, id] : [...now].filter((other) => other !== id)));
  const away = ({ id, name }: FrameRow) =>
    change.mutate({ frameId: id, change: { removed: true } }, { onSuccess: () => setPutAway({ id, name }) });
  const back = (frameId: string) =>
    change.mutate({ frameId, change: { removed: false } }, { onSuccess: () => setPutAway(null) });
  const copyRow = ({ id, name }: FrameRow) =>
    copy.mutate({
      frameId: id,
      name: copyName(
        name,
        frames.map((frame) => frame.name),
      ),
    });

  return (
    <>
      {failed && (
        <Notice level="stop" word="Not done" live>
          {sayError(failed)}
        </Notice>
      )}
      {copy.isPending && <ProgressText>Copying the frame.</ProgressText>}
      {putAway && (
        <UndoNotice busy={change.isPending} onUndo={() => back(putAway.id)}>
          {`“${putAway.name}” is put away.`}
        </UndoNotice>
      )}
      {frames.length > 0 ? (
        <>
          {mayEdit && <FrameChoice frames={frames} chosen={chosen} onChosen={setChosen} />}
          <FramesTable
            frames={frames}
            drawing={drawing}
            choosing={mayEdit ? { chosen, onChosen: choose } : undefined}
            actions={actions}
            onCopy={mayEdit ? copyRow : undefined}
            onPutAway={mayEdit ? away : undefined}
          />
        </>
      ) : mayEdit ? (
        <Empty title="No frames yet" actions={newFrame}>
          A new frame begins as a two-opening base frame that can be cut as it stands; change its size and openings on
          its page. Frame files can be imported too.
        </Empty>
      ) : (
        <Empty title="No frames yet">A designer or the owner of the shop puts them in.</Empty>
      )}
    </>
  );
}
