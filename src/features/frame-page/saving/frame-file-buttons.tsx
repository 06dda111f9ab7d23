import { useRef, useState } from 'react';
import type { FieldError } from '#shared/contracts/error-codes.ts';
import { LIMITS } from '#shared/contracts/limits.ts';
import { parseFrameFile } from '#shared/contracts/parse-frame-file.ts';
import { safeFileName, saveFile } from '../../../lib/save-file.ts';
import { Button } from '../../../ui/button.tsx';
import { Dialog } from '../../../ui/dialog.tsx';
import { useDesk } from '../model/desk.ts';

interface Refused {
  readonly file: string;
  readonly message: string;
  readonly fields: readonly FieldError[];
}

function RefusedDialog({ refused, onClose }: { readonly refused: Refused; readonly onClose: () => void }) {
  return (
    <Dialog title={`${refused.file} was not taken`} onClose={onClose}>
      <p className="mb-2">It is {refused.message}. The frame is as it was.</p>
      <ul className="list-disc pl-4 text-12">
        {refused.fields.map((field, i) => (
          <li key={i} className="wrap-anywhere">
            <strong>{field.path === '' ? 'the whole' : field.path}</strong>: got {field.got}, takes {field.takes}
          </li>
        ))}
      </ul>
    </Dialog>
  );
}

/** Puts a frame file in place of this frame's particulars (undo brings them back), and saves them as a file. */
export function FrameFileButtons() {
  const { editor, readOnly } = useDesk();
  const input = useRef<HTMLInputElement>(null);
  const [refused, setRefused] = useState<Refused | null>(null);

  async function take(file: File) {
    const refuse = (message: string, fields: readonly FieldError[] = []) =>
      setRefused({ file: file.name, message, fields });
    if (file.size > LIMITS.frameFileBytes)
      return refuse(`too large: it has ${file.size} bytes, a frame file has at most ${LIMITS.frameFileBytes}`);
    const read = parseFrameFile(await file.text());
    if (!read.ok) return refuse(read.message, read.fields);
    editor.apply(read.particulars, `Import ${file.name}`);
  }

  function save() {
    const { present } = editor.store.get().history;
    saveFile(safeFileName(present.name, '.frame.json'), `${JSON.stringify(present, null, 2)}\n`, 'application/json');
  }

  return (
    <>
      {!readOnly && (
        <>
          <input
            ref={input}
            type="file"
            accept=".json,application/json"
            aria-label="Frame file to import"
            tabIndex={-1}
            className="sr-only"
            onChange={(event) => {
              const [file] = event.target.files ?? [];
              event.target.value = '';
              if (file) void take(file);
            }}
          />
          <Button kind="quiet" onClick={() => input.current?.click()}>
            Import
          </Button>
        </>
      )}
      <Button kind="quiet" onClick={save}>
        Export
      </Button>
      {refused && <RefusedDialog refused={refused} onClose={() => setRefused(null)} />}
    </>
  );
}
