import { memo } from 'react';
import type { SetName } from '#shared/kernel/line-sets/line-set.ts';
import { useDesk } from '../model/desk.ts';
import { useStore } from '../model/store.ts';
import { SET_LOOK } from './set-look.ts';
import type { LegendEntry } from './set-words.ts';

function Swatch({ set }: { readonly set: SetName }) {
  return (
    <svg aria-hidden="true" width="20" height="8" className="shrink-0">
      <path d="M0 4H20" className={SET_LOOK[set]} />
    </svg>
  );
}

/** The line sets of a face in cutting order; each is a switch for its lines. */
export const FaceLegend = memo(function FaceLegend({
  entries,
  face,
}: {
  readonly entries: readonly LegendEntry[];
  readonly face: string;
}) {
  const desk = useDesk();
  const hidden = useStore(desk.hidden, (value) => value);
  function toggle(key: string) {
    const next = new Set(hidden);
    if (!next.delete(key)) next.add(key);
    desk.hidden.set(next);
  }
  return (
    <ul aria-label={`Line sets of the ${face}`} className="flex flex-wrap gap-x-3.5">
      {entries.map(({ key, order, words, set }) => (
        <li key={key}>
          <button
            type="button"
            aria-pressed={!hidden.has(key)}
            onClick={() => toggle(key)}
            className="flex min-h-6 items-center gap-1.5 text-11 aria-[pressed=false]:text-pencil aria-[pressed=false]:line-through hover:underline"
          >
            <Swatch set={set} />
            {order > 0 && `${order} `}
            {words}
          </button>
        </li>
      ))}
    </ul>
  );
});
