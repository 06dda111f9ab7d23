import { useState } from 'react';
import type { Sides } from '#shared/kernel/box/box.ts';
import { listBoxParts } from '#shared/kernel/box/list-box-parts.ts';
import type { Particulars } from '#shared/kernel/particulars/particulars.ts';
import { Dialog } from '../../ui/dialog.tsx';
import { LengthField } from '../../ui/length-field.tsx';
import { BoxPartsTable } from './box-parts-table.tsx';
import { SIDES } from './sides.ts';

interface BoxPartsDialogProps {
  readonly particulars: Particulars;
  readonly onClose: () => void;
}

const NO_OVERHANG: Sides = { left: 0, right: 0, top: 0, bottom: 0 };

/** Name that the box page gives to the one part that is not as deep as its box. */
const STRETCHER = 'Stretcher';

/** The box parts that plug into a frame. What a frame does not say of its box is asked for. */
export function BoxPartsDialog({ particulars, onClose }: BoxPartsDialogProps) {
  const { unit, name } = particulars;
  const [depth, setDepth] = useState(0);
  const [stretcher, setStretcher] = useState(0);
  const [letIn, setLetIn] = useState(0);
  const [overhang, setOverhang] = useState(NO_OVERHANG);
  const parts = listBoxParts(particulars, {
    overhang,
    letIn,
    ...(depth > 0 ? { depth } : {}),
    ...(stretcher > 0 ? { widths: { [STRETCHER]: stretcher } } : {}),
  });
  const sides = SIDES.filter(({ side }) => parts.some((part) => part.runsOut.includes(side)));
  return (
    <Dialog title={`Box parts of ${name}`} onClose={onClose} wide>
      <div data-fields className="mb-3 grid gap-x-10 sm:grid-cols-2">
        <div>
          <LengthField
            label="Depth of the box"
            hint="Front to back without the frame; 0 where it is not known."
            value={depth}
            unit={unit}
            onValue={setDepth}
          />
          {parts.some(({ part }) => part === STRETCHER) && (
            <LengthField
              label="Stretcher, front to back"
              hint="0 where it is as deep as the box."
              value={stretcher}
              unit={unit}
              onValue={setStretcher}
            />
          )}
          <LengthField
            label="Parts let into one another"
            hint="How deep a part that ends at another is let into it."
            value={letIn}
            unit={unit}
            onValue={setLetIn}
          />
        </div>
        {sides.length > 0 && (
          <div>
            <p className="mb-1 text-12">
              Some dados run out through the frame’s edge. Parts there are as long as the frame less what it stands out
              past the box:
            </p>
            {sides.map(({ side, label }) => (
              <LengthField
                key={side}
                label={`Overhang ${label}`}
                value={overhang[side]}
                unit={unit}
                onValue={(value) => setOverhang((now) => ({ ...now, [side]: value }))}
              />
            ))}
          </div>
        )}
      </div>
      <BoxPartsTable parts={parts} unit={unit} name={name} />
    </Dialog>
  );
}
