import { memo, useRef, type KeyboardEvent } from 'react';
import { formatLength } from '#shared/kernel/units/format-length.ts';
import type { DrawnFrame } from '#shared/kernel/worked-frame.ts';
import { Button } from '../../../ui/button.tsx';
import { FrameFacts } from '../form/frame-facts.tsx';
import { betweensOf } from '../form/layout-words.ts';
import { useDesk, useEditor } from '../model/desk.ts';
import { findSelected, type Selected, type Selection } from '../model/selection.ts';
import { useStore } from '../model/store.ts';
import { focusSpread } from './focus-panel.ts';
import { PanelButtons } from './panel-buttons.tsx';
import { MemberEntries, OpeningEntries, TracedEntries } from './panel-entries.tsx';
import { selectedName, selectedSize } from './selected-words.ts';
import { sizeFields } from './size-fields.ts';
import { usePanelPlace } from './use-panel-place.ts';

function Entries({ worked, selected }: { readonly worked: DrawnFrame; readonly selected: Selected }) {
  const { readOnly } = useDesk();
  const outline = useEditor((s) => s.history.present.outline);
  const { unit } = worked.particulars;
  const { feature, field } = selected;
  if (outline.kind === 'traced') return 'height' in feature ? <TracedEntries opening={feature} /> : null;
  if (field === '') return <p className="text-12">As entered, it cannot be drawn: see the findings, or undo.</p>;
  if (!('height' in feature))
    return (
      <MemberEntries
        kind={feature.kind}
        field={field}
        alike={feature.path ? betweensOf(worked, feature.path).length : 1}
      />
    );
  const path = feature.path ?? [];
  return (
    <>
      <OpeningEntries
        field={field}
        {...sizeFields(outline.layout, path)}
        solvedWidth={formatLength(feature.width, unit)}
        solvedHeight={formatLength(feature.height, unit)}
      />
      {!readOnly && <PanelButtons removable={path.length > 0} />}
    </>
  );
}

interface OpenPanelProps {
  /** As it is drawn. */
  readonly worked: DrawnFrame;
  readonly selection: Selection;
  readonly selected: Selected;
}

function OpenPanel({ worked, selection, selected }: OpenPanelProps) {
  const desk = useDesk();
  const view = useStore(desk.shown, (value) => value);
  const page = useStore(desk.page, (value) => value);
  const panel = useRef<HTMLDivElement>(null);
  usePanelPlace({ panel, worked, view, page, face: selection.face, extents: selected.feature.extents });
  const name = selectedName(selected);
  function close() {
    desk.selection.set({ ...selection, open: false, problem: '' });
    focusSpread();
  }
  function press(event: KeyboardEvent) {
    if (event.key !== 'Escape' || event.nativeEvent.isComposing) return;
    event.preventDefault();
    close();
  }
  return (
    <div
      ref={panel}
      role="group"
      aria-label={`${name}, on the drawing`}
      tabIndex={-1}
      data-selection-panel=""
      data-fields=""
      onKeyDown={press}
      className="absolute top-0 left-0 flex w-56 flex-col gap-1.5 border border-ink bg-paper px-2 py-1.5 print:hidden pointer-coarse:w-60 pointer-coarse:[&_button]:min-h-11 pointer-coarse:[&_input]:min-h-11 pointer-coarse:[&_label]:min-h-11 pointer-coarse:[&_label]:items-center"
    >
      <div className="flex items-baseline justify-between gap-x-3">
        <p className="min-w-0 truncate">
          <span className="font-bold">{name}</span>
        </p>
        <Button kind="quiet" onClick={close}>
          Close
        </Button>
      </div>
      <p className="text-11 text-pencil">{selectedSize(selected, worked.particulars.unit)}</p>
      <FrameFacts>
        <Entries worked={worked} selected={selected} />
      </FrameFacts>
      {selection.problem !== '' && (
        <p role="alert" className="text-12 text-stop">
          Takes {selection.problem}.
        </p>
      )}
    </div>
  );
}

function Selecting({ selection }: { readonly selection: Selection }) {
  const present = useEditor((s) => s.history.present);
  const worked = useEditor((s) => s.drawn);
  const selected = findSelected(worked.contours, present, selection);
  return selected && <OpenPanel worked={worked} selection={selection} selected={selected} />;
}

/** A ruled box beside what is selected, to edit it where it lies. Follows the frame only while something is. */
export const SelectionPanel = memo(function SelectionPanel() {
  const selection = useStore(useDesk().selection, (value) => value);
  return selection?.open ? <Selecting selection={selection} /> : null;
});
