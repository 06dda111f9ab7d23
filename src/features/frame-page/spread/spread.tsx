import { memo, useLayoutEffect, useRef, useState } from 'react';
import type { Face } from '#shared/kernel/line-sets/line-set.ts';
import { formatLength } from '#shared/kernel/units/format-length.ts';
import { useDesk, useEditor } from '../model/desk.ts';
import type { EditorState } from '../model/frame-editor.ts';
import { useSettled } from '../model/use-settled.ts';
import { SelectionPanel } from '../on-drawing/selection-panel.tsx';
import { SelectionStatus } from '../on-drawing/selection-status.tsx';
import { FacePage } from './face-page.tsx';
import { legendOf, type LegendEntry } from './set-words.ts';
import { SpreadBar } from './spread-bar.tsx';
import { usePageSize } from '../../../ui/use-page-size.ts';
import { useSpreadKeys } from './use-spread-keys.ts';

const legend = (face: Face) => {
  let said: readonly LegendEntry[] = [];
  // The same object for as long as it says the same, so that typing does not draw it again.
  return ({ drawn }: EditorState): readonly LegendEntry[] => {
    const now = legendOf(drawn[face].lineSets, drawn.particulars.unit);
    if (JSON.stringify(now) !== JSON.stringify(said)) said = now;
    return said;
  };
};

function boardWords({ drawn: { blank, particulars } }: EditorState): string {
  const { rough } = blank;
  const say = (length: number): string => formatLength(length, particulars.unit);
  return `${say(rough.maxX)} × ${say(rough.maxY)} ${blank.given ? 'board given' : 'blank'}`;
}

function Fold({ isUpright }: { readonly isUpright: boolean }) {
  return (
    <div
      aria-hidden="true"
      className={`relative shrink-0 border-dashed border-ink ${isUpright ? 'row-span-3 border-l' : 'border-t'}`}
    >
      <span
        className={`absolute bg-paper text-11 whitespace-nowrap ${isUpright ? 'top-1/2 left-0 -translate-x-1/2 -translate-y-1/2 rotate-180 py-2 [writing-mode:vertical-rl]' : 'top-0 left-1/2 -translate-x-1/2 -translate-y-1/2 px-2'}`}
      >
        fold: turn the board over this line
      </span>
    </div>
  );
}

/** Both faces as two pages about the fold, side by side or one above the other as the board is turned. */
export const Spread = memo(function Spread() {
  const desk = useDesk();
  const pages = useRef<HTMLDivElement>(null);
  const size = usePageSize(pages);
  const isUpright = useEditor((s) => s.drawn.blank.flip === 'side-to-side');
  const [legendOfBack] = useState(() => legend('back'));
  const [legendOfFront] = useState(() => legend('front'));
  const backLegend = useSettled(legendOfBack);
  const frontLegend = useSettled(legendOfFront);
  const board = useSettled(boardWords);
  const pageLook = isUpright ? 'row-span-3 grid grid-rows-subgrid' : 'flex flex-1 flex-col';

  // One scale serves both pages, so that the smaller one counts.
  useLayoutEffect(() => {
    const areas = [...(pages.current?.querySelectorAll('[data-drawing-area]') ?? [])].map((area) =>
      area.getBoundingClientRect(),
    );
    const width = Math.round(Math.min(...areas.map((area) => area.width)));
    const height = Math.round(Math.min(...areas.map((area) => area.height)));
    const now = desk.page.get();
    if (width > 0 && height > 0 && (width !== now.width || height !== now.height)) desk.page.set({ width, height });
  }, [desk, size, isUpright, backLegend, frontLegend]);

  const pressKey = useSpreadKeys();
  return (
    <div className="flex min-h-0 min-w-0 flex-1 flex-col">
      <div
        ref={pages}
        role="group"
        tabIndex={0}
        data-spread=""
        aria-label="Spread: both faces about the fold"
        aria-keyshortcuts="+ - 0 F M O"
        onKeyDown={pressKey}
        className={`relative min-h-0 flex-1 focus-visible:-outline-offset-2 ${isUpright ? 'grid grid-cols-[minmax(0,1fr)_auto_minmax(0,1fr)] grid-rows-[auto_minmax(0,1fr)_auto]' : 'flex flex-col'}`}
      >
        <FacePage face="back" legend={backLegend} heading="Back, cut first" aside={board} className={pageLook} />
        <Fold isUpright={isUpright} />
        <FacePage
          face="front"
          legend={frontLegend}
          heading="Front, cut second"
          aside={isUpright ? 'turned side to side' : 'turned end over end'}
          className={pageLook}
        />
        <SelectionPanel />
      </div>
      <SelectionStatus />
      <SpreadBar />
    </div>
  );
});
