import { useEffect, useRef, useState } from 'react';
import { downloadFile } from '../lib/download-file.ts';
import { sayError } from '../lib/say-error.ts';
import { Button } from './button.tsx';
import type { ButtonKind } from './button-look.ts';
import { Notice } from './notice.tsx';
import { ProgressText } from './progress-text.tsx';

interface DownloadButtonProps {
  /** Begins with /api/. */
  readonly path: string;
  readonly kind?: ButtonKind;
  readonly wide?: boolean;
  /** What the button says. */
  readonly children: string;
  readonly disabled?: boolean;
}

type State =
  | { readonly at: 'idle' }
  | { readonly at: 'working'; readonly bytes: number }
  | { readonly at: 'saved'; readonly name: string }
  | { readonly at: 'failed'; readonly error: unknown };

/** Downloads a file: says how far it is, can be cancelled, and says why when there is none. */
export function DownloadButton({ path, kind, wide, children, disabled }: DownloadButtonProps) {
  const [state, setState] = useState<State>({ at: 'idle' });
  const running = useRef<AbortController | null>(null);
  useEffect(() => () => running.current?.abort(), []);

  async function start() {
    const control = new AbortController();
    running.current = control;
    setState({ at: 'working', bytes: 0 });
    try {
      const { name } = await downloadFile({
        path,
        signal: control.signal,
        onBytes: (bytes) => setState({ at: 'working', bytes }),
      });
      setState({ at: 'saved', name });
    } catch (error) {
      setState(control.signal.aborted ? { at: 'idle' } : { at: 'failed', error });
    }
  }

  return (
    <div className="flex flex-col items-stretch gap-2">
      <Button
        kind={kind}
        wide={wide}
        disabled={disabled}
        busy={state.at === 'working' ? 'Writing the files' : ''}
        onClick={() => void start()}
      >
        {children}
      </Button>
      {state.at === 'working' && (
        <ProgressText
          cancel={
            <Button kind="quiet" onClick={() => running.current?.abort()}>
              Cancel
            </Button>
          }
        >
          {state.bytes === 0
            ? 'The server writes and proves the files.'
            : `${Math.ceil(state.bytes / 1024)} KB so far.`}
        </ProgressText>
      )}
      {state.at === 'saved' && (
        <p role="status" className="text-12 wrap-anywhere">
          Saved as {state.name}
        </p>
      )}
      {state.at === 'failed' && (
        <Notice level="stop" word="No download" live>
          {sayError(state.error)}
        </Notice>
      )}
    </div>
  );
}
