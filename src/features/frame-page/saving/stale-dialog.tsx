import { useMemo } from 'react';
import { particulars as contract } from '#shared/contracts/particulars.ts';
import { listChanges } from '#shared/kernel/particulars/list-changes.ts';
import { mergeParticulars } from '#shared/kernel/particulars/merge-particulars.ts';
import type { Particulars } from '#shared/kernel/particulars/particulars.ts';
import { readField } from '#shared/kernel/particulars/read-field.ts';
import { Button } from '../../../ui/button.tsx';
import { Dialog } from '../../../ui/dialog.tsx';
import { Table, type Column } from '../../../ui/table.tsx';
import { When } from '../../../ui/when.tsx';
import { describeField } from '../model/describe-field.ts';
import { entryWords } from './entry-words.ts';

export interface TwoDrafts {
  /** The draft that both started from. */
  readonly base: Particulars;
  readonly mine: Particulars;
  readonly theirs: Particulars;
  readonly changedBy: string;
  readonly changedAt: string;
}

interface StaleDialogProps {
  readonly drafts: TwoDrafts;
  readonly onMine: () => void;
  readonly onTheirs: () => void;
  readonly onMerged: (merged: Particulars) => void;
  /** Nothing is chosen yet, and nothing is saved until it is. */
  readonly onLater: () => void;
}

interface Row {
  readonly path: string;
  readonly entry: string;
  readonly was: string;
  readonly mine: string;
  readonly theirs: string;
}

const COLUMNS: readonly Column<Row>[] = [
  { key: 'entry', head: 'Entry', cell: (row) => row.entry, names: true },
  { key: 'was', head: 'Was', cell: (row) => row.was },
  { key: 'mine', head: 'Yours', cell: (row) => row.mine },
  { key: 'theirs', head: 'Theirs', cell: (row) => row.theirs },
];

function rowsOf({ base, mine, theirs }: TwoDrafts): Row[] {
  const paths = new Set([...listChanges(base, mine), ...listChanges(base, theirs)].map((change) => change.path));
  const words = (p: Particulars, path: string): string => {
    const now = readField(p, path);
    return p !== base &&
      listChanges(base, p).every(
        (c) => c.path !== path && !c.path.startsWith(`${path}.`) && !path.startsWith(`${c.path}.`),
      )
      ? 'as it was'
      : entryWords(path, now, base.unit);
  };
  return [...paths].map((path) => ({
    path,
    entry: describeField(mine, path),
    was: words(base, path),
    mine: words(mine, path),
    theirs: words(theirs, path),
  }));
}

/** Two people saved one draft: shows what each changed and lets one choose. Whatever is chosen, undo brings the other back. */
export function StaleDialog({ drafts, onMine, onTheirs, onMerged, onLater }: StaleDialogProps) {
  const { base, mine, theirs, changedBy, changedAt } = drafts;
  const rows = useMemo(() => rowsOf(drafts), [drafts]);
  const merged = useMemo(() => mergeParticulars(base, mine, theirs), [base, mine, theirs]);
  const read = useMemo(() => contract.safeParse(merged.particulars), [merged]);
  const left = merged.leftOut.map((path) => describeField(mine, path));
  return (
    <Dialog
      title="Somebody else saved this frame meanwhile"
      wide
      onClose={onLater}
      actions={
        <>
          <Button kind="main" disabled={!read.success} onClick={() => onMerged(merged.particulars)}>
            Keep mine where theirs changed nothing
          </Button>
          <Button onClick={onMine}>Keep mine</Button>
          <Button onClick={onTheirs}>Take theirs</Button>
        </>
      }
    >
      <p className="mb-3">
        {changedBy} saved it <When iso={changedAt} />. Your changes are still here and not saved yet. Whatever you
        choose, undo brings the other back.
      </p>
      <Table caption="Entries that either of you changed" columns={COLUMNS} rows={rows} rowKey={(row) => row.path} />
      <p className="mt-3 text-12">
        {!read.success
          ? 'The two drafts do not fit together entry by entry: choose one of them whole.'
          : left.length === 0
            ? 'No entry was changed by both: keeping yours where theirs changed nothing keeps everything.'
            : `Changed by both, where theirs would stand: ${left.join('; ')}.`}
      </p>
    </Dialog>
  );
}
