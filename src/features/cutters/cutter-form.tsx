import { LIMITS } from '#shared/contracts/limits.ts';
import type { CutterKind } from '#shared/kernel/cutters/cutter.ts';
import type { Unit } from '#shared/kernel/units/unit.ts';
import type { FieldMessages } from '../../lib/field-messages.ts';
import { Choice } from '../../ui/choice.tsx';
import { Select } from '../../ui/select.tsx';
import { TextField } from '../../ui/text-field.tsx';
import { CutterShape } from './cutter-shape.tsx';
import { KIND_WORDS, NUMBER_WORDS } from './cutter-words.ts';
import { entriesOf, shapeOf, type EntryTexts } from './entry-texts.ts';

interface CutterFormProps {
  readonly texts: EntryTexts;
  readonly onTexts: (texts: EntryTexts) => void;
  readonly wrong: FieldMessages;
}

const KINDS = (Object.keys(KIND_WORDS) as CutterKind[]).map((value) => ({ value, label: KIND_WORDS[value] }));
const UNITS: readonly { value: Unit; label: string }[] = [
  { value: 'in', label: 'Inches' },
  { value: 'mm', label: 'Millimetres' },
];
const PLACEHOLDERS: Partial<Record<string, string>> = { maxPass: 'all at once', number: 'none' };

/** The numbers of one cutter, by its kind, with a drawing that follows what is typed. */
export function CutterForm({ texts, onTexts, wrong }: CutterFormProps) {
  const { unit, kind, name, remarks, numbers } = texts;
  const shape = shapeOf(texts);
  return (
    <div className="grid gap-x-6 gap-y-3 roomy:grid-cols-[minmax(0,1fr)_11rem]" data-fields>
      <div>
        <TextField
          label="Name"
          value={name}
          onValue={(value) => onTexts({ ...texts, name: value })}
          error={wrong['cutter.name']}
          maxLength={LIMITS.nameLength}
          autoComplete="off"
          enterMoves
        />
        <Choice
          label="Numbers in"
          options={UNITS}
          value={unit}
          onValue={(value) => onTexts({ ...texts, unit: value })}
          hint="A frame in the other unit takes the converted numbers."
        />
        <Select label="Kind" options={KINDS} value={kind} onValue={(value) => onTexts({ ...texts, kind: value })} />
        {entriesOf(kind).map((entry) => (
          <TextField
            key={entry}
            label={entry.endsWith('Angle') ? `${NUMBER_WORDS[entry]}, degrees` : NUMBER_WORDS[entry]}
            layout="row"
            value={numbers[entry] ?? ''}
            onValue={(value) => onTexts({ ...texts, numbers: { ...numbers, [entry]: value } })}
            error={wrong[`cutter.${entry}`]}
            placeholder={PLACEHOLDERS[entry]}
            autoComplete="off"
            enterMoves
          />
        ))}
      </div>
      <figure className="border border-rule p-2">
        {shape && <CutterShape cutter={shape} unit={unit} large />}
        <figcaption className="text-11 text-pencil">
          {shape ? 'Tip down, as far as the flute goes' : 'The shape is drawn once its numbers are there.'}
        </figcaption>
      </figure>
      <div className="roomy:col-span-2">
        <TextField
          label="Remarks"
          lines={2}
          value={remarks}
          onValue={(value) => onTexts({ ...texts, remarks: value })}
          error={wrong.remarks}
          maxLength={LIMITS.noteLength}
        />
      </div>
    </div>
  );
}
