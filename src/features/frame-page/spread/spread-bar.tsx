import { memo } from 'react';
import type { FeatureId } from '#shared/kernel/frame/members.ts';
import { formatLength, formatWithUnit } from '#shared/kernel/units/format-length.ts';
import type { DrawnFrame } from '#shared/kernel/worked-frame.ts';
import { Button } from '../../../ui/button.tsx';
import { useDesk, useEditor } from '../model/desk.ts';
import { toggleMeasuring } from '../model/measure.ts';
import { useStore } from '../model/store.ts';
import { zoomView, ZOOM_STEP } from '../model/view.ts';
import { focusSpread } from '../on-drawing/focus-panel.ts';
import { toggleWalking } from '../on-drawing/select-feature.ts';
import { SELECTED_KEYS } from '../on-drawing/selected-words.ts';
import { measureWords } from './measure-words.ts';

/** What a lit feature is, with its numbers. */
function featureWords({ contours, dados, particulars }: DrawnFrame, id: FeatureId): string {
  const { unit } = particulars;
  const dado = dados.find((d) => d.id === id);
  if (dado) {
    const { minX, maxX, minY, maxY } = dado.extents;
    const [width, length] = [maxX - minX, maxY - minY].toSorted((a, b) => a - b) as [number, number];
    return `${dado.part} dado ${formatLength(width, unit)} × ${formatLength(length, unit)}, ${formatLength(dado.depth, unit)} deep`;
  }
  const opening = contours.openings.find((o) => o.id === id);
  if (opening)
    return `Opening ${opening.label} ${formatLength(opening.width, unit)} × ${formatLength(opening.height, unit)}`;
  const member = contours.members.find((m) => m.id === id);
  return member ? `${member.label} ${formatWithUnit(member.width, unit)} wide` : '';
}

function Readout() {
  const desk = useDesk();
  const lit = useStore(desk.lit, (value) => value);
  const measuring = useStore(desk.measuring, (value) => value);
  const isSelecting = useStore(desk.selection, (value) => value !== null);
  // Follows the frame only while it says something about it.
  const isQuiet = lit.features.length === 0 && measuring === null;
  const worked = useEditor((s) => (isQuiet ? null : s.drawn));
  const [a, b] = measuring?.picked ?? [];
  const to = b ?? measuring?.at;
  const words =
    worked === null
      ? isSelecting
        ? SELECTED_KEYS
        : ''
      : a && to
        ? measureWords(a, to, worked.particulars.unit)
        : measuring
          ? 'Pick two places: click, or arrows and Enter'
          : lit.features
              .map((id) => featureWords(worked, id))
              .filter(Boolean)
              .join('; ');
  return (
    <p
      data-readout=""
      role={b ? 'status' : undefined}
      className="h-8 min-w-0 flex-1 basis-48 content-center overflow-hidden text-11 text-pencil max-lg:basis-full"
    >
      {words}
    </p>
  );
}

/** Under the spread: what is pointed at or measured, and the view by button. */
export const SpreadBar = memo(function SpreadBar() {
  const desk = useDesk();
  const isMeasuring = useStore(desk.measuring, (value) => value !== null);
  const isSelecting = useStore(desk.selection, (value) => value !== null);
  function walk() {
    toggleWalking(desk);
    focusSpread();
  }
  const zoom = (factor: number) => desk.view.set(zoomView(desk.shown.get(), factor));
  return (
    <div className="flex flex-wrap items-center gap-x-3 border-t border-rule px-4 print:hidden">
      <Readout />
      <div role="group" aria-label="View" className="flex gap-x-2.5 pb-0.5">
        <Button kind="quiet" onClick={() => zoom(ZOOM_STEP)}>
          Zoom in +
        </Button>
        <Button kind="quiet" onClick={() => zoom(1 / ZOOM_STEP)}>
          Zoom out −
        </Button>
        <Button kind="quiet" onClick={() => desk.view.set(null)}>
          Fit F
        </Button>
        <Button
          kind="quiet"
          aria-pressed={isSelecting}
          title="Walk from opening to member with the arrow keys, and edit them"
          onClick={walk}
        >
          Edit O
        </Button>
        <Button kind="quiet" aria-pressed={isMeasuring} onClick={() => toggleMeasuring(desk)}>
          {isMeasuring ? 'Stop measuring M' : 'Measure M'}
        </Button>
      </div>
    </div>
  );
});
