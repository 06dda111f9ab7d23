import { useState } from 'react';
import { useNavigate } from 'react-router';
import { newFrame } from '#shared/kernel/particulars/new-frame.ts';
import type { Unit } from '#shared/kernel/units/unit.ts';
import { Button } from '../../ui/button.tsx';
import { Choice } from '../../ui/choice.tsx';
import { useCreateFrame } from './api/create-frame.ts';
import { asFrameRequest } from './as-frame-request.ts';
import { NameDialog } from './name-dialog.tsx';

interface NewFrameProps {
  readonly jobId: string;
  /** Where the choice of unit begins. */
  readonly unit: Unit;
  readonly wide?: boolean;
}

/** The button and its dialog; ends on the new frame's page. */
export function NewFrame({ jobId, unit: shopUnit, wide = false }: NewFrameProps) {
  const [open, setOpen] = useState(false);
  const [unit, setUnit] = useState(shopUnit);
  const create = useCreateFrame();
  const navigate = useNavigate();
  const make = (name: string) =>
    create.mutate(
      { jobId, ...asFrameRequest(newFrame(unit, name)) },
      { onSuccess: (frame) => void navigate(`/frames/${frame.id}`) },
    );
  return (
    <>
      <Button kind="main" wide={wide} onClick={() => setOpen(true)}>
        New frame
      </Button>
      {open && (
        <NameDialog
          title="New frame"
          action="Create the frame"
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
          <Choice
            label="Drawn in"
            options={[
              { value: 'in', label: 'Inches' },
              { value: 'mm', label: 'Millimetres' },
            ]}
            value={unit}
            onValue={setUnit}
            hint="Stays with the frame. Lengths in the other unit can be typed with their unit, such as 775mm."
          />
        </NameDialog>
      )}
    </>
  );
}
