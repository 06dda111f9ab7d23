import type { FindingCounts as Counts } from '#shared/contracts/jobs.ts';
import { plural } from '../../ui/plural.ts';

/** Stops in their colour, then cautions, then notes; always with the words. */
export function FindingCounts({ counts: { stops, cautions, notes } }: { readonly counts: Counts }) {
  if (stops + cautions + notes === 0) return <>none</>;
  return (
    <ul className="whitespace-nowrap">
      {stops > 0 && <li className="font-bold text-stop">{plural(stops, 'stop')}</li>}
      {cautions > 0 && <li className="text-caution">{plural(cautions, 'caution')}</li>}
      {notes > 0 && <li className="text-pencil">{plural(notes, 'note')}</li>}
    </ul>
  );
}
