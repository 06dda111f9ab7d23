import { useRef, useState } from 'react';
import type { CuttersRead } from '#shared/contracts/cutters.ts';
import { fieldMessagesOf } from '../../lib/field-messages.ts';
import { sayError } from '../../lib/say-error.ts';
import { Button } from '../../ui/button.tsx';
import { Dialog } from '../../ui/dialog.tsx';
import { Notice } from '../../ui/notice.tsx';
import { plural } from '../../ui/plural.ts';
import { useImportCutters } from './api/import-cutters.ts';
import { ImportPreview } from './import-preview.tsx';

interface ImportCuttersProps {
  /** The cutters that the file has changed, each with the drafts that carry it as it was. */
  readonly onChanged: (changed: CuttersRead['changed']) => void;
}

const countOf = ({ rows }: CuttersRead, what: string) => rows.filter(({ is }) => is === what).length;

/** "2 new, 1 changed", and what is left alone, in the order in which it matters. */
function countWords(read: CuttersRead): string {
  const same = countOf(read, 'same');
  return [
    `${countOf(read, 'new')} new, ${countOf(read, 'changed')} changed`,
    ...(same > 0 ? [`${same} in the drawer as ${same === 1 ? 'it is' : 'they are'}`] : []),
    ...(read.problems.length > 0 ? [plural(read.problems.length, 'problem')] : []),
  ].join(', ');
}

/** Takes cutters from a CSV file, once the person has seen which rows are new and which change what is there. */
export function ImportCutters({ onChanged }: ImportCuttersProps) {
  const input = useRef<HTMLInputElement>(null);
  const [file, setFile] = useState<File | null>(null);
  const [read, setRead] = useState<CuttersRead | null>(null);
  const [said, setSaid] = useState('');
  const take = useImportCutters();
  const todo = read ? countOf(read, 'new') + countOf(read, 'changed') : 0;

  function look(chosen: File) {
    setFile(chosen);
    setSaid('');
    take.mutate({ file: chosen, take: false }, { onSuccess: setRead, onError: () => setRead(null) });
  }

  function confirm(chosen: File) {
    take.mutate(
      { file: chosen, take: true },
      {
        onSuccess: ({ added, changed }) => {
          setRead(null);
          setSaid(`${plural(added.length, 'cutter')} put in and ${changed.length} changed from ${chosen.name}.`);
          onChanged(changed);
        },
        onError: () => setRead(null),
      },
    );
  }

  const wrongFile = fieldMessagesOf(take.error);
  return (
    <>
      <Button busy={take.isPending ? 'Reading' : ''} onClick={() => input.current?.click()}>
        Import CSV
      </Button>
      <input
        ref={input}
        type="file"
        accept=".csv,text/csv"
        aria-label="CSV file of cutters"
        hidden
        onChange={(event) => {
          const [chosen] = event.target.files ?? [];
          // The same file again must be a change again.
          event.target.value = '';
          if (chosen) look(chosen);
        }}
      />
      {said !== '' && (
        <p role="status" className="text-12">
          {said}
        </p>
      )}
      {take.isError && (
        <Notice level="stop" word="Nothing taken" live>
          {Object.values(wrongFile)[0] ?? sayError(take.error)}
        </Notice>
      )}
      {read && file && (
        <Dialog
          wide
          title={`Cutters of ${file.name}`}
          onClose={() => setRead(null)}
          actions={
            <>
              {todo > 0 && (
                <Button kind="main" busy={take.isPending ? 'Taking' : ''} onClick={() => confirm(file)}>
                  {read.problems.length > 0 ? `Take ${plural(todo, 'good row')}` : `Take ${plural(todo, 'row')}`}
                </Button>
              )}
              <Button onClick={() => setRead(null)}>Take nothing</Button>
            </>
          }
        >
          <p className="mb-2">
            {countWords(read)}. {todo > 0 ? 'Nothing has been taken yet.' : 'There is nothing to take.'}
            {read.problems.length > 0 && ' Mend the file and import it again, or leave the rows with problems out.'}
          </p>
          <ImportPreview {...read} />
        </Dialog>
      )}
    </>
  );
}
