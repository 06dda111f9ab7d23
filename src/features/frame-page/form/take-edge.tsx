import { useState } from 'react';
import { applyEdgePreset } from '#shared/kernel/starters/apply-edge-preset.ts';
import { usualEdgePresets } from '#shared/kernel/starters/usual-edge-presets.ts';
import { Button } from '../../../ui/button.tsx';
import { Select } from '../../../ui/select.tsx';
import { useDesk, useEditor } from '../model/desk.ts';
import { useSavedEdges } from './saved-edges.ts';
import { SavedEdgesDialog } from './saved-edges-dialog.tsx';

/** Puts a saved edge and its cutters into the frame, the usual ones and the shop's own in the frame's unit. */
export function TakeEdge() {
  const { editor, readOnly } = useDesk();
  const saved = useSavedEdges();
  const unit = useEditor((s) => s.history.present.unit);
  const [isOpen, setIsOpen] = useState(false);
  const presets = [
    ...usualEdgePresets(unit).map((preset) => ({ id: `usual ${preset.name}`, preset })),
    ...saved.filter(({ preset }) => preset.unit === unit),
  ];

  function take(id: string) {
    const found = presets.find((entry) => entry.id === id);
    const { present } = editor.store.get().history;
    if (found) editor.apply(applyEdgePreset(present, found.preset), `Edge ${found.preset.name}`);
  }

  return (
    <>
      <Select
        label="Take an edge"
        options={[
          { value: '', label: 'pick one' },
          ...presets.map(({ id, preset }) => ({ value: id, label: preset.name })),
        ]}
        value=""
        onValue={take}
        disabled={readOnly}
      />
      {!readOnly && (
        <p className="mb-1.5 text-right">
          <Button kind="quiet" onClick={() => setIsOpen(true)}>
            Save this edge, or delete one
          </Button>
        </p>
      )}
      {isOpen && <SavedEdgesDialog onClose={() => setIsOpen(false)} />}
    </>
  );
}
