import { useMemo, useRef, useState } from 'react';
import type { Frame } from '#shared/contracts/frames.ts';
import { memberChange } from '#shared/contracts/member-change.ts';
import { CHANGEABLE, MAY_BE_NONE, type Changeable, type MemberChange } from '#shared/kernel/starters/member-change.ts';
import { changeManyFrames } from '#shared/kernel/starters/change-members.ts';
import { setMember } from '#shared/kernel/starters/set-member.ts';
import type { Unit } from '#shared/kernel/units/unit.ts';
import { checkForm } from '../../lib/check-form.ts';
import { Button } from '../../ui/button.tsx';
import { Choice } from '../../ui/choice.tsx';
import { Dialog } from '../../ui/dialog.tsx';
import { Fetched } from '../../ui/fetched.tsx';
import { LengthField } from '../../ui/length-field.tsx';
import { Notice } from '../../ui/notice.tsx';
import { plural } from '../../ui/plural.ts';
import { Select } from '../../ui/select.tsx';
import { useFrames } from './api/get-frames.ts';
import { useSaveDrafts, type DraftOutcome, type DraftToSave } from './api/save-drafts.ts';
import { ChangePreview } from './change-preview.tsx';
import { SavingDrafts } from './saving-drafts.tsx';

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

/** Length that a member has now in the first of the frames that has it, to begin from; 0 when none has. */
const lengthNow = (frames: readonly Frame[], what: Changeable, unit: Unit): number =>
  frames
    .filter(({ particulars }) => particulars.unit === unit)
    .flatMap(({ particulars }) => setMember(particulars, { what, unit, to: 0 }).was)[0] ?? 0;

/** Changes one member of many frames: shows what becomes of each, then saves each draft and says how that went. */
export function ChangeMemberDialog({ frameIds, unit, onClose }: ChangeMemberDialogProps) {
  const query = useFrames(frameIds);
  const save = useSaveDrafts();
  const stop = useRef(false);
  // What is being saved is not left unseen: closing stops it, and the list then says how far it got.
  const close = () => {
    if (save.isPending) stop.current = true;
    else onClose();
  };
  return (
    <Dialog title={`Change a member of ${plural(frameIds.length, 'frame')}`} onClose={close} wide>
      <Fetched query={query} what="the frames">
        {(frames) => (
          <ChangeMember
            frames={frames}
            unit={unit}
            save={save}
            stopped={() => stop.current}
            onStop={() => (stop.current = true)}
            onClose={onClose}
          />
        )}
      </Fetched>
    </Dialog>
  );
}

interface ChangeMemberProps {
  readonly frames: readonly Frame[];
  readonly unit: Unit;
  readonly save: ReturnType<typeof useSaveDrafts>;
  /** Whether to leave what is not saved yet. */
  readonly stopped: () => boolean;
  readonly onStop: () => void;
  readonly onClose: () => void;
}

function ChangeMember({ frames, unit: shopUnit, save, stopped, onStop, onClose }: ChangeMemberProps) {
  const [what, setWhat] = useState<Changeable>('left stile');
  const [unit, setUnit] = useState<Unit>(frames[0]?.particulars.unit ?? shopUnit);
  const [entered, setEntered] = useState<MemberChange | null>(null);
  const [outcomes, setOutcomes] = useState<readonly DraftOutcome[]>([]);
  const [refusal, setRefusal] = useState('');
  const form = useRef<HTMLDivElement>(null);

  const to = entered?.what === what && entered.unit === unit ? entered.to : lengthNow(frames, what, unit);
  const checked = useMemo(() => checkForm(memberChange, { what, unit, to }), [what, unit, to]);
  const results = useMemo(
    () =>
      new Map(
        checked.ok ? changeManyFrames(frames, [checked.value]).map(({ id, result }) => [id, result] as const) : [],
      ),
    [frames, checked],
  );
  const drafts = frames.flatMap(({ id, version, particulars }): DraftToSave[] => {
    const result = results.get(id);
    if (!result?.ok || result.particulars === particulars) return [];
    return [{ frameId: id, version, particulars: result.particulars }];
  });

  function send() {
    const wrong = form.current?.querySelector<HTMLElement>('[aria-invalid=true]');
    setRefusal(wrong ? 'The length cannot be read. Mend it, then save.' : '');
    wrong?.focus();
    if (wrong) return;
    save.mutate({
      drafts,
      stopped,
      onOutcome: (outcome) => setOutcomes((now) => [...now, outcome]),
    });
  }

  return (
    <>
      {save.isIdle && (
        <div ref={form} data-fields className="mb-3 grid max-w-md gap-y-1">
          <Select label="What changes" options={WHAT} value={what} onValue={setWhat} />
          <Choice
            label="For frames drawn in"
            options={UNITS}
            value={unit}
            onValue={setUnit}
            hint="Frames in the other unit stay as they are: nothing is converted."
          />
          <LengthField
            key={`${what} ${unit}`}
            label="New length"
            value={to}
            unit={unit}
            onValue={(value) => setEntered({ what, unit, to: value })}
            above={MAY_BE_NONE.includes(what) ? undefined : 0}
            error={checked.ok ? undefined : checked.fields.to}
          />
        </div>
      )}
      {refusal !== '' && (
        <Notice level="stop" word="Not saved" live>
          {refusal}
        </Notice>
      )}
      <SavingDrafts save={save} drafts={drafts.length} outcomes={outcomes} onStop={onStop} />
      <ChangePreview frames={frames} results={results} outcomes={outcomes} />
      <div className="mt-3">
        {save.isIdle ? (
          <Button kind="main" disabled={drafts.length === 0} onClick={send}>
            {drafts.length === 0 ? 'Nothing to save' : `Change and save ${plural(drafts.length, 'frame')}`}
          </Button>
        ) : (
          <Button kind="main" disabled={save.isPending} onClick={onClose}>
            Done
          </Button>
        )}
      </div>
    </>
  );
}
