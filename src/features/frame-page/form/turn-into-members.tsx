import { useState } from 'react';
import { membersFromTraced } from '#shared/kernel/tracing/frames/members-from-traced.ts';
import type { TracedOutline } from '#shared/kernel/particulars/particulars.ts';
import { Button } from '../../../ui/button.tsx';
import { Notice } from '../../../ui/notice.tsx';
import { useDesk } from '../model/desk.ts';

/** Makes stiles, rails and a layout out of a traced outline, as one step that can be taken back; says why where it cannot. */
export function TurnIntoMembers() {
  const { editor, readOnly } = useDesk();
  /** Why it could not be, and of which outline that was said. */
  const [refused, setRefused] = useState<{ readonly outline: TracedOutline; readonly why: string } | null>(null);
  if (readOnly) return null;

  function turn() {
    const { present } = editor.store.get().history;
    if (present.outline.kind !== 'traced') return;
    const members = membersFromTraced(present.outline, present.unit);
    const takes = members.ok ? editor.apply({ ...present, outline: members.outline }, 'Turn into members') : '';
    const why = members.ok ? takes && `Takes ${takes}.` : members.problem.message;
    setRefused(why === '' ? null : { outline: present.outline, why });
  }

  const outline = editor.store.get().history.present.outline;
  return (
    <div className="mt-2">
      <Button onClick={turn}>Turn into members</Button>
      <p className="mt-1 text-11 text-pencil">
        Stiles and rails whose sizes can be typed, in place of the traced lines.
      </p>
      {refused !== null && refused.outline === outline && (
        <div className="mt-1 text-12">
          <Notice level="caution" word="It stays as traced" live>
            {refused.why}
          </Notice>
        </div>
      )}
    </div>
  );
}
