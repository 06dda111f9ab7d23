import { useId } from 'react';
import type { Extents } from '#shared/kernel/contour/contour.ts';
import { formatWithUnit } from '#shared/kernel/units/format-length.ts';
import type { Unit } from '#shared/kernel/units/unit.ts';
import { Choice } from '../../ui/choice.tsx';
import type { Plane } from './sweeping/picture.ts';

interface PlaneControlsProps {
  readonly region: Extents;
  readonly unit: Unit;
  readonly plane: Plane | null;
  readonly onPlane: (plane: Plane | null) => void;
}

/** Places of the slider from one side of the region to the other. */
const PLACES = 400;

const rangeOf = (region: Extents, runs: Plane['runs']): [number, number] =>
  runs === 'upright' ? [region.minX, region.maxX] : [region.minY, region.maxY];

/** A plane across the board, to look at its inside: none, upright or level, and where. */
export function PlaneControls({ region, unit, plane, onPlane }: PlaneControlsProps) {
  const id = useId();
  const setRuns = (runs: Plane['runs'] | 'none') => {
    if (runs === 'none') return onPlane(null);
    const [low, high] = rangeOf(region, runs);
    onPlane({ runs, at: (low + high) / 2 });
  };
  const [low, high] = plane ? rangeOf(region, plane.runs) : [0, 1];
  // To 1/64 in or 0.1 mm, so that the place can be said without rounding.
  const grain = unit === 'in' ? 1 / 64 : 0.1;
  const step = Math.max(1, Math.round((high - low) / PLACES / grain)) * grain;
  const snap = (at: number) => Math.round(at / grain) * grain;
  return (
    <div>
      <Choice
        label="Section plane"
        hideLabel
        options={[
          { value: 'none', label: 'None' },
          { value: 'upright', label: 'Upright' },
          { value: 'level', label: 'Level' },
        ]}
        value={plane?.runs ?? 'none'}
        onValue={setRuns}
      />
      {plane && (
        <div>
          <label htmlFor={id}>
            {plane.runs === 'upright' ? 'From the left edge' : 'From the lower edge'}:{' '}
            {formatWithUnit(snap(plane.at), unit)}
          </label>
          <input
            id={id}
            type="range"
            min={low}
            max={high}
            step={step}
            value={plane.at}
            aria-valuetext={formatWithUnit(snap(plane.at), unit)}
            onChange={(event) => onPlane({ runs: plane.runs, at: snap(Number(event.target.value)) })}
            className="block w-full accent-ink"
          />
        </div>
      )}
    </div>
  );
}
