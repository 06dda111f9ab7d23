import { MOST_PARTITIONS } from '#shared/kernel/box/box-limits.ts';
import type { Box, PartitionPlaces } from '#shared/kernel/box/box.ts';
import { countPartitions, placePartitions } from '#shared/kernel/box/place-partitions.ts';
import type { Unit } from '#shared/kernel/units/unit.ts';
import type { FieldMessages } from '../../lib/field-messages.ts';
import { Select } from '../../ui/select.tsx';
import { BoxEntry } from './box-entry.tsx';

type Partitions = Box['partitions'];
type PlaceKind = PartitionPlaces['kind'];

interface PartitionEntriesProps {
  readonly box: Box;
  readonly unit: Unit;
  readonly wrong: FieldMessages;
  readonly onPartitions: (partitions: Partitions) => void;
}

const COUNTS = Array.from({ length: MOST_PARTITIONS + 1 }, (_, i) => ({
  value: String(i),
  label: i === 0 ? 'none' : String(i),
}));

const PLACES: readonly { readonly value: PlaceKind; readonly label: string }[] = [
  { value: 'equal openings', label: 'equal openings' },
  { value: 'equal spaces', label: 'equal spaces in the box' },
  { value: 'given', label: 'at places given' },
];

/** Places as they are now with one more or fewer; new ones as equal openings put them. */
function placesFor(box: Box, thickness: number, kind: PlaceKind, count: number): PartitionPlaces {
  if (kind !== 'given') return { kind, count };
  const now = placePartitions(box);
  const equal = placePartitions({ ...box, partitions: { thickness, places: { kind: 'equal openings', count } } });
  return { kind, at: now.length === count ? now : equal };
}

/** How many partitions, how thick, and where. */
export function PartitionEntries({ box, unit, wrong, onPartitions }: PartitionEntriesProps) {
  const { partitions } = box;
  const thickness = partitions?.thickness ?? box.ends.thickness;
  const kind = partitions?.places.kind ?? 'equal openings';
  const put = (next: PlaceKind, count: number) =>
    onPartitions(count === 0 ? undefined : { thickness, places: placesFor(box, thickness, next, count) });
  const common = { unit, wrong };
  return (
    <>
      <Select
        label="How many"
        options={COUNTS}
        value={String(countPartitions(box))}
        onValue={(count) => put(kind, Number(count))}
        error={wrong['partitions.places']}
      />
      {partitions && (
        <>
          <BoxEntry
            {...common}
            path="partitions.thickness"
            label="Partitions, thick"
            value={thickness}
            above={0}
            onValue={(value) => onPartitions({ ...partitions, thickness: value })}
          />
          <Select
            label="Placed for"
            options={PLACES}
            value={kind}
            onValue={(next) => put(next, countPartitions(box))}
          />
        </>
      )}
      {partitions?.places.kind === 'given' &&
        partitions.places.at.map((at, i, all) => (
          <BoxEntry
            {...common}
            key={i}
            path={`partitions.places.at.${i}`}
            label={`Left face of partition ${i + 1}`}
            hint={i === all.length - 1 ? 'From the box’s left outside.' : undefined}
            value={at}
            onValue={(value) => onPartitions({ ...partitions, places: { kind: 'given', at: all.with(i, value) } })}
          />
        ))}
    </>
  );
}
