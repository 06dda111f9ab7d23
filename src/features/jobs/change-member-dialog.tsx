import { useMemo, useRef, useState } from 'react';
import type { Frame } from '#shared/contracts/frames.ts';
import { memberChange } from '#shared/contracts/member-change.ts';
import { particulars as particularsSchema } from '#shared/contracts/particulars.ts';
import { CHANGEABLE, MAY_BE_NONE, type Changeable } from '#shared/kernel/starters/member-change.ts';
import { changeManyFrames } from '#shared/kernel/starters/change-members.ts';
import type { Unit } from '#shared/kernel/units/unit.ts';
import { checkForm } from '../../lib/check-form.ts';
import { sayError } from '../../lib/say-error.ts';
import { Button } from '../../ui/button.tsx';
import { Choice } from '../../ui/choice.tsx';
import { Dialog } from '../../ui/dialog.tsx';
import { Fetched } from '../../ui/fetched.tsx';
import { LengthField } from '../../ui/length-field.tsx';
import { Notice } from '../../ui/notice.tsx';
import { plural } from '../../ui/plural.ts';
import { ProgressText } from '../../ui/progress-text.tsx';
import { Select } from '../../ui/select.tsx';
import { useFrames } from './api/get-frames.ts';
import { useSaveDrafts, type DraftOutcome, type DraftToSave } from './api/save-drafts.ts';
import { ChangePreview } from './change-preview.tsx';

interface ChangeMemberDialogProps {
  readonly frameIds: readonly string[];
  /** Where the choice of unit begins. */
  readonly unit: Unit;
  readonly onClose: () => void;
}

const WHAT = CHANGEABLE.map((what) => ({
  value: what,
  label: what === 'thickness' ? 'board thickness' : what,
}));

const UNITS = [
  { value: 'in', label: 'Inches' },
  { value: 'mm', label: 'Millimetres' },
] as const;

/** Changes one member of many frames: shows what becomes of each, then saves each draft and says how that went. */
export function ChangeMemberDialog({ frameIds, unit, onClose }: ChangeMemberDialogProps) {
  const query = useFrames(frameIds);
  return (
    <Dialog title={`Change a member of ${plural(frameIds.length, 'frame')}`} onClose={onClose} wide>
      <Fetched query={query} what="the frames">
        {(frames) => <ChangeMember frames={frames} unit={unit} onClose={onClose} />}
      </Fetched>
    </Dialog>
  );
}

interface ChangeMemberProps {
  readonly frames: readonly Frame[];
  readonly unit: Unit;
  readonly onClose: () => void;
}

function ChangeMember({ frames, unit: shopUnit, onClose }: ChangeMemberProps) {
  const [what, setWhat] = useState<Changeable>('left stile');
  const [unit, setUnit] = useState<Unit>(frames[0]?.particulars.unit ?? shopUnit);
  const [to, setTo] = useState<number | null>(null);
  const [outcomes, setOutcomes] = useState<readonly DraftOutcome[]>([]);
  const [refusal, setRefusal] = useState('');
  const form = useRef<HTMLDivElement>(null);
  const stop = useRef(false);
  const save = useSaveDrafts();

  const checked = useMemo(
    () => (to === null ? undefined : checkForm(memberChange, { what, unit, to })),
    [what, unit, to],
  );
  const results = useMemo(() => {
    if (!checked?.ok) return new Map();
    return new Map(changeManyFrames(frames, [checked.value]).map(({ id, result }) => [id, result]));
  }, [frames, checked]);
  const drafts = frames.flatMap(({ id, version, particulars }): DraftToSave[] => {
    const result = results.get(id);
    if (!result?.ok || result.particulars === particulars) return [];
    return [{ frameId: id, version, particulars: particularsSchema.parse(result.particulars) }];
  });
  const begun = save.status !== 'idle';

  function send() {
    const wrong = form.current?.querySelector<HTMLElement>('[aria-invalid=true]');
    setRefusal(wrong ? 'The length cannot be read. Mend it, then save.' : '');
    wrong?.focus();
    if (wrong) return;
    save.mutate({
      drafts,
      stopped: () => stop.current,
      onOutcome: (outcome) => setOutcomes((now) => [...now, outcome]),
    });
  }

  const count = (became: DraftOutcome['became']) => outcomes.filter((outcome) => outcome.became === became).length;
  return (
    <>
      {!begun && (
        <div ref={form} data-fields className="mb-3 grid max-w-md gap-y-1">
          <Select label="What changes" options={WHAT} value={what} onValue={setWhat} />
          <Choice
            label="Frames drawn in"
            options={UNITS}
            value={unit}
            onValue={setUnit}
            hint="Frames in the other unit are left as they are: nothing is converted."
          />
          <LengthField
            label="New length"
            value={to ?? 0}
            unit={unit}
            onValue={setTo}
            above={MAY_BE_NONE.includes(what) ? undefined : 0}
            error={checked?.ok === false ? checked.fields.to : undefined}
          />
        </div>
      )}
      {refusal !== '' && (
        <Notice level="stop" word="Not saved" live>
          {refusal}
        </Notice>
      )}
      {save.isError && (
        <Notice level="stop" word="Stopped" live>
          {sayError(save.error)} Frames without “saved” below are as they were.
        </Notice>
      )}
      {save.isPending && (
        <ProgressText
          cancel={
            <Button kind="quiet" onClick={() => (stop.current = true)}>
              Stop after this one
            </Button>
          }
        >
          {`Saving: ${outcomes.length} of ${drafts.length} done.`}
        </ProgressText>
      )}
      {save.isSuccess && (
        <p role="status" className="mb-2 font-bold">
          {`${plural(count('saved'), 'frame')} saved, ${count('stale')} stale, ${count('refused')} refused${count('left') > 0 ? `, ${count('left')} left` : ''}`}
        </p>
      )}
      <ChangePreview frames={frames} results={results} outcomes={outcomes} />
      <div className="mt-3 flex flex-wrap gap-3">
        {begun ? (
          <Button kind="main" onClick={onClose} disabled={save.isPending}>
            Done
          </Button>
        ) : (
          <Button kind="main" disabled={drafts.length === 0} onClick={send}>
            {drafts.length === 0 ? 'Nothing to save' : `Change and save ${plural(drafts.length, 'frame')}`}
          </Button>
        )}
      </div>
    </>
  );
}
