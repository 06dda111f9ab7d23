import { useMemo, useState } from 'react';
import { LIMITS } from '#shared/contracts/limits.ts';
import type { Frame } from '#shared/contracts/frames.ts';
import { checkFrame } from '#shared/kernel/check-frame.ts';
import { isCode } from '../../../lib/api-error.ts';
import { sayError } from '../../../lib/say-error.ts';
import { Button } from '../../../ui/button.tsx';
import { Checkbox } from '../../../ui/checkbox.tsx';
import { Dialog } from '../../../ui/dialog.tsx';
import { Notice } from '../../../ui/notice.tsx';
import { plural } from '../../../ui/plural.ts';
import { Section } from '../../../ui/section.tsx';
import { TextField } from '../../../ui/text-field.tsx';
import { useReleaseRevision } from '../api/release-revision.ts';
import type { Autosave } from '../model/autosave.ts';
import { useEditor } from '../model/desk.ts';

interface ReleaseDialogProps {
  readonly frameId: string;
  /** The letter that the release will have. */
  readonly letter: string;
  readonly autosave: Autosave;
  readonly onReleased: (frame: Frame) => void;
  readonly onClose: () => void;
}

/** Freezes the draft under the next letter, once nothing stops it and each caution has been looked at. */
export function ReleaseDialog({ frameId, letter, autosave, onReleased, onClose }: ReleaseDialogProps) {
  const lines = useEditor((s) => s.lines);
  const { findings } = useMemo(() => checkFrame(lines), [lines]);
  const wrong = useEditor((s) => s.wrong.size);
  const [note, setNote] = useState('');
  const [looked, setLooked] = useState<ReadonlySet<string>>(new Set());
  const [notSaved, setNotSaved] = useState(false);
  const [saving, setSaving] = useState(false);
  const release = useReleaseRevision();

  const stops = findings.filter((f) => f.level === 'stop');
  const cautions = findings.filter((f) => f.level === 'caution');
  const notes = findings.filter((f) => f.level === 'note');
  const left = cautions.filter((f) => !looked.has(f.text)).length;
  const stopped = stops.length > 0 || wrong > 0;

  function look(text: string, checked: boolean) {
    const next = new Set(looked);
    if (checked) next.add(text);
    else next.delete(text);
    setLooked(next);
  }

  async function go() {
    setSaving(true);
    const saved = await autosave.flush();
    setSaving(false);
    setNotSaved(!saved);
    if (!saved) return;
    const acknowledged = [...new Set(cautions.map((f) => f.code))];
    release.mutate(
      { frameId, version: autosave.version(), note: note.trim(), acknowledged },
      {
        onSuccess: onReleased,
        onError: (error) => {
          if (!isCode(error, 'stale-draft')) return;
          autosave.meet(error);
          onClose();
        },
      },
    );
  }

  const waits = stopped ? 'Mend what stops it first.' : left > 0 ? `${plural(left, 'caution')} not looked at yet.` : '';
  return (
    <Dialog
      title={`Release revision ${letter}`}
      onClose={onClose}
      actions={
        <>
          <Button
            kind="main"
            disabled={waits !== ''}
            busy={saving ? 'Saving the draft' : release.isPending ? 'Writing and proving the files' : ''}
            onClick={() => void go()}
          >
            Release revision {letter}
          </Button>
          {waits !== '' && <p className="self-center text-12">{waits}</p>}
        </>
      }
    >
      <p className="mb-3">
        The frame is frozen as it is now and cannot be changed any more. Work goes on in the draft.
      </p>
      {notSaved && (
        <Notice level="stop" word="Not released" live>
          The draft could not be saved first. See why in the title block.
        </Notice>
      )}
      {release.isError && (
        <Notice level="stop" word="Not released" live>
          {sayError(release.error)}
        </Notice>
      )}
      {wrong > 0 && (
        <Notice level="stop">
          {plural(wrong, 'entry', 'entries')} of the form could not be taken. Mend or undo that first.
        </Notice>
      )}
      {stops.map((f, i) => (
        <Notice key={i} level="stop">
          {f.text} {f.remedy}
        </Notice>
      ))}
      {cautions.length > 0 && (
        <Section heading="Cautions" aside={left === 0 ? 'all looked at' : `${left} to look at`} level={3}>
          {cautions.map((f, i) => (
            <Checkbox
              key={i}
              label={f.text}
              hint={f.remedy}
              checked={looked.has(f.text)}
              onChecked={(checked) => look(f.text, checked)}
              disabled={stopped}
            />
          ))}
        </Section>
      )}
      {notes.length > 0 && (
        <Section heading="Notes" level={3}>
          <ul className="list-disc pl-4 text-12">
            {notes.map((f, i) => (
              <li key={i}>{f.text}</li>
            ))}
          </ul>
        </Section>
      )}
      <TextField
        label="What this revision is for, or what changed"
        lines={3}
        value={note}
        onValue={setNote}
        maxLength={LIMITS.noteLength}
        hint="Stands on the setup sheet."
        disabled={stopped}
      />
    </Dialog>
  );
}
