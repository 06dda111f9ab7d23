import type { Box, BoxTop } from '#shared/kernel/box/box.ts';
import type { Unit } from '#shared/kernel/units/unit.ts';
import type { FieldMessages } from '../../lib/field-messages.ts';
import { Choice } from '../../ui/choice.tsx';
import { BoxEntry } from './box-entry.tsx';

interface TopEntriesProps {
  readonly box: Box;
  readonly unit: Unit;
  readonly wrong: FieldMessages;
  readonly onTop: (top: BoxTop | undefined) => void;
}

const KINDS = [
  { value: 'none', label: 'None' },
  { value: 'panel', label: 'Panel' },
  { value: 'stretcher', label: 'Stretcher' },
] as const;

/** Width of a stretcher to begin from, front to back. Common practice, no source. */
const STRETCHER: Record<Unit, number> = { in: 4, mm: 100 };

/** What closes the box at the top, if anything does. */
export function TopEntries({ box: { top, ends }, unit, wrong, onTop }: TopEntriesProps) {
  function choose(kind: 'none' | BoxTop['kind']) {
    const { thickness, down } = top ?? { thickness: ends.thickness, down: 0 };
    if (kind === 'none') onTop(undefined);
    else if (kind === 'panel') onTop({ kind, thickness, down });
    else onTop({ kind, thickness, down, width: STRETCHER[unit] });
  }
  const common = { unit, wrong };
  return (
    <>
      <Choice label="Top" options={KINDS} value={top?.kind ?? 'none'} onValue={choose} />
      {top && (
        <>
          <BoxEntry
            {...common}
            path="top.thickness"
            label="Top, thick"
            value={top.thickness}
            above={0}
            onValue={(thickness) => onTop({ ...top, thickness })}
          />
          <BoxEntry
            {...common}
            path="top.down"
            label="Upper face of the top, down"
            hint="From the upper edge of the ends."
            value={top.down}
            onValue={(down) => onTop({ ...top, down })}
          />
        </>
      )}
      {top?.kind === 'stretcher' && (
        <BoxEntry
          {...common}
          path="top.width"
          label="Stretcher, front to back"
          value={top.width}
          above={0}
          onValue={(width) => onTop({ ...top, width })}
        />
      )}
    </>
  );
}
