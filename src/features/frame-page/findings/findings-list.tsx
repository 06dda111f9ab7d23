import { memo } from 'react';
import type { Finding, FindingLevel } from '#shared/kernel/checks/finding.ts';
import { Button } from '../../../ui/button.tsx';
import { light, useDesk } from '../model/desk.ts';
import { entryOf, goToEntry } from '../model/find-entry.ts';
import { useStore } from '../model/store.ts';
import { viewOfPlaces } from '../model/view-of-places.ts';

const WORDS: Record<FindingLevel, string> = { stop: 'Stop', caution: 'Caution', note: 'Note' };
const COLOURS: Record<FindingLevel, string> = { stop: 'text-stop', caution: 'text-caution', note: 'text-ink' };

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
  const { editor, findings, lit, view, page } = useDesk();
  const finding = (): Finding | undefined => findings.get()[index];
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
    const { drawn } = editor.store.get();
    const places = finding()?.places ?? [];
    if (places.length > 0)
      view.set(
        viewOfPlaces(
          drawn,
          places.map((place) => place.extents),
          page.get(),
        ),
      );
  }
  function goThere() {
    const field = finding()?.field;
    if (field !== undefined) goToEntry(entryOf(editor.store.get().history.present, field));
  }
  return (
    <li
      onPointerEnter={on}
      onPointerLeave={off}
      onFocus={on}
      onBlur={off}
      className="flex flex-wrap items-baseline gap-x-3 border-b border-rule px-4 py-1 last:border-b-0 hover:bg-board-light @xl:flex-nowrap"
    >
      <strong className={`w-16 flex-1 @xl:flex-none ${COLOURS[level]}`}>{WORDS[level]}</strong>
      <p className="order-last basis-full wrap-anywhere @xl:order-none @xl:min-w-0 @xl:flex-1">
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
  const findings = useStore(useDesk().findings, (value) => value);
  return (
    <section aria-labelledby="findings-heading" className={`@container relative overflow-y-auto ${className}`}>
      <h2 id="findings-heading" className="sr-only">
        Findings
      </h2>
      {findings.length === 0 ? (
        <p className="px-4 py-1">No findings: nothing stops this frame.</p>
      ) : (
        <ul className="text-12">
          {findings.map((f, i) => (
            <FindingRow
              key={i}
              index={i}
              level={f.level}
              text={f.text}
              remedy={f.remedy}
              hasEntry={f.field !== undefined}
              hasPlace={f.places.length > 0}
            />
          ))}
        </ul>
      )}
    </section>
  );
}
