import type { TracedDrawing } from '#shared/kernel/tracing/traced-drawing.ts';
import type { Unit } from '#shared/kernel/units/unit.ts';
import { Section } from '../../ui/section.tsx';
import { sayOtherSize, saySize } from './drawing-size.ts';
import { sizeOf } from './model/loop-contours.ts';

interface UnitQuestionProps {
  readonly drawing: TracedDrawing;
  readonly onUnit: (unit: Unit) => void;
}

const UNITS: readonly { readonly unit: Unit; readonly word: string }[] = [
  { unit: 'in', word: 'Inches' },
  { unit: 'mm', word: 'Millimetres' },
];

/** Asked before anything else of a drawing that does not say its unit, or contradicts itself. */
export function UnitQuestion({ drawing, onUnit }: UnitQuestionProps) {
  if (drawing.extents === null) {
    return (
      <Section heading="Nothing to trace">
        <p>There is no line in this drawing that can be read. See what became of its entities below.</p>
      </Section>
    );
  }
  const { width, height } = sizeOf(drawing.extents);
  return (
    <Section heading="Which unit is it drawn in?">
      <p className="mb-3">
        The file does not say so for sure. Everything drawn in it, together, would be this large. Choose the one that
        can be right; it can be changed later.
      </p>
      <div className="grid gap-3">
        {UNITS.map(({ unit, word }) => (
          <button
            key={unit}
            type="button"
            onClick={() => onUnit(unit)}
            className="border border-ink px-4 py-3 text-left hover:bg-ink hover:text-paper"
          >
            <span className="block text-16 font-bold">{word}</span>{' '}
            <span className="block text-16">{saySize(width, height, unit)}</span>{' '}
            <span className="block text-12">that is {sayOtherSize(width, height, unit)}</span>
          </button>
        ))}
      </div>
    </Section>
  );
}
