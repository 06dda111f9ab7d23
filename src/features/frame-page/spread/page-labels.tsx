import { memo } from 'react';
import type { Placement } from '#shared/kernel/placing/placement.ts';
import { toPage, type PageSize, type View } from '../model/view.ts';
import type { Label } from './labels.ts';

/** Width of a character of the 11 px type, and a little on either side of the words. */
const CHARACTER_PX = 6.6;
const SPARE_PX = 6;
/** From the middle of the type down to its baseline. */
const BASELINE_PX = 4;
const LINE_PX = 16;

/** A halo of the board's colour keeps words readable across lines. */
const HALO = 'stroke-board [paint-order:stroke] [stroke-width:4]';
const COLOURS: Record<Label['colour'], string> = {
  back: 'fill-back',
  front: 'fill-front',
  ink: 'fill-ink',
  pencil: 'fill-pencil',
};

const Words = memo(function Words({
  x,
  y,
  turned,
  text,
  look,
}: {
  x: number;
  y: number;
  turned: boolean;
  text: string;
  look: string;
}) {
  // Moved by a group about the words: moving the words themselves, by x and y or a transform of their own, has the browser
  // lay them out anew, which takes longer than all lines of both faces together.
  return (
    <g transform={turned ? `translate(${x} ${y}) rotate(-90)` : `translate(${x} ${y})`}>
      <text y={BASELINE_PX} textAnchor="middle" className={look}>
        {text}
      </text>
    </g>
  );
});

interface PageLabelsProps {
  readonly labels: readonly Label[];
  readonly view: View;
  readonly placement: Placement;
  readonly page: PageSize;
  /** Names of line sets that are switched off: their words go with them. */
  readonly hiddenSets: ReadonlySet<string>;
}

/** Words of a page at a size that does not grow with the board; left out where they would not fit. */
export function PageLabels({ labels, view, placement, page, hiddenSets }: PageLabelsProps) {
  return (
    <g aria-hidden="true" className="text-11 pointer-events-none">
      {labels.map((label) => {
        const length = label.text.length * CHARACTER_PX + SPARE_PX;
        const fits = length <= label.room * view.scale;
        const fitsTurned = !fits && length + LINE_PX <= label.turnedRoom * view.scale;
        if ((!fits && !fitsTurned) || hiddenSets.has(label.hiddenWith)) return null;
        const { x, y } = toPage(view, placement, page, label.at);
        // Turned words stand below what is written above them. Whole pixels keep the type sharp, and unchanged words unchanged.
        const down = fitsTurned ? length / 2 : label.dy;
        return (
          <Words
            key={label.key}
            x={Math.round(x + label.dx)}
            y={Math.round(y + down)}
            turned={label.turned || fitsTurned}
            text={label.text}
            look={label.onBoard ? `${COLOURS[label.colour]} ${HALO}` : COLOURS[label.colour]}
          />
        );
      })}
    </g>
  );
}
