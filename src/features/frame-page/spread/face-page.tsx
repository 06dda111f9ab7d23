import { memo, useId, useRef } from 'react';
import type { Face } from '#shared/kernel/line-sets/line-set.ts';
import type { DrawnFrame } from '#shared/kernel/worked-frame.ts';
import { useDesk } from '../model/desk.ts';
import type { EditorState } from '../model/frame-editor.ts';
import { useStore } from '../model/store.ts';
import { useSettled } from '../model/use-settled.ts';
import { SelectionOutline } from '../on-drawing/selection-outline.tsx';
import { describeFace } from './describe-face.ts';
import { FaceLegend } from './face-legend.tsx';
import { LitPlaces } from './lit-places.tsx';
import { MeasureMarks } from './measure-marks.tsx';
import type { LegendEntry } from './set-words.ts';
import { useBoardPointer } from './use-board-pointer.ts';
import { usePaintedFace } from './use-painted-face.ts';

interface FacePageProps {
  readonly face: Face;
  readonly legend: readonly LegendEntry[];
  readonly heading: string;
  readonly aside: string;
  readonly className: string;
}

const drawnOf = (s: EditorState): DrawnFrame => s.drawn;

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
const Drawing = memo(function Drawing({ face }: { readonly face: Face }) {
  const desk = useDesk();
  const measuring = useStore(desk.measuring, (value) => value !== null);
  const svg = useRef<SVGSVGElement>(null);
  const lines = useRef<SVGGElement>(null);
  const marks = useRef<SVGGElement>(null);
  const pointer = useBoardPointer(face, svg);
  usePaintedFace(face, lines, marks);
  const id = useId();
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
        <g ref={lines} />
        <LitPlaces face={face} />
        <SelectionOutline face={face} />
        <g ref={marks} aria-hidden="true" className="text-11 pointer-events-none" />
        {measuring && <MeasureMarks face={face} />}
      </svg>
      <Description id={id} face={face} />
    </>
  );
});

/** One page of the spread: heading, drawing, legend. */
export const FacePage = memo(function FacePage({ face, legend, heading, aside, className }: FacePageProps) {
  const colour = face === 'back' ? 'text-back' : 'text-front';
  return (
    <section aria-label={heading} className={`min-h-0 min-w-0 px-4 pt-2 pb-1 ${className}`}>
      {/* Of a size that its words do not change, so that new words are laid out here and nowhere else. */}
      <div
        className={`flex h-5 justify-between gap-x-3 overflow-hidden font-bold whitespace-nowrap contain-strict max-lg:h-10 max-lg:flex-col ${colour}`}
      >
        <h2>{heading}</h2>
        <p className="min-w-0 truncate">{aside}</p>
      </div>
      <div data-drawing-area="" className="relative min-h-0 flex-1 overflow-hidden contain-strict">
        <Drawing face={face} />
      </div>
      <FaceLegend entries={legend} face={face} />
    </section>
  );
});
