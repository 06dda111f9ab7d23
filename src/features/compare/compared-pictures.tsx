import { useId, useState } from 'react';
import type { Comparison, FeatureChange } from '#shared/kernel/compare/comparison.ts';
import type { Face } from '#shared/kernel/line-sets/line-set.ts';
import { ComparedPicture, type Side } from './compared-picture.tsx';

export type Faces = Face | 'both';

const SIDES: readonly Side[] = ['before', 'after'];

/** Steps of the slider, and where it stands at first: both states in full. */
const MOST = 100;

interface ComparedPicturesProps {
  readonly comparison: Comparison;
  readonly overlaid: boolean;
  readonly faces: Faces;
  readonly picked: FeatureChange | undefined;
  readonly names: Readonly<Record<Side, string>>;
}

function sayFade(fade: number, names: Readonly<Record<Side, string>>): string {
  if (fade === 0) return `${names.before} alone`;
  if (fade === MOST) return `${names.after} alone`;
  return fade === MOST / 2 ? 'both alike' : `more of ${fade < MOST / 2 ? names.before : names.after}`;
}

function Key({ look, children }: { readonly look: string; readonly children: string }) {
  return (
    <li className="flex items-center gap-2">
      <svg viewBox="0 0 28 8" aria-hidden="true" className="h-2 w-7">
        <path d="M0 4H28" className={look} />
      </svg>
      {children}
    </li>
  );
}

/** The faces of both states, side by side or over each other with a slider that fades from one to the other. */
export function ComparedPictures({ comparison, overlaid, faces, picked, names }: ComparedPicturesProps) {
  const [fade, setFade] = useState(MOST / 2);
  const slider = useId();
  const shown: readonly Face[] = faces === 'both' ? ['back', 'front'] : [faces];
  return (
    <div className="min-w-0">
      {overlaid && (
        <div className="mb-3 print:hidden">
          <label htmlFor={slider} className="block">
            Fade from {names.before} to {names.after}: {sayFade(fade, names)}
          </label>
          <input
            id={slider}
            type="range"
            min={0}
            max={MOST}
            step={5}
            value={fade}
            aria-valuetext={sayFade(fade, names)}
            onChange={(event) => setFade(Number(event.target.value))}
            className="h-8 w-full max-w-md accent-ink"
          />
        </div>
      )}
      <div className="grid gap-4 sm:grid-cols-2 print:grid-cols-2">
        {shown.flatMap((face) =>
          overlaid
            ? [
                <ComparedPicture
                  key={face}
                  comparison={comparison}
                  face={face}
                  sides={SIDES}
                  fade={fade / MOST}
                  picked={picked}
                  name={`${names.before} under ${names.after}`}
                />,
              ]
            : SIDES.map((side) => (
                <ComparedPicture
                  key={`${face} ${side}`}
                  comparison={comparison}
                  face={face}
                  sides={[side]}
                  fade={0}
                  picked={picked}
                  name={names[side]}
                />
              )),
        )}
      </div>
      <ul aria-label="Lines" className="mt-3 flex flex-wrap gap-x-6 gap-y-1 text-12">
        {overlaid && <Key look="stroke-pencil [stroke-width:1]">{names.before}</Key>}
        <Key look="stroke-ink [stroke-width:1.5]">{overlaid ? names.after : 'in both'}</Key>
        <Key look="stroke-stop [stroke-width:2.5] [stroke-dasharray:7_4]">went</Key>
        <Key look="stroke-back [stroke-width:3]">came, back</Key>
        <Key look="stroke-front [stroke-width:3]">came, front</Key>
        <Key look="stroke-caution [stroke-width:4]">picked change</Key>
      </ul>
    </div>
  );
}
