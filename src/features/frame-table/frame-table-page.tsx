import { useMemo, useRef } from 'react';
import type { z } from 'zod';
import type { particulars } from '#shared/contracts/particulars.ts';
import type { Unit } from '#shared/kernel/units/unit.ts';
import { sayError } from '../../lib/say-error.ts';
import { Button } from '../../ui/button.tsx';
import { Notice } from '../../ui/notice.tsx';
import { plural } from '../../ui/plural.ts';
import { ProgressText } from '../../ui/progress-text.tsx';
import { Section } from '../../ui/section.tsx';
import { Sheet } from '../../ui/sheet.tsx';
import { TitleBlock, TitleCell } from '../../ui/title-block.tsx';
import { ChooseTable } from './choose-table.tsx';
import { ColumnsHelp } from './columns-help.tsx';
import { ExportTable } from './export-table.tsx';
import { isGood, type JudgedRow } from './judge-row.ts';
import { nameCautions } from './name-cautions.ts';
import { ProblemsTable } from './problems-table.tsx';
import { RowsTable } from './rows-table.tsx';
import { sayRefusal } from './say-refusal.ts';
import { useTableFile } from './use-table-file.ts';

export interface FrameTablePageProps {
  readonly shopName: string;
  readonly unit: Unit;
  readonly job: { readonly id: string; readonly name: string };
  /** Names of the frames that are in the job. */
  readonly names: readonly string[];
  readonly mayEdit: boolean;
  readonly busy: boolean;
  /** Of the last try to add; null when there was none. */
  readonly error: Error | null;
  readonly onAdd: (frames: z.output<typeof particulars>[]) => void;
  /** Another table is looked at: what was said of the last one is past. */
  readonly onReset: () => void;
}

const NONE: readonly JudgedRow[] = [];

function addWords(good: number, isWhole: boolean): string {
  if (isWhole) return good === 1 ? 'Add the frame' : `Add all ${good} frames`;
  return good === 1 ? 'Add the good one' : `Add the ${good} good ones`;
}

function countWords(good: number, bad: number): string {
  if (bad === 0) return `${plural(good, 'row')}, all good`;
  return `${plural(good + bad, 'row')}: ${good} good, ${bad} not`;
}

/** A whole kitchen from a table: look at every row, then add all frames or the good ones; and the job as such a table. */
export function FrameTablePage({
  shopName,
  unit,
  job,
  names,
  mayEdit,
  busy,
  error,
  onAdd,
  onReset,
}: FrameTablePageProps) {
  const { state, open, close } = useTableFile();
  const choose = useRef<HTMLButtonElement>(null);
  const table = state.at === 'read' ? state.table : undefined;
  const rows = useMemo(() => (table ? nameCautions(table.rows, names) : NONE), [table, names]);
  const good = rows.filter(isGood);
  const problems = [...(table?.problems ?? []), ...rows.flatMap((row) => row.problems)].sort((a, b) => a.line - b.line);
  const cautions = good.filter((row) => row.cautions.length > 0).length;

  function look(file: File) {
    onReset();
    void open(file);
  }

  function takeNothing() {
    onReset();
    close();
    choose.current?.focus();
  }

  const add = () => onAdd(good.flatMap((row) => (row.particulars ? [row.particulars] : [])));
  const canAdd = mayEdit && good.length > 0;
  return (
    <Sheet
      title="Frames from a table"
      crumbs={[{ label: 'Jobs', to: '/jobs' }, { label: job.name, to: `/jobs/${job.id}` }, { label: 'From a table' }]}
      titleBlock={
        <TitleBlock
          action={
            canAdd ? (
              <Button kind="main" wide busy={busy ? 'Adding' : ''} onClick={add}>
                {addWords(good.length, problems.length === 0)}
              </Button>
            ) : undefined
          }
          actionNote={
            mayEdit ? (canAdd ? 'all of them or none' : 'look at a table first') : 'Designers and the owner add frames'
          }
        >
          <TitleCell label="Shop">{shopName}</TitleCell>
          <TitleCell label="Job" main>
            {job.name}
          </TitleCell>
          <TitleCell label="Table" detail={table && countWords(good.length, rows.length - good.length)}>
            {state.at === 'none' ? 'none yet' : state.name}
          </TitleCell>
          <TitleCell label="Findings" detail={table && plural(cautions, 'frame with cautions', 'frames with cautions')}>
            {table ? plural(problems.length, 'problem') : 'none yet'}
          </TitleCell>
        </TitleBlock>
      }
    >
      <div className="grid gap-x-8 gap-y-6 xl:grid-cols-[minmax(0,1fr)_20rem] print:block">
        <div className="min-w-0">
          <ChooseTable unit={unit} onFile={look} chooseButton={choose} />
          {state.at === 'none' && (
            <p className="mb-4 max-w-2xl">
              Begin with the template: fill in a row for each frame of the kitchen in any spreadsheet, save it as CSV
              and drop it here. You then see every frame drawn, and what is wrong by line and column. Nothing is added
              until you say so.
            </p>
          )}
          {state.at === 'reading' && (
            <ProgressText
              {...(state.of > 0 ? { done: state.done / state.of } : {})}
              cancel={
                <Button kind="quiet" onClick={takeNothing}>
                  Cancel
                </Button>
              }
            >
              {state.of > 0 ? `Working out ${state.done} of ${state.of} frames.` : `Reading ${state.name}.`}
            </ProgressText>
          )}
          {state.at === 'refused' && (
            <Notice level="stop" word={`${state.name} is not read`} live>
              {sayError(state.error)}
            </Notice>
          )}
          {error !== null && (
            <Notice level="stop" word="Nothing added" live>
              {sayRefusal(
                error,
                good.map(({ line }) => line),
              )}
            </Notice>
          )}
          {state.at === 'read' && (
            <>
              <Notice
                level="note"
                word={state.name}
                live
                action={
                  <Button kind="quiet" onClick={takeNothing}>
                    Take nothing
                  </Button>
                }
              >
                {countWords(good.length, rows.length - good.length)}. Nothing is added yet.
                {problems.length > 0 &&
                  ` Mend the table and choose it again${good.length > 0 ? ', or add the good frames and leave the others out' : ''}.`}
              </Notice>
              {state.table.lettersUnsure && (
                <Notice level="caution">
                  The file is not in UTF-8 and was read as Windows-1252. Look at the letters of the names, or save it as
                  “CSV UTF-8”.
                </Notice>
              )}
              {problems.length > 0 && <ProblemsTable problems={problems} />}
              {rows.length > 0 && <RowsTable rows={rows} />}
              {rows.length === 0 && problems.length === 0 && (
                <Notice level="stop" word="No frames">
                  The table has headings alone; it takes a row for each frame.
                </Notice>
              )}
            </>
          )}
        </div>
        <aside className="print:hidden">
          <Section heading="The job as a table">
            <p className="mb-2 text-12">
              {names.length > 0
                ? 'Drafts as they are now. What a table cannot say of a frame is named in its remark, and those cells stay empty.'
                : 'The job has no frames yet.'}
            </p>
            {names.length > 0 && <ExportTable jobId={job.id} />}
          </Section>
          <ColumnsHelp unit={unit} />
        </aside>
      </div>
    </Sheet>
  );
}
