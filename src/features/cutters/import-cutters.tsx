import { useRef, useState } from 'react';
import type { CuttersTaken } from '#shared/contracts/cutters.ts';
import { fieldMessagesOf } from '../../lib/field-messages.ts';
import { sayError } from '../../lib/say-error.ts';
import { Button } from '../../ui/button.tsx';
import { Dialog } from '../../ui/dialog.tsx';
import { Notice } from '../../ui/notice.tsx';
import { plural } from '../../ui/plural.ts';
import { Table } from '../../ui/table.tsx';
import { useImportCutters } from './api/import-cutters.ts';

type Problem = CuttersTaken['problems'][number];

const Problems = ({ problems }: { readonly problems: readonly Problem[] }) => (
  <Table
    caption="What is wrong in the file"
    rows={problems}
    rowKey={({ line, column }) => `${line} ${column}`}
    columns={[
      { key: 'line', head: 'Line', align: 'right', cell: ({ line }) => line, names: true },
      { key: 'column', head: 'Column', cell: ({ column }) => column },
      { key: 'got', head: 'Got', cell: ({ got }) => <span className="wrap-anywhere">{got}</span> },
      { key: 'takes', head: 'Takes', cell: ({ takes }) => takes },
    ]}
  />
);

/** Takes cutters from a CSV file. With bad rows in it nothing is taken until the person says to take the good ones. */
export function ImportCutters() {
  const input = useRef<HTMLInputElement>(null);
  const [file, setFile] = useState<File | null>(null);
  const [refused, setRefused] = useState<CuttersTaken | null>(null);
  const [said, setSaid] = useState('');
  const take = useImportCutters();

  function send(chosen: File, keepGood: boolean) {
    setFile(chosen);
    setSaid('');
    take.mutate(
      { file: chosen, keepGood },
      {
        onSuccess: (answer) => {
          const isRefused = answer.problems.length > 0 && !keepGood;
          setRefused(isRefused ? answer : null);
          if (!isRefused) setSaid(`${plural(answer.taken.length, 'cutter')} taken from ${chosen.name}.`);
        },
        onError: () => setRefused(null),
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
          if (chosen) send(chosen, false);
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
      {refused && file && (
        <Dialog
          wide
          title={`${file.name} has ${plural(refused.problems.length, 'problem')}`}
          onClose={() => setRefused(null)}
          actions={
            <>
              {refused.good > 0 && (
                <Button kind="main" busy={take.isPending ? 'Taking' : ''} onClick={() => send(file, true)}>
                  Take {plural(refused.good, 'good row')}
                </Button>
              )}
              <Button onClick={() => setRefused(null)}>Take nothing</Button>
            </>
          }
        >
          <p className="mb-2">
            Nothing has been taken. Mend the file and import it again
            {refused.good > 0 ? ', or take the good rows and leave these out.' : '.'}
          </p>
          <Problems problems={refused.problems} />
        </Dialog>
      )}
    </>
  );
}
