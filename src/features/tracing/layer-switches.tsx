import type { CensusRow } from '#shared/kernel/tracing/found-drawing.ts';
import type { TraceOptions } from '#shared/kernel/tracing/traced-drawing.ts';
import { Checkbox } from '../../ui/checkbox.tsx';

interface LayerSwitchesProps {
  readonly census: readonly CensusRow[];
  readonly placed: readonly CensusRow[];
  readonly options: TraceOptions;
  readonly onOptions: (options: TraceOptions) => void;
}

/** How many entities are on each layer, those that blocks put there too; layers that are left out stay in the list. */
function countByLayer(rows: readonly CensusRow[], leftOut: readonly string[]): [layer: string, count: number][] {
  const counts = new Map<string, number>(leftOut.map((layer) => [layer, 0]));
  for (const { layer, count } of rows) counts.set(layer, (counts.get(layer) ?? 0) + count);
  return [...counts].sort(([a], [b]) => a.localeCompare(b, 'en', { numeric: true }));
}

/** Which layers are read: one that holds no frames can be left out. */
export function LayerSwitches({ census, placed, options, onOptions }: LayerSwitchesProps) {
  const layers = countByLayer([...census, ...placed], options.leaveOut);
  if (layers.length < 2) return null;
  const read = (layer: string, on: boolean) =>
    onOptions({
      ...options,
      leaveOut: on ? options.leaveOut.filter((other) => other !== layer) : [...options.leaveOut, layer],
    });
  return (
    <fieldset className="mt-3">
      <legend className="mb-1 text-12 font-bold">Layers that are read</legend>
      <div className="max-h-64 overflow-y-auto">
        {layers.map(([layer, count]) => (
          <Checkbox
            key={layer}
            label={
              <span className="wrap-anywhere">
                {layer} <span className="text-pencil">{count}</span>
              </span>
            }
            checked={!options.leaveOut.includes(layer)}
            onChecked={(on) => read(layer, on)}
          />
        ))}
      </div>
    </fieldset>
  );
}
