import { useState } from 'react';
import type { CutterChanged, StoredCutter } from '#shared/contracts/cutters.ts';
import type { Unit } from '#shared/kernel/units/unit.ts';
import { sayError } from '../../lib/say-error.ts';
import { Button } from '../../ui/button.tsx';
import { Notice } from '../../ui/notice.tsx';
import { plural } from '../../ui/plural.ts';
import { Sheet } from '../../ui/sheet.tsx';
import { TitleBlock, TitleCell } from '../../ui/title-block.tsx';
import { UndoNotice } from '../../ui/undo-notice.tsx';
import { useCreateCutter } from './api/create-cutter.ts';
import { useDeleteCutter } from './api/delete-cutter.ts';
import { CutterDialog } from './cutter-dialog.tsx';
import { CuttersTable } from './cutters-table.tsx';
import { ExportCutters } from './export-cutters.tsx';
import { ImportCutters } from './import-cutters.tsx';
import { NoCutters } from './no-cutters.tsx';
import { TouchedDrafts } from './touched-drafts.tsx';

interface CuttersPageProps {
  readonly cutters: readonly StoredCutter[];
  readonly shopName: string;
  readonly unit: Unit;
  readonly mayEdit: boolean;
  readonly mayEditFrames: boolean;
}

/** What was done to a cutter, as it was before. */
interface Done {
  readonly before: StoredCutter;
  readonly answer: CutterChanged;
}

/** The shop's cutter drawer: to read, to change, to import and export. */
export function CuttersPage({ cutters, shopName, unit, mayEdit, mayEditFrames }: CuttersPageProps) {
  /** Null: no dialog is open. */
  const [editing, setEditing] = useState<{ readonly stored: StoredCutter | null } | null>(null);
  /** What was done last: one by hand, or all that a file changed. */
  const [done, setDone] = useState<readonly Done[]>([]);
  const remove = useDeleteCutter();
  const putBack = useCreateCutter();
  const failed = remove.error ?? putBack.error;
  const removed = done.find(({ answer }) => answer.cutter === null);

  const take = (before: StoredCutter) =>
    remove.mutate(before.id, { onSuccess: (answer) => setDone([{ before, answer }]) });
  const undo = ({ before: { unit: its, cutter, remarks } }: Done) =>
    putBack.mutate({ unit: its, cutter, remarks }, { onSuccess: () => setDone([]) });
  const openNew = () => setEditing({ stored: null });

  return (
    <Sheet
      title="Cutters"
      titleBlock={
        <TitleBlock
          action={
            mayEdit ? (
              <Button kind="main" wide onClick={openNew}>
                Put in a cutter
              </Button>
            ) : undefined
          }
          actionNote={mayEdit ? 'frames take their numbers from here' : 'Programmers and the owner change the drawer'}
        >
          <TitleCell label="Shop">{shopName}</TitleCell>
          <TitleCell label="Page" main>
            Cutters
          </TitleCell>
          <TitleCell label="In the drawer">{plural(cutters.length, 'cutter')}</TitleCell>
        </TitleBlock>
      }
    >
      <div className="mb-3 flex flex-wrap items-center gap-3 print:hidden">
        {mayEdit && <ImportCutters onChanged={setDone} />}
        {cutters.length > 0 && <ExportCutters />}
      </div>
      {failed && (
        <Notice level="stop" word={remove.error ? 'Not deleted' : 'Not put back'} live>
          {sayError(failed)}
        </Notice>
      )}
      {removed && (
        <UndoNotice busy={putBack.isPending} onUndo={() => undo(removed)}>
          {`${removed.before.cutter.name} is out of the drawer.`}
        </UndoNotice>
      )}
      {done.map((one) => (
        <TouchedDrafts key={JSON.stringify(one)} {...one} mayEditFrames={mayEditFrames} />
      ))}
      {cutters.length > 0 ? (
        <CuttersTable
          cutters={cutters}
          mayEdit={mayEdit}
          onChange={(stored) => setEditing({ stored })}
          onDelete={take}
        />
      ) : (
        <NoCutters unit={unit} mayEdit={mayEdit} onNew={openNew} />
      )}
      {editing && (
        <CutterDialog
          stored={editing.stored}
          unit={unit}
          onChanged={(before, answer) => setDone([{ before, answer }])}
          onClose={() => setEditing(null)}
        />
      )}
    </Sheet>
  );
}
