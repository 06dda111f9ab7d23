import { useState } from 'react';
import type { Frame } from '#shared/contracts/frames.ts';
import { listChanges } from '#shared/kernel/particulars/list-changes.ts';
import { Button } from '../../../ui/button.tsx';
import { Notice } from '../../../ui/notice.tsx';
import { When } from '../../../ui/when.tsx';
import type { FrameEditor } from '../model/frame-editor.ts';
import { dropEarlierCopy, findEarlierCopy } from '../model/unsaved-copy.ts';
import type { TwoDrafts } from './stale-dialog.tsx';

interface EarlierCopyNoticeProps {
  readonly frame: Frame;
  readonly editor: FrameEditor;
  /** The frame was saved by somebody since: a person must choose. */
  readonly onConflict: (drafts: TwoDrafts) => void;
}

/** Offers work that did not reach the server when this frame was open in this browser before. */
export function EarlierCopyNotice({ frame, editor, onConflict }: EarlierCopyNoticeProps) {
  const [copy, setCopy] = useState(() => {
    const found = findEarlierCopy(localStorage, frame.id);
    if (found === null || listChanges(frame.particulars, found.mine).length > 0) return found;
    // It reached the server after all.
    dropEarlierCopy(localStorage, frame.id);
    return null;
  });
  if (copy === null) return null;
  const done = () => {
    dropEarlierCopy(localStorage, frame.id);
    setCopy(null);
  };
  function takeUp() {
    if (copy === null) return;
    if (copy.version === frame.version) editor.apply(copy.mine, 'Work kept in this browser');
    else
      onConflict({
        base: copy.base,
        mine: copy.mine,
        theirs: editor.store.get().history.present,
        changedBy: frame.changedBy,
        changedAt: frame.changedAt,
      });
    done();
  }
  return (
    <Notice
      level="caution"
      word="Not saved last time"
      live
      action={
        <>
          <Button onClick={takeUp}>Take it up again</Button>
          <Button kind="quiet" onClick={done}>
            Discard
          </Button>
        </>
      }
    >
      Work on this frame from <When iso={copy.at} /> did not reach the server. This browser kept it.
    </Notice>
  );
}
