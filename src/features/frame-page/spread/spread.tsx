import { memo, useLayoutEffect, useMemo, useRef } from 'react';
import type { LineSet } from '#shared/kernel/line-sets/line-set.ts';
import type { Unit } from '#shared/kernel/units/unit.ts';
import { formatLength } from '#shared/kernel/units/format-length.ts';
import { useDesk, useEditor } from '../model/desk.ts';
import { useStore } from '../model/store.ts';
import { boardInFrameView, fitTo } from '../model/view.ts';
import { SelectionPanel } from '../on-drawing/selection-panel.tsx';
import { SelectionStatus } from '../on-drawing/selection-status.tsx';
import { FacePage } from './face-page.tsx';
import { legendOf, type LegendEntry } from './set-words.ts';
import { SpreadBar } from './spread-bar.tsx';
import { usePageSize } from './use-page-size.ts';
import { useSpreadKeys } from './use-spread-keys.ts';

/** The legend as the same object for as long as it says the same, so that typing does not draw it again. */
function useLegend(lineSets: readonly LineSet[], unit: Unit): readonly LegendEntry[] {
  const said = JSON.stringify(legendOf(lineSets, unit));
  return useMemo(() => JSON.parse(said) as LegendEntry[], [said]);
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
  const worked = useEditor((s) => s.drawn);
  const chosen = useStore(desk.view, (value) => value);
  const pages = useRef<HTMLDivElement>(null);
  const size = usePageSize(pages);
  const page = useStore(desk.page, (value) => value);
  const { unit } = worked.particulars;
  const isUpright = worked.blank.flip === 'side-to-side';
  const backLegend = useLegend(worked.back.lineSets, unit);
  const frontLegend = useLegend(worked.front.lineSets, unit);
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

  const view = useMemo(() => chosen ?? fitTo(boardInFrameView(worked), page), [chosen, worked, page]);
  useLayoutEffect(() => desk.shown.set(view), [desk, view]);

  const pressKey = useSpreadKeys();
  const { rough } = worked.blank;
  const blank = `${formatLength(rough.maxX, unit)} × ${formatLength(rough.maxY, unit)} ${worked.blank.given ? 'board given' : 'blank'}`;
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
        <FacePage
          face="back"
          worked={worked}
          view={view}
          page={page}
          legend={backLegend}
          heading="Back, cut first"
          aside={blank}
          className={pageLook}
        />
        <Fold isUpright={isUpright} />
        <FacePage
          face="front"
          worked={worked}
          view={view}
          page={page}
          legend={frontLegend}
          heading="Front, cut second"
          aside={isUpright ? 'turned side to side' : 'turned end over end'}
          className={pageLook}
        />
        <SelectionPanel worked={worked} view={view} page={page} />
      </div>
      <SelectionStatus />
      <SpreadBar />
    </div>
  );
});
