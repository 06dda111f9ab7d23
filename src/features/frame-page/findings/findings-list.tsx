import { memo } from 'react';
import type { Finding, FindingLevel } from '#shared/kernel/checks/finding.ts';
import type { Extents } from '#shared/kernel/contour/contour.ts';
import { Button } from '../../../ui/button.tsx';
import { light, useDesk, useEditor } from '../model/desk.ts';
import { entryOf, goToEntry } from '../model/find-entry.ts';
import { fitTo } from '../model/view.ts';

const WORDS: Record<FindingLevel, string> = { stop: 'Stop', caution: 'Caution', note: 'Note' };
const COLOURS: Record<FindingLevel, string> = { stop: 'text-stop', caution: 'text-caution', note: 'text-ink' };

/** Share of the page that a place takes when it is gone to, so that one sees where on the board it is. */
const PLACE_SHARE = 0.25;

const around = (all: readonly Extents[]): Extents => ({
  minX: Math.min(...all.map((e) => e.minX)),
  minY: Math.min(...all.map((e) => e.minY)),
  maxX: Math.max(...all.map((e) => e.maxX)),
  maxY: Math.max(...all.map((e) => e.maxY)),
});

interface RowProps {
  readonly index: number;
  readonly level: FindingLevel;
  readonly text: string;
  readonly remedy: string;
  readonly hasEntry: boolean;
  readonly hasPlace: boolean;
}

/** Drawn again only when its words change: where it points is asked when it is pointed at. */
const FindingRow = memo(function FindingRow({ index, level, text, remedy, hasEntry, hasPlace }: RowProps) {
  const { editor, lit, view, page } = useDesk();
  const finding = (): Finding | undefined => editor.store.get().worked.findings[index];
  const on = () => {
    const places = finding()?.places ?? [];
    light(
      lit,
      places.flatMap((place) => place.features),
      places.map((place) => place.extents),
    );
  };
  const off = () => light(lit, []);
  function zoomThere() {
    const places = finding()?.places ?? [];
    if (places.length === 0) return;
    const e = around(places.map((place) => place.extents));
    const size = page.get();
    const whole = fitTo(e, size, (Math.min(size.width, size.height) * (1 - PLACE_SHARE)) / 2);
    const { worked } = editor.store.get();
    // No nearer than a quarter of the frame's height fills the page: a corner alone says nothing.
    const nearest = (4 * Math.min(size.width, size.height)) / Math.max(worked.contours.height, worked.contours.width);
    view.set({ ...whole, scale: Math.min(whole.scale, nearest) });
  }
  function goThere() {
    const field = finding()?.field;
    if (field !== undefined) goToEntry(entryOf(editor.store.get().history.present, field));
  }
  return (
    <li onPointerEnter={on} onPointerLeave={off} onFocus={on} onBlur={off} className="flex items-baseline gap-3 border-b border-rule px-4 py-1 last:border-b-0 hover:bg-board-light">
      <strong className={`w-16 shrink-0 ${COLOURS[level]}`}>{WORDS[level]}</strong>
      <p className="min-w-0 flex-1 wrap-anywhere">
        {text} {remedy !== '' && <span className="text-pencil">{remedy}</span>}
      </p>
      {hasPlace && (
        <Button kind="quiet" onClick={zoomThere} aria-label={`Show: ${text}`}>
          Show
        </Button>
      )}
      {hasEntry && (
        <Button kind="quiet" onClick={goThere} aria-label={`Go to the entry: ${text}`}>
          Entry
        </Button>
      )}
    </li>
  );
});

/** What the checks say, stops first. Each lights up its place on both faces; it leads to the place and to the entry to change. */
export function FindingsList({ className }: { readonly className: string }) {
  const findings = useEditor((s) => s.worked.findings);
  return (
    <section aria-labelledby="findings-heading" className={`overflow-y-auto ${className}`}>
      <h2 id="findings-heading" className="sr-only">
        Findings
      </h2>
      {findings.length === 0 ? (
        <p className="px-4 py-1">No findings: nothing stops this frame.</p>
      ) : (
        <ul className="text-12">
          {findings.map((f, i) => (
            <FindingRow key={i} index={i} level={f.level} text={f.text} remedy={f.remedy} hasEntry={f.field !== undefined} hasPlace={f.places.length > 0} />
          ))}
        </ul>
      )}
    </section>
  );
}
