import { useState } from 'react';
import { edgePreset, type StoredEdgePreset } from '#shared/contracts/edge-presets.ts';
import { LIMITS } from '#shared/contracts/limits.ts';
import type { Particulars } from '#shared/kernel/particulars/particulars.ts';
import type { EdgePreset } from '#shared/kernel/starters/edge-preset.ts';
import { checkForm } from '../../../lib/check-form.ts';
import { fieldMessagesOf, type FieldMessages } from '../../../lib/field-messages.ts';
import { sayError } from '../../../lib/say-error.ts';
import { Button } from '../../../ui/button.tsx';
import { Dialog } from '../../../ui/dialog.tsx';
import { Notice } from '../../../ui/notice.tsx';
import { TextField } from '../../../ui/text-field.tsx';
import { UndoNotice } from '../../../ui/undo-notice.tsx';
import { useDeleteEdgePreset } from '../api/delete-edge-preset.ts';
import { useSaveEdgePreset } from '../api/save-edge-preset.ts';
import { useDesk } from '../model/desk.ts';
import { useSavedEdges } from './saved-edges.ts';

/** The frame's edge under a name, with the cutters that the edge alone needs; the frame keeps its own for the openings. */
function presetOf({ unit, edge, cutters: { bead, quirk, corner } }: Particulars, name: string): EdgePreset {
  const forBead = edge.style === 'beaded' ? { ...(bead && { bead }), ...(quirk && { quirk }) } : {};
  const needsCorner = edge.style === 'beaded' || edge.corners === 'vee';
  return { name, unit, edge, cutters: { ...forBead, ...(needsCorner && corner ? { corner } : {}) } };
}

/** Saves the frame's edge by name, and deletes saved ones; a deletion can be taken back while the dialog is open. */
export function SavedEdgesDialog({ onClose }: { readonly onClose: () => void }) {
  const { editor } = useDesk();
  const saved = useSavedEdges();
  const [name, setName] = useState('');
  const [wrong, setWrong] = useState<FieldMessages>({});
  const [deleted, setDeleted] = useState<StoredEdgePreset | null>(null);
  const save = useSaveEdgePreset();
  const remove = useDeleteEdgePreset();
  const failed = save.error ?? remove.error;

  function saveEdge() {
    const checked = checkForm(edgePreset, presetOf(editor.store.get().history.present, name));
    setWrong(checked.ok ? {} : checked.fields);
    if (!checked.ok) return;
    save.mutate(checked.value, { onSuccess: () => setName(''), onError: (error) => setWrong(fieldMessagesOf(error)) });
  }

  return (
    <Dialog title="Saved edges" onClose={onClose} actions={<Button onClick={onClose}>Done</Button>}>
      {failed && (
        <Notice level="stop" word={save.error ? 'Not saved' : 'Not deleted'} live>
          {sayError(failed)}
        </Notice>
      )}
      {deleted && (
        <UndoNotice
          busy={save.isPending}
          onUndo={() => save.mutate(deleted.preset, { onSuccess: () => setDeleted(null) })}
        >
          {`${deleted.preset.name} is deleted. Frames keep their edges.`}
        </UndoNotice>
      )}
      <form
        noValidate
        className="mb-4"
        onSubmit={(event) => {
          event.preventDefault();
          saveEdge();
        }}
      >
        <TextField
          label="Save this frame’s edge as"
          hint="Radius, drop, quirk and the cutters that make them."
          value={name}
          onValue={setName}
          error={wrong.name}
          maxLength={LIMITS.nameLength}
          autoComplete="off"
        />
        <Button type="submit" busy={save.isPending ? 'Saving' : ''}>
          Save the edge
        </Button>
      </form>
      {saved.length === 0 ? (
        <p className="text-pencil">None saved yet.</p>
      ) : (
        <ul>
          {saved.map((stored) => (
            <li key={stored.id} className="flex items-baseline justify-between gap-4 border-b border-rule py-1">
              <span className="wrap-anywhere">
                {stored.preset.name}, {stored.preset.edge.style}, {stored.preset.unit}
              </span>
              <Button
                kind="quiet"
                aria-label={`Delete ${stored.preset.name}`}
                onClick={() => remove.mutate(stored.id, { onSuccess: () => setDeleted(stored) })}
              >
                Delete
              </Button>
            </li>
          ))}
        </ul>
      )}
    </Dialog>
  );
}
