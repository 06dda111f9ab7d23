import type { CornerMethod } from '#shared/kernel/particulars/particulars.ts';
import { applyEdgePreset } from '#shared/kernel/starters/apply-edge-preset.ts';
import { usualEdgePresets } from '#shared/kernel/starters/usual-edge-presets.ts';
import type { Unit } from '#shared/kernel/units/unit.ts';
import { Choice } from '../../../ui/choice.tsx';
import { Section } from '../../../ui/section.tsx';
import { useDesk, useEditor } from '../model/desk.ts';
import { Entry } from './entry.tsx';
import { SwitchEntry } from './switch-entry.tsx';
import { TakeEdge } from './take-edge.tsx';

const STYLES = [
  { value: 'square', label: 'Square' },
  { value: 'beaded', label: 'Beaded' },
] as const;

const FACE_OR_BACK = [
  { value: 'face', label: 'Face' },
  { value: 'back', label: 'Back' },
] as const;

const BEADED = [...FACE_OR_BACK, { value: 'bead base', label: 'Bead base' }] as const;

const CORNERS = [
  { value: 'lift', label: 'Climb into' },
  { value: 'vee', label: 'V after' },
  { value: 'round', label: 'Leave round' },
] as const;

const usualCutters = (unit: Unit) => usualEdgePresets(unit).find((p) => p.edge.style === 'beaded')!.cutters;

/** What is done in inside corners. A V-cutter is put in the frame's cutters when the first corner asks for one. */
function CornersChoice() {
  const { editor, readOnly } = useDesk();
  const corners = useEditor((s) => s.history.present.edge.corners ?? 'lift');
  function pick(wanted: CornerMethod) {
    const { present } = editor.store.get().history;
    const corner = present.cutters.corner ?? usualCutters(present.unit).corner;
    const cutters = wanted === 'vee' ? { ...present.cutters, corner } : present.cutters;
    editor.apply({ ...present, edge: { ...present.edge, corners: wanted }, cutters }, 'Inside corners');
  }
  return (
    <div data-entry="edge.corners">
      <Choice label="Inside corners" options={CORNERS} value={corners} onValue={pick} disabled={readOnly} />
    </div>
  );
}

/** Square or beaded. A frame that is to have a bead and has no cutters for it gets the usual ones. */
function StyleChoice({ style }: { readonly style: 'square' | 'beaded' }) {
  const { editor, readOnly } = useDesk();
  function pick(wanted: 'square' | 'beaded') {
    const { present } = editor.store.get().history;
    const preset = usualEdgePresets(present.unit).find((p) => p.edge.style === wanted);
    if (wanted === style || preset === undefined) return;
    const {
      bead = preset.cutters.bead,
      quirk = preset.cutters.quirk,
      corner = preset.cutters.corner,
    } = present.cutters;
    const dressed = applyEdgePreset(present, {
      ...preset,
      cutters: wanted === 'beaded' ? { bead, quirk, corner } : {},
    });
    editor.apply(dressed, wanted === 'beaded' ? 'Beaded edges' : 'Square edges');
  }
  return (
    <div data-entry="edge.style">
      <Choice label="Style" hideLabel options={STYLES} value={style} onValue={pick} disabled={readOnly} />
    </div>
  );
}

/** Style and numbers of the edge, and where through the board the entered size of an opening is true. */
export function EdgeSection() {
  const style = useEditor((s) => s.history.present.edge.style);
  const isBeaded = style === 'beaded';
  return (
    <Section heading="Edge of the openings">
      <StyleChoice style={style} />
      <TakeEdge />
      {isBeaded && (
        <>
          <Entry path="edge.bead.radius" label="Bead radius" />
          <Entry path="edge.bead.drop" label="Below the face" />
          <Entry path="edge.bead.quirk" label="Quirk" />
        </>
      )}
      <SwitchEntry
        path="edge.sizeHeldAt"
        label="Size held at"
        options={isBeaded ? BEADED : FACE_OR_BACK}
        whenAbsent="bead base"
      />
      <CornersChoice />
    </Section>
  );
}
