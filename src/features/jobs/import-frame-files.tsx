import { useId, useRef, useState, type DragEvent } from 'react';
import { LIMITS } from '#shared/contracts/limits.ts';
import { sayError } from '../../lib/say-error.ts';
import { Button } from '../../ui/button.tsx';
import { classNames } from '../../ui/class-names.ts';
import { Notice } from '../../ui/notice.tsx';
import { plural } from '../../ui/plural.ts';
import { ProgressText } from '../../ui/progress-text.tsx';
import { useImportFrameFiles } from './api/import-frame-files.ts';
import { ImportResults } from './import-results.tsx';

const tooMany = (count: number) => `Got ${count} files; takes up to ${LIMITS.frameFilesAtOnce} at once.`;

/** Takes frame files, dropped or chosen, and lists what became of each. */
export function ImportFrameFiles({ jobId }: { readonly jobId: string }) {
  const id = useId();
  const input = useRef<HTMLInputElement>(null);
  const running = useRef<AbortController | null>(null);
  const [over, setOver] = useState(false);
  const [refusal, setRefusal] = useState('');
  const take = useImportFrameFiles();

  function send(files: readonly File[]) {
    if (files.length === 0) return;
    setRefusal(files.length > LIMITS.frameFilesAtOnce ? tooMany(files.length) : '');
    if (files.length > LIMITS.frameFilesAtOnce) return;
    running.current = new AbortController();
    take.mutate({ jobId, files, signal: running.current.signal });
  }

  function drop(event: DragEvent) {
    event.preventDefault();
    setOver(false);
    send([...event.dataTransfer.files]);
  }

  const cancelled = take.variables?.signal.aborted === true;
  return (
    <div>
      <div
        onDragOver={(event) => {
          event.preventDefault();
          setOver(true);
        }}
        onDragLeave={() => setOver(false)}
        onDrop={drop}
        className={classNames('border border-dashed p-3', over ? 'border-front bg-board-light' : 'border-pencil')}
      >
        <p id={id} className="mb-2 text-12">
          Drop frame files here (<span className="whitespace-nowrap">*.frame.json</span>), up to{' '}
          {LIMITS.frameFilesAtOnce} at once.
        </p>
        <Button aria-describedby={id} onClick={() => input.current?.click()}>
          Choose files
        </Button>
        <input
          ref={input}
          type="file"
          multiple
          accept=".json,application/json"
          aria-label="Frame files"
          tabIndex={-1}
          className="sr-only"
          onChange={(event) => {
            send([...(event.target.files ?? [])]);
            event.target.value = '';
          }}
        />
      </div>
      <div className="mt-3">
        {take.isPending && (
          <ProgressText
            cancel={
              <Button kind="quiet" onClick={() => running.current?.abort()}>
                Cancel
              </Button>
            }
          >
            {`Reading ${plural(take.variables.files.length, 'file')}.`}
          </ProgressText>
        )}
        {(refusal !== '' || take.isError) && (
          <Notice level={cancelled ? 'note' : 'stop'} word={cancelled ? 'Cancelled' : 'Not taken'} live>
            {refusal ||
              (cancelled ? 'Files that the server had read already may be in the list.' : sayError(take.error))}
          </Notice>
        )}
        {take.data && <ImportResults result={take.data} onClear={() => take.reset()} />}
      </div>
    </div>
  );
}
