import type { ReactNode } from 'react';
import type { Frame } from '#shared/contracts/frames.ts';
import type { ChangedFrame, MovedDado } from '#shared/kernel/starters/member-change.ts';
import { formatWithUnit } from '#shared/kernel/units/format-length.ts';
import type { Unit } from '#shared/kernel/units/unit.ts';
import { Table, type Column } from '../../ui/table.tsx';
import type { DraftOutcome } from './api/save-drafts.ts';

interface ChangePreviewProps {
  readonly frames: readonly Frame[];
  /** By frame; empty until there is a change to show. */
  readonly results: ReadonlyMap<string, ChangedFrame>;
  /** So far. */
  readonly outcomes: readonly DraftOutcome[];
}

const ENTRY_WORDS: Record<MovedDado['entry'], string> = { at: 'stands', from: 'begins', to: 'ends' };

const sayMoved = ({ part, entry, was, is }: MovedDado, unit: Unit): string =>
  `${part} ${ENTRY_WORDS[entry]} at ${formatWithUnit(is, unit)}, was ${formatWithUnit(was, unit)}`;

const Lines = ({ lines }: { readonly lines: readonly string[] }) => (
  <ul>
    {lines.map((line, i) => (
      <li key={i} className="wrap-anywhere">
        {line}
      </li>
    ))}
  </ul>
);

function Change({ result, particulars }: { readonly result: ChangedFrame | undefined } & Pick<Frame, 'particulars'>) {
  if (result === undefined) return <span className="text-pencil">no length yet</span>;
  if (!result.ok) {
    return (
      <span className="wrap-anywhere">
        <strong className="text-stop">Not changed: </strong>
        {result.why}
      </span>
    );
  }
  if (result.particulars === particulars)
    return <Lines lines={result.skipped.map((line) => `Stays as it is, ${line}`)} />;
  return <Lines lines={[...result.changed, ...result.skipped]} />;
}

function Follows({ result, unit }: { readonly result: ChangedFrame | undefined; readonly unit: Unit }) {
  if (!result?.ok) return null;
  return (
    <>
      <Lines lines={result.moved.map((moved) => sayMoved(moved, unit))} />
      {result.stayed.length > 0 && (
        <p className="text-caution">
          <strong>Caution: </strong>
          Left where it stood, because it could follow in more than one way:{' '}
          {result.stayed.map(({ part }) => part).join(', ')}. Look at it on the frame’s page.
        </p>
      )}
    </>
  );
}

function sayOutcome(outcome: DraftOutcome | undefined): ReactNode {
  switch (outcome?.became) {
    case undefined:
      return null;
    case 'saved':
      return 'saved';
    case 'left':
      return 'left as it was: stopped before its turn';
    case 'stale':
      return <span className="text-stop">stale: somebody else saved it meanwhile; nothing of it was changed</span>;
    case 'refused':
      return <span className="text-stop">refused: {outcome.why}</span>;
  }
}

/** What becomes of each frame, what goes along, what stays and why; and once saved, how that went. */
export function ChangePreview({ frames, results, outcomes }: ChangePreviewProps) {
  const columns: Column<Frame>[] = [
    { key: 'name', head: 'Frame', names: true, cell: ({ particulars }) => <b>{particulars.name}</b> },
    {
      key: 'change',
      head: 'Change',
      cell: ({ id, particulars }) => <Change result={results.get(id)} particulars={particulars} />,
    },
    {
      key: 'follows',
      head: 'Goes along',
      cell: ({ id, particulars }) => <Follows result={results.get(id)} unit={particulars.unit} />,
    },
    {
      key: 'outcome',
      head: 'Draft',
      cell: ({ id }) => sayOutcome(outcomes.find(({ frameId }) => frameId === id)),
    },
  ];
  return <Table caption="What becomes of each frame" columns={columns} rows={frames} rowKey={({ id }) => id} />;
}
