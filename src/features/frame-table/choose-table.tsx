import { useId, useRef, useState, type DragEvent, type Ref } from 'react';
import { FRAME_TABLE_LIMITS } from '#shared/contracts/frame-table.ts';
import { frameTableTemplate, sampleFrameTable } from '#shared/kernel/frame-table/sample-frame-table.ts';
import type { Unit } from '#shared/kernel/units/unit.ts';
import { saveFile } from '../../lib/save-file.ts';
import { Button } from '../../ui/button.tsx';
import { classNames } from '../../ui/class-names.ts';
import { Notice } from '../../ui/notice.tsx';

const TYPE = 'text/csv;charset=utf-8';
const sampleFile = (unit: Unit): File => new File([sampleFrameTable(unit)], 'sample-kitchen.csv', { type: TYPE });
// A spreadsheet takes UTF-8 for another code page when no byte order mark says so.
const saveTemplate = (unit: Unit): void => saveFile('frames-template.csv', `\uFEFF${frameTableTemplate(unit)}`, TYPE);

interface ChooseTableProps {
  /** Of the template and the sample. */
  readonly unit: Unit;
  readonly onFile: (file: File) => void;
  /** The button that chooses a file, so that focus can come back to it. */
  readonly chooseButton: Ref<HTMLButtonElement>;
}

/** Where a table comes from: a file dropped or chosen, or the sample; and the template to make one from. */
export function ChooseTable({ unit, onFile, chooseButton }: ChooseTableProps) {
  const id = useId();
  const input = useRef<HTMLInputElement>(null);
  const [over, setOver] = useState(false);
  const [tooMany, setTooMany] = useState(0);

  function take(files: readonly File[]) {
    const [file] = files;
    setTooMany(files.length > 1 ? files.length : 0);
    if (file && files.length === 1) onFile(file);
  }

  function drop(event: DragEvent) {
    event.preventDefault();
    setOver(false);
    take([...event.dataTransfer.files]);
  }

  return (
    <div
      onDragOver={(event) => {
        event.preventDefault();
        setOver(true);
      }}
      onDragLeave={() => setOver(false)}
      onDrop={drop}
      className={classNames(
        'mb-4 border border-dashed px-4 py-3 print:hidden',
        over ? 'border-front bg-board-light' : 'border-pencil',
      )}
    >
      <p id={id} className="mb-2">
        Drop a CSV file here, or choose one: a row a frame, up to {FRAME_TABLE_LIMITS.frames} frames.
      </p>
      <div className="flex flex-wrap gap-3">
        <Button ref={chooseButton} aria-describedby={id} onClick={() => input.current?.click()}>
          Choose a file
        </Button>
        <Button onClick={() => saveTemplate(unit)}>Download the template</Button>
        <Button onClick={() => onFile(sampleFile(unit))}>Look at a sample kitchen</Button>
      </div>
      <input
        ref={input}
        type="file"
        accept=".csv,.txt,text/csv"
        aria-label="CSV file of frames"
        tabIndex={-1}
        className="sr-only"
        onChange={(event) => {
          const files = [...(event.target.files ?? [])];
          // The same file again must be a change again.
          event.target.value = '';
          take(files);
        }}
      />
      {tooMany > 0 && (
        <Notice level="stop" word="Not read" live>
          Got {tooMany} files; takes one table at a time.
        </Notice>
      )}
    </div>
  );
}
