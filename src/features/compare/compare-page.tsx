import { useMemo, useState } from 'react';
import { compareFrames } from '#shared/kernel/compare/compare-frames.ts';
import { isUnchanged } from '#shared/kernel/compare/say-change.ts';
import { drawFrame } from '#shared/kernel/draw-frame.ts';
import type { Particulars } from '#shared/kernel/particulars/particulars.ts';
import type { Unit } from '#shared/kernel/units/unit.ts';
import { Choice } from '../../ui/choice.tsx';
import { ButtonLink } from '../../ui/button-link.tsx';
import { Empty } from '../../ui/empty.tsx';
import { Notice } from '../../ui/notice.tsx';
import { plural } from '../../ui/plural.ts';
import { Select } from '../../ui/select.tsx';
import { Sheet } from '../../ui/sheet.tsx';
import { TitleBlock, TitleCell } from '../../ui/title-block.tsx';
import { ChangeList } from './change-list.tsx';
import { ChangeTable } from './change-table.tsx';
import { ComparedPictures, type Faces } from './compared-pictures.tsx';
import { describeState } from './describe-state.ts';

const UNIT_WORDS: Record<Unit, string> = { in: 'inches', mm: 'millimetres' };

export type CompareView = 'side' | 'overlaid' | 'table';

/** What the address holds. */
export interface CompareChoice {
  /** A revision's letter, or "draft". */
  readonly from: string;
  readonly to: string;
  readonly view: CompareView;
}

export interface ComparePageProps {
  readonly shopName: string;
  readonly job: { readonly id: string; readonly name: string };
  readonly frame: { readonly id: string; readonly name: string };
  /** What can be compared: letters and "draft", newest first. */
  readonly states: readonly string[];
  readonly choice: CompareChoice;
  readonly before: Particulars;
  readonly after: Particulars;
  readonly onChoice: (choice: CompareChoice) => void;
}

/** Two states of a frame side by side, over each other and in a table. */
export function ComparePage({ shopName, job, frame, states, choice, before, after, onChoice }: ComparePageProps) {
  const { from, to, view } = choice;
  const [drawnBefore, drawnAfter] = [
    useMemo(() => drawFrame(before), [before]),
    useMemo(() => drawFrame(after), [after]),
  ];
  const comparison = useMemo(() => compareFrames(drawnBefore, drawnAfter), [drawnBefore, drawnAfter]);
  const [faces, setFaces] = useState<Faces>('both');
  const [pick, setPick] = useState({ comparison, at: -1 });
  // A pick belongs to the comparison that it was made in.
  const picked = pick.comparison === comparison ? pick.at : -1;
  const { features, settings, unit, unitWas } = comparison;
  const options = states.map((value) => ({ value, label: describeState(value) }));
  const [fromWords, toWords] = [from, to].map(describeState) as [string, string];
  const unsolved = [
    { words: fromWords, drawn: drawnBefore },
    { words: toWords, drawn: drawnAfter },
  ].filter(({ drawn }) => drawn.outlineFindings.length > 0);
  return (
    <Sheet
      title={`Compare ${frame.name}`}
      crumbs={[
        { label: 'Jobs', to: '/jobs' },
        { label: job.name, to: `/jobs/${job.id}` },
        { label: frame.name, to: `/frames/${frame.id}` },
        { label: 'Compare' },
      ]}
      titleBlock={
        <TitleBlock
          action={
            <ButtonLink to={`/frames/${frame.id}`} kind="main" wide>
              To the frame
            </ButtonLink>
          }
        >
          <TitleCell label="Shop" detail={job.name}>
            {shopName}
          </TitleCell>
          <TitleCell label="Frame" main>
            {frame.name}
          </TitleCell>
          <TitleCell
            label="Compared"
            detail={`lengths in ${UNIT_WORDS[unit]}`}
          >{`${fromWords} → ${toWords}`}</TitleCell>
          <TitleCell label="Changes" detail={plural(settings.length, 'setting')}>
            {plural(features.length, 'part')}
          </TitleCell>
        </TitleBlock>
      }
    >
      <div className="mb-3 grid gap-x-6 gap-y-1 sm:grid-cols-2 lg:grid-cols-[9rem_9rem_1fr_1fr] print:hidden">
        <Select
          label="From"
          layout="stack"
          options={options}
          value={from}
          onValue={(value) => onChoice({ ...choice, from: value })}
        />
        <Select
          label="To"
          layout="stack"
          options={options}
          value={to}
          onValue={(value) => onChoice({ ...choice, to: value })}
        />
        <Choice
          label="Shown"
          options={[
            { value: 'side', label: 'Side by side' },
            { value: 'overlaid', label: 'Overlaid' },
            { value: 'table', label: 'Table' },
          ]}
          value={view}
          onValue={(value) => onChoice({ ...choice, view: value })}
        />
        {view !== 'table' && (
          <Choice
            label="Faces"
            options={[
              { value: 'both', label: 'Both' },
              { value: 'back', label: 'Back' },
              { value: 'front', label: 'Front' },
            ]}
            value={faces}
            onValue={setFaces}
          />
        )}
      </div>
      {unsolved.map(({ words, drawn }) => (
        <Notice key={words} level="caution">
          {words}: {drawn.outlineFindings.map(({ text }) => text).join(' ')} What cannot be drawn is not compared.
        </Notice>
      ))}
      {unitWas !== null && (
        <Notice level="note">
          The unit changed from {UNIT_WORDS[unitWas]} to {UNIT_WORDS[unit]}; lengths are compared in {UNIT_WORDS[unit]}.
        </Notice>
      )}
      {isUnchanged(comparison) ? (
        <Empty title={`Nothing has changed between ${fromWords} and ${toWords}.`}>
          Lines, cutters and settings are the same. Pick another state to compare.
        </Empty>
      ) : view === 'table' ? (
        <ChangeTable comparison={comparison} from={fromWords} to={toWords} />
      ) : (
        <div className="grid gap-x-8 gap-y-4 lg:grid-cols-[minmax(0,1fr)_24rem]">
          <ComparedPictures
            comparison={comparison}
            overlaid={view === 'overlaid'}
            faces={faces}
            picked={features[picked]}
            names={{ before: fromWords, after: toWords }}
          />
          <div className="min-w-0">
            <ChangeList comparison={comparison} picked={picked} onPick={(at) => setPick({ comparison, at })} />
          </div>
        </div>
      )}
    </Sheet>
  );
}
