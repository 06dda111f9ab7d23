import { useEffect, useId, useRef, useState, type DragEvent } from 'react';
import { LIMITS } from '#shared/contracts/limits.ts';
import { sayError } from '../../lib/say-error.ts';
import { Button } from '../../ui/button.tsx';
import { classNames } from '../../ui/class-names.ts';
import { Notice } from '../../ui/notice.tsx';
import { ProgressText } from '../../ui/progress-text.tsx';
import { useUploadDrawing } from './api/upload-drawing.ts';
import { sampleDrawing } from './sample-drawing.ts';

interface UploadPanelProps {
  readonly jobId: string;
  readonly onUploaded: (tracingId: string) => void;
}

const MB = 1024 * 1024;
const SAMPLE_NAME = 'two-frames-to-try.dxf';

function refusalOf(files: readonly File[]): string {
  const [file] = files;
  if (files.length !== 1 || file === undefined) return `Got ${files.length} files; takes one drawing at a time.`;
  if (file.size > LIMITS.drawingBytes)
    return `${file.name} is ${Math.ceil(file.size / MB)} MB; takes up to ${LIMITS.drawingBytes / MB} MB. Export only what belongs to the frames.`;
  return file.size === 0 ? `${file.name} is empty. Export the drawing again.` : '';
}

/** Takes one drawing, dropped or chosen, or a sample; says how much of it has gone. */
export function UploadPanel({ jobId, onUploaded }: UploadPanelProps) {
  const id = useId();
  const input = useRef<HTMLInputElement>(null);
  const running = useRef<AbortController | null>(null);
  const [over, setOver] = useState(false);
  const [refusal, setRefusal] = useState('');
  const [sent, setSent] = useState(0);
  const upload = useUploadDrawing();
  useEffect(() => () => running.current?.abort(), []);

  function send(files: readonly File[]) {
    if (files.length === 0 || upload.isPending) return;
    const why = refusalOf(files);
    setRefusal(why);
    upload.reset();
    if (why !== '') return;
    setSent(0);
    running.current = new AbortController();
    upload.mutate(
      { jobId, file: files[0]!, signal: running.current.signal, onSent: setSent },
      { onSuccess: (added) => onUploaded(added.id) },
    );
  }

  function drop(event: DragEvent) {
    event.preventDefault();
    setOver(false);
    send([...event.dataTransfer.files]);
  }

  const cancelled = upload.isError && upload.variables.signal.aborted;
  return (
    <div className="max-w-2xl">
      <div
        onDragOver={(event) => {
          event.preventDefault();
          setOver(true);
        }}
        onDragLeave={() => setOver(false)}
        onDrop={drop}
        className={classNames(
          'mb-3 border border-dashed px-6 py-8',
          over ? 'border-front bg-board-light' : 'border-pencil',
        )}
      >
        <p className="mb-1 text-16 font-bold">Drop a drawing here</p>
        <p id={id} className="mb-4">
          ASCII DXF, R12 to R2018, up to {LIMITS.drawingBytes / MB} MB and 400,000 entities. Lines, arcs, circles,
          ellipses, polylines, splines and blocks are read; text, dimensions and hatches are set aside and listed.
        </p>
        <div className="flex flex-wrap gap-3">
          <Button kind="main" aria-describedby={id} disabled={upload.isPending} onClick={() => input.current?.click()}>
            Choose a drawing
          </Button>
          <Button
            disabled={upload.isPending}
            onClick={() => send([new File([sampleDrawing()], SAMPLE_NAME, { type: 'application/dxf' })])}
          >
            Try a sample
          </Button>
        </div>
        <input
          ref={input}
          type="file"
          accept=".dxf,.DXF,application/dxf,image/vnd.dxf"
          aria-label="Drawing"
          tabIndex={-1}
          className="sr-only"
          onChange={(event) => {
            send([...(event.target.files ?? [])]);
            event.target.value = '';
          }}
        />
      </div>
      {upload.isPending && (
        <ProgressText
          done={sent}
          cancel={
            <Button kind="quiet" onClick={() => running.current?.abort()}>
              Cancel
            </Button>
          }
        >
          {sent < 1
            ? `Sending ${upload.variables.file.name}, ${Math.floor(100 * sent)} %.`
            : `${upload.variables.file.name} is sent; the server keeps it.`}
        </ProgressText>
      )}
      {(refusal !== '' || upload.isError) && (
        <Notice level={cancelled ? 'note' : 'stop'} word={cancelled ? 'Cancelled' : 'Not taken'} live>
          {refusal || (cancelled ? 'Nothing was added to the job.' : sayError(upload.error))}
        </Notice>
      )}
    </div>
  );
}
