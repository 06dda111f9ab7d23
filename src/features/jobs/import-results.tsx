import { Link } from 'react-router';
import type { FrameFilesTaken } from '#shared/contracts/frames.ts';
import { Button } from '../../ui/button.tsx';
import { plural } from '../../ui/plural.ts';

/** Of so many wrong entries in one file, more help nobody. */
const MOST_SHOWN = 8;

function Refused({ file }: { readonly file: FrameFilesTaken['refused'][number] }) {
  const more = file.fields.length - MOST_SHOWN;
  return (
    <li className="mb-2 wrap-anywhere">
      <span className="font-bold text-stop">Not taken: </span>
      {file.file}: {file.message}
      {file.fields.length > 0 && (
        <ul className="list-disc pl-4 text-12">
          {file.fields.slice(0, MOST_SHOWN).map((field) => (
            <li key={field.path + field.takes}>{field.message}</li>
          ))}
          {more > 0 && <li>and {plural(more, 'more entry', 'more entries')}</li>}
        </ul>
      )}
    </li>
  );
}

interface ImportResultsProps {
  readonly result: FrameFilesTaken;
  readonly onClear: () => void;
}

/** What became of each file. */
export function ImportResults({ result: { taken, refused }, onClear }: ImportResultsProps) {
  return (
    <div>
      <p role="status" className="mb-1 font-bold">
        {plural(taken.length, 'file')} taken, {refused.length} not
      </p>
      <ul>
        {refused.map((file, i) => (
          <Refused key={i} file={file} />
        ))}
        {taken.map((file) => (
          <li key={file.frameId} className="wrap-anywhere">
            Taken:{' '}
            <Link to={`/frames/${file.frameId}`} className="underline underline-offset-4">
              {file.name}
            </Link>{' '}
            <span className="text-pencil">from {file.file}</span>
          </li>
        ))}
      </ul>
      <Button kind="quiet" onClick={onClear}>
        Clear this list
      </Button>
    </div>
  );
}
