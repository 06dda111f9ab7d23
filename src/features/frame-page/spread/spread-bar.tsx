import type { FeatureId } from '#shared/kernel/frame/members.ts';
import { formatLength, formatWithUnit } from '#shared/kernel/units/format-length.ts';
import type { WorkedFrame } from '#shared/kernel/worked-frame.ts';
import { Button } from '../../../ui/button.tsx';
import { useDesk } from '../model/desk.ts';
import { useStore } from '../model/store.ts';
import { zoomView, type View } from '../model/view.ts';
import { measureWords } from './measure-words.ts';
import { KEY_ZOOM } from './use-spread-keys.ts';

/** What a lit feature is, with its numbers. */
function featureWords({ contours, dados, particulars }: WorkedFrame, id: FeatureId): string {
  const { unit } = particulars;
  const dado = dados.find((d) => d.id === id);
  if (dado) {
    const { minX, maxX, minY, maxY } = dado.extents;
    const [width, length] = [maxX - minX, maxY - minY].toSorted((a, b) => a - b) as [number, number];
    return `${dado.part} dado ${formatLength(width, unit)} × ${formatLength(length, unit)}, ${formatLength(dado.depth, unit)} deep`;
  }
  const opening = contours.openings.find((o) => o.id === id);
  if (opening) return `Opening ${opening.label} ${formatLength(opening.width, unit)} × ${formatLength(opening.height, unit)}`;
  const member = contours.members.find((m) => m.id === id);
  return member ? `${member.label} ${formatWithUnit(member.width, unit)} wide` : '';
}

function Readout({ worked }: { readonly worked: WorkedFrame }) {
  const desk = useDesk();
  const lit = useStore(desk.lit, (value) => value);
  const measuring = useStore(desk.measuring, (value) => value);
  const [a, b] = measuring?.picked ?? [];
  const to = b ?? measuring?.at;
  const { unit } = worked.particulars;
  const words =
    a && to
      ? measureWords(a, to, unit)
      : measuring
        ? 'Pick two places: click, or arrows and Enter'
        : lit.features
            .map((id) => featureWords(worked, id))
            .filter(Boolean)
            .join('; ');
  return (
    <p data-readout="" role={b ? 'status' : undefined} className="h-8 min-w-0 flex-1 basis-60 content-center overflow-hidden text-11 text-pencil max-lg:basis-full">
      {words}
    </p>
  );
}

interface SpreadBarProps {
  readonly worked: WorkedFrame;
  readonly view: View;
  readonly onMeasure: () => void;
}

/** Under the spread: what is pointed at or measured, and the view by button. */
export function SpreadBar({ worked, view, onMeasure }: SpreadBarProps) {
  const desk = useDesk();
  const isMeasuring = useStore(desk.measuring, (value) => value !== null);
  return (
    <div className="flex flex-wrap items-center gap-x-3 border-t border-rule px-4 print:hidden">
      <Readout worked={worked} />
      <div role="group" aria-label="View" className="flex gap-x-3.5 pb-0.5">
        <Button kind="quiet" onClick={() => desk.view.set(zoomView(view, KEY_ZOOM))}>
          Zoom in +
        </Button>
        <Button kind="quiet" onClick={() => desk.view.set(zoomView(view, 1 / KEY_ZOOM))}>
          Zoom out −
        </Button>
        <Button kind="quiet" onClick={() => desk.view.set(null)}>
          Fit F
        </Button>
        <Button kind="quiet" aria-pressed={isMeasuring} onClick={onMeasure}>
          {isMeasuring ? 'Stop measuring M' : 'Measure M'}
        </Button>
      </div>
    </div>
  );
}
