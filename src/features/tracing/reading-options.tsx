import type { TracedDrawing, TraceOptions } from '#shared/kernel/tracing/traced-drawing.ts';
import type { Unit } from '#shared/kernel/units/unit.ts';
import { Checkbox } from '../../ui/checkbox.tsx';
import { Choice } from '../../ui/choice.tsx';
import { Section } from '../../ui/section.tsx';
import { MillimetreEntry } from './millimetre-entry.tsx';

interface ReadingOptionsProps {
  readonly drawing: TracedDrawing;
  readonly options: TraceOptions;
  readonly onOptions: (options: TraceOptions) => void;
}

/** Greatest gap and arc tolerance, and the least of the latter, millimetres, as the contract has them. */
const WIDEST_MM = 1;
const LEAST_ARC_MM = 0.001;
/** Where arcs begin when they are switched on: about what exporters cut curves up to. Common practice, no source. */
const USUAL_ARC_MM = 0.05;

const VIEWS = [
  { value: 'front', label: 'Front' },
  { value: 'back', label: 'Back' },
] as const;
const UNITS = [
  { value: 'in', label: 'Inches' },
  { value: 'mm', label: 'Millimetres' },
] as const;

/** How the drawing is read; each change has it read again. */
export function ReadingOptions({ drawing, options, onOptions }: ReadingOptionsProps) {
  const set = (change: Partial<TraceOptions>) => onOptions({ ...options, ...change });
  const says = { in: 'The file says inches.', mm: 'The file says millimetres.' } as const;
  const unit = options.unit ?? drawing.unit ?? 'in';
  return (
    <Section heading="How it is read">
      <Choice<Unit>
        label="Drawn in"
        options={UNITS}
        value={unit}
        onValue={(next) => set({ unit: next === drawing.fileUnit ? null : next })}
        hint={drawing.fileUnit === null ? 'The file does not say so for sure; you chose it.' : says[drawing.fileUnit]}
      />
      <Choice
        label="Seen from the"
        options={VIEWS}
        value={options.view}
        onValue={(view) => set({ view })}
        hint="A drawing of the back is mirrored: frames are entered as seen from the front."
      />
      <MillimetreEntry
        label="Close gaps up to, mm"
        value={options.gap}
        from={0}
        to={WIDEST_MM}
        hint="Every gap that is closed is listed."
        onValue={(gap) => set({ gap })}
      />
      <Checkbox
        label="Arcs out of short lines"
        checked={options.arcs !== null}
        onChecked={(on) => set({ arcs: on ? USUAL_ARC_MM : null })}
        hint="For curves that were exported as many short lines."
      />
      {options.arcs !== null && (
        <MillimetreEntry
          label="Lines within, mm, of the arc"
          value={options.arcs}
          from={LEAST_ARC_MM}
          to={WIDEST_MM}
          onValue={(arcs) => set({ arcs })}
        />
      )}
    </Section>
  );
}
