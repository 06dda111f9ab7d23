import { useMemo, useState } from 'react';
import { useNavigate } from 'react-router';
import { newFrame } from '#shared/kernel/particulars/new-frame.ts';
import type { Particulars } from '#shared/kernel/particulars/particulars.ts';
import { applyEdgePreset } from '#shared/kernel/starters/apply-edge-preset.ts';
import { STARTERS } from '#shared/kernel/starters/starters.ts';
import type { Starter } from '#shared/kernel/starters/starter.ts';
import { usualEdgePresets } from '#shared/kernel/starters/usual-edge-presets.ts';
import type { Unit } from '#shared/kernel/units/unit.ts';
import { Button } from '../../ui/button.tsx';
import { Choice } from '../../ui/choice.tsx';
import { Select } from '../../ui/select.tsx';
import { useCreateFrames } from './api/create-frames.ts';
import { asFrameRequest } from './as-frame-request.ts';
import { FrameDrawing } from './frame-drawing.tsx';
import { NameDialog } from './name-dialog.tsx';

interface NewFrameProps {
  readonly jobId: string;
  /** Where the choice of unit begins. */
  readonly unit: Unit;
  readonly wide?: boolean;
}

type Beginning = Pick<Starter, 'name' | 'line' | 'frames'> & { readonly id: string };

/** The plainest frame comes first; the starters after it. */
const BEGINNINGS: readonly Beginning[] = [
  {
    id: 'plain',
    name: 'Two openings',
    line: 'A base frame with two openings side by side and four dados.',
    frames: (unit, edge) => {
      const frame = newFrame(unit, 'Two openings');
      return [edge ? applyEdgePreset(frame, edge) : frame];
    },
  },
  ...STARTERS,
];

const UNITS = [
  { value: 'in', label: 'Inches' },
  { value: 'mm', label: 'Millimetres' },
] as const;

const EDGES = [
  { value: 'square', label: 'Square' },
  { value: 'beaded', label: 'Beaded' },
] as const;

/** Frames of a starter under the name that was entered; those that belong together keep their own after it. */
const named = (frames: readonly Particulars[], name: string): Particulars[] =>
  frames.map((frame) => ({ ...frame, name: frames.length === 1 ? name : `${name}: ${frame.name}` }));

/** The button and its dialog; ends on the new frame's page. */
export function NewFrame({ jobId, unit: shopUnit, wide = false }: NewFrameProps) {
  const [open, setOpen] = useState(false);
  const [unit, setUnit] = useState(shopUnit);
  const [starterId, setStarterId] = useState('plain');
  const [edge, setEdge] = useState<'square' | 'beaded'>('square');
  const create = useCreateFrames();
  const navigate = useNavigate();
  const starter = BEGINNINGS.find((s) => s.id === starterId)!;
  const frames = useMemo(
    () =>
      starter.frames(
        unit,
        usualEdgePresets(unit).find((preset) => preset.edge.style === edge),
      ),
    [starter, unit, edge],
  );
  const make = (name: string) =>
    create.mutate(
      { jobId, frames: named(frames, name).map(asFrameRequest) },
      { onSuccess: ([first]) => void navigate(first ? `/frames/${first.id}` : `/jobs/${jobId}`) },
    );
  return (
    <>
      <Button kind="main" wide={wide} onClick={() => setOpen(true)}>
        New frame
      </Button>
      {open && (
        <NameDialog
          title="New frame"
          action={frames.length === 1 ? 'Create the frame' : `Create ${frames.length} frames`}
          working="Creating"
          hint="What stands on the drawing, such as B33 two-door base."
          busy={create.isPending}
          error={create.error}
          onName={make}
          onClose={() => {
            setOpen(false);
            create.reset();
          }}
        >
          <Select
            label="Begin from"
            layout="stack"
            options={BEGINNINGS.map(({ id, name }) => ({ value: id, label: name }))}
            value={starterId}
            onValue={setStarterId}
            hint={starter.line}
          />
          <div className="my-3 flex h-28 items-center justify-center gap-6" aria-hidden="true">
            {frames.map((frame) => (
              <div key={frame.name} className="h-full w-40">
                <FrameDrawing particulars={frame} />
              </div>
            ))}
          </div>
          <Choice label="Edge of the openings" options={EDGES} value={edge} onValue={setEdge} />
          <Choice
            label="Drawn in"
            options={UNITS}
            value={unit}
            onValue={setUnit}
            hint="Stays with the frame. Lengths in the other unit can be typed with their unit, such as 775mm."
          />
        </NameDialog>
      )}
    </>
  );
}
