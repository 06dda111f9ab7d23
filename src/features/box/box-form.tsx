import { LIMITS } from '#shared/contracts/limits.ts';
import type { Box, Sides } from '#shared/kernel/box/box.ts';
import type { Unit } from '#shared/kernel/units/unit.ts';
import type { FieldMessages } from '../../lib/field-messages.ts';
import { Choice } from '../../ui/choice.tsx';
import { Section } from '../../ui/section.tsx';
import { TextField } from '../../ui/text-field.tsx';
import { BoxEntry } from './box-entry.tsx';
import { PartitionEntries } from './partition-entries.tsx';
import { SIDES } from './sides.ts';
import { TopEntries } from './top-entries.tsx';

export type FormEdge = 'square' | 'beaded';

interface BoxFormProps {
  readonly box: Box;
  readonly onBox: (box: Box) => void;
  readonly onUnit: (unit: Unit) => void;
  readonly edge: FormEdge;
  readonly onEdge: (edge: FormEdge) => void;
  readonly wrong: FieldMessages;
}

const UNITS = [
  { value: 'in', label: 'Inches' },
  { value: 'mm', label: 'Millimetres' },
] as const;
const EDGES = [
  { value: 'square', label: 'Square' },
  { value: 'beaded', label: 'Beaded' },
] as const;
const RUNS = [
  { value: 'open', label: 'Run out' },
  { value: 'stopped', label: 'Stopped' },
] as const;

const REVEALS: readonly { readonly side: keyof Sides; readonly label: string }[] = [
  { side: 'left', label: 'Past the left end' },
  { side: 'right', label: 'Past the right end' },
  { side: 'top', label: 'Past the top' },
  { side: 'bottom', label: 'Past the bottom' },
];

/** Every entry of a box, in the order in which a box is built. */
export function BoxForm({ box, onBox, onUnit, edge, onEdge, wrong }: BoxFormProps) {
  const { unit, overhang, reveal, dado, ends, bottom } = box;
  const set = (change: Partial<Box>) => onBox({ ...box, ...change });
  const common = { unit, wrong };
  return (
    <div data-fields className="grid gap-x-10 md:grid-cols-2">
      <div>
        <Section heading="Frame">
          <TextField
            label="Name"
            value={box.name}
            onValue={(name) => set({ name })}
            error={wrong.name}
            hint="What stands on the drawing, such as B33 two-door base."
            maxLength={LIMITS.nameLength}
            autoComplete="off"
            enterMoves
          />
          <Choice label="Edge of the openings" options={EDGES} value={edge} onValue={onEdge} />
          <Choice
            label="Drawn in"
            options={UNITS}
            value={unit}
            onValue={onUnit}
            hint="Each unit has entries of its own here; nothing is converted."
          />
        </Section>
        <Section heading="Box">
          <BoxEntry
            {...common}
            path="width"
            label="Width, outside"
            value={box.width}
            above={0}
            onValue={(width) => set({ width })}
          />
          <BoxEntry
            {...common}
            path="height"
            label="Height of the ends"
            value={box.height}
            above={0}
            onValue={(height) => set({ height })}
          />
          <BoxEntry
            {...common}
            path="depth"
            label="Depth"
            hint="Front to back without the frame."
            value={box.depth ?? 0}
            above={0}
            onValue={(depth) => set({ depth })}
          />
        </Section>
        <Section heading="Parts">
          <BoxEntry
            {...common}
            path="ends.thickness"
            label="Ends, thick"
            value={ends.thickness}
            above={0}
            onValue={(thickness) => set({ ends: { thickness } })}
          />
          <BoxEntry
            {...common}
            path="bottom.thickness"
            label="Bottom, thick"
            value={bottom.thickness}
            above={0}
            onValue={(thickness) => set({ bottom: { ...bottom, thickness } })}
          />
          <BoxEntry
            {...common}
            path="bottom.up"
            label="Underside of the bottom, up"
            hint="From the lower edge of the ends, such as the height of a toe kick."
            value={bottom.up}
            onValue={(up) => set({ bottom: { ...bottom, up } })}
          />
          <TopEntries {...common} box={box} onTop={(top) => set({ top })} />
        </Section>
        <Section heading="Partitions">
          <PartitionEntries {...common} box={box} onPartitions={(partitions) => set({ partitions })} />
        </Section>
      </div>
      <div>
        <Section heading="Overhang of the frame">
          <p className="mb-1 text-11 text-pencil">
            How far it stands out past the box’s outside. Negative where the box stands out past the frame.
          </p>
          {SIDES.map(({ side, label }) => (
            <BoxEntry
              {...common}
              key={side}
              path={`overhang.${side}`}
              label={`Overhang ${label}`}
              value={overhang[side]}
              onValue={(value) => set({ overhang: { ...overhang, [side]: value } })}
            />
          ))}
          <BoxEntry
            {...common}
            path="feet"
            label="Feet"
            hint="How far the stiles run down past the bottom rail."
            value={box.feet}
            onValue={(feet) => set({ feet })}
          />
        </Section>
        <Section heading="Reveals">
          <p className="mb-1 text-11 text-pencil">
            How far a member reaches past the part behind it, into the opening. Without a top, the top’s counts from the
            upper edge of the ends.
          </p>
          {REVEALS.map(({ side, label }) => (
            <BoxEntry
              {...common}
              key={side}
              path={`reveal.${side}`}
              label={label}
              value={reveal[side]}
              onValue={(value) => set({ reveal: { ...reveal, [side]: value } })}
            />
          ))}
          {box.partitions && (
            <BoxEntry
              {...common}
              path="reveal.partition"
              label="Past each side of a partition"
              value={reveal.partition}
              onValue={(partition) => set({ reveal: { ...reveal, partition } })}
            />
          )}
        </Section>
        <Section heading="Dados">
          <BoxEntry
            {...common}
            path="dado.depth"
            label="Depth"
            value={dado.depth}
            above={0}
            onValue={(depth) => set({ dado: { ...dado, depth } })}
          />
          <BoxEntry
            {...common}
            path="dado.clearance"
            label="Clearance"
            value={dado.clearance}
            onValue={(clearance) => set({ dado: { ...dado, clearance } })}
          />
          <BoxEntry
            {...common}
            path="letIn"
            label="Parts let into one another"
            hint="How deep a part that ends at another is let into it."
            value={box.letIn}
            onValue={(letIn) => set({ letIn })}
          />
          <Choice
            label="Past top and bottom of the box"
            options={RUNS}
            value={dado.run}
            onValue={(run) => set({ dado: { ...dado, run } })}
            hint="How dados of upright parts end where the frame stands out past the box."
            error={wrong['dado.run']}
          />
        </Section>
      </div>
    </div>
  );
}
