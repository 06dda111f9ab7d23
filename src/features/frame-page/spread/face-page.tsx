import { memo, useId, useMemo, useRef } from 'react';
import type { Face, LineSet, SetName } from '#shared/kernel/line-sets/line-set.ts';
import { lineSetKey } from '#shared/kernel/line-sets/line-set.ts';
import type { WorkedFrame } from '#shared/kernel/worked-frame.ts';
import { useDesk } from '../model/desk.ts';
import type { EditorState } from '../model/frame-editor.ts';
import { useStore } from '../model/store.ts';
import { useSettled } from '../model/use-settled.ts';
import { frameTransform, setupTransform, type PageSize, type View } from '../model/view.ts';
import { SelectionOutline } from '../on-drawing/selection-outline.tsx';
import { Board, LineSets } from './board.tsx';
import { describeFace } from './describe-face.ts';
import { FaceLegend } from './face-legend.tsx';
import { labelsOf } from './labels.ts';
import { LitPlaces } from './lit-places.tsx';
import { MeasureMarks } from './measure-marks.tsx';
import { PageLabels } from './page-labels.tsx';
import { Pins } from './pins.tsx';
import type { LegendEntry } from './set-words.ts';
import { useBoardPointer } from './use-board-pointer.ts';

interface FacePageProps {
  readonly face: Face;
  readonly worked: WorkedFrame;
  readonly view: View;
  readonly page: PageSize;
  readonly legend: readonly LegendEntry[];
  readonly heading: string;
  readonly aside: string;
  readonly className: string;
}

const hiddenSetNames = (lineSets: readonly LineSet[], hidden: ReadonlySet<string>): ReadonlySet<string> => {
  const shown = new Set<SetName>(lineSets.filter((s) => !hidden.has(lineSetKey(s))).map((s) => s.set));
  return new Set(lineSets.map((s) => s.set).filter((set) => !shown.has(set)));
};

const drawnOf = (s: EditorState): WorkedFrame => s.drawn;

/** The page in words, for people who do not see the drawing. */
const Description = memo(function Description({ id, face }: { readonly id: string; readonly face: Face }) {
  const worked = useSettled(drawnOf);
  return (
    <p id={id} className="sr-only">
      {describeFace(worked, face)}
    </p>
  );
});

/** The drawing of one page. */
function Drawing({ face, worked, view, page }: Pick<FacePageProps, 'face' | 'worked' | 'view' | 'page'>) {
  const desk = useDesk();
  const hidden = useStore(desk.hidden, (value) => value);
  const measuring = useStore(desk.measuring, (value) => value);
  const svg = useRef<SVGSVGElement>(null);
  const pointer = useBoardPointer({ face, worked, view, page, svg });
  const id = useId();
  const work = worked[face];
  const { placement } = work;
  const labels = useMemo(() => labelsOf(worked, face), [worked, face]);
  const hiddenSets = useMemo(() => hiddenSetNames(work.lineSets, hidden), [work.lineSets, hidden]);
  const inFrameView = frameTransform(view, placement, page);
  return (
    <>
      <svg
        ref={svg}
        role="img"
        aria-label={face === 'back' ? 'Back face' : 'Front face'}
        aria-describedby={id}
        data-face={face}
        className={`absolute inset-0 size-full touch-none select-none ${measuring ? 'cursor-crosshair' : 'cursor-grab active:cursor-grabbing'}`}
        {...pointer}
      >
        <g transform={inFrameView}>
          <Board worked={worked} face={face} />
        </g>
        <g transform={setupTransform(view, placement, page)}>
          <LineSets lineSets={work.lineSets} hidden={hidden} />
        </g>
        <LitPlaces worked={worked} scale={view.scale} transform={inFrameView} />
        <SelectionOutline worked={worked} transform={inFrameView} />
        <Pins work={work} view={view} page={page} />
        <PageLabels labels={labels} view={view} placement={placement} page={page} hiddenSets={hiddenSets} />
        {measuring && <MeasureMarks measuring={measuring} view={view} placement={placement} page={page} />}
      </svg>
      <Description id={id} face={face} />
    </>
  );
}

/** One page of the spread: heading, drawing, legend. */
export const FacePage = memo(function FacePage({
  face,
  worked,
  view,
  page,
  legend,
  heading,
  aside,
  className,
}: FacePageProps) {
  const colour = face === 'back' ? 'text-back' : 'text-front';
  return (
    <section aria-label={heading} className={`min-h-0 min-w-0 px-4 pt-2 pb-1 ${className}`}>
      {/* Of a size that its words do not change, so that new words are laid out here and nowhere else. */}
      <div
        className={`flex h-5 justify-between gap-x-3 overflow-hidden font-bold whitespace-nowrap contain-strict ${colour}`}
      >
        <h2>{heading}</h2>
        <p className="min-w-0 truncate">{aside}</p>
      </div>
      <div data-drawing-area="" className="relative min-h-0 flex-1 overflow-hidden contain-strict">
        <Drawing face={face} worked={worked} view={view} page={page} />
      </div>
      <FaceLegend entries={legend} face={face} />
    </section>
  );
});
