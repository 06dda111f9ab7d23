import { useEffect, useRef, useState } from 'react';
import { readTableFile, type ReadTable } from './read-table-file.ts';

export type TableFile =
  | { readonly at: 'none' }
  | { readonly at: 'reading'; readonly name: string; readonly done: number; readonly of: number }
  | { readonly at: 'refused'; readonly name: string; readonly error: unknown }
  | { readonly at: 'read'; readonly name: string; readonly table: ReadTable };

/** The file that is looked at. Opening another one, or leaving the page, ends the reading of the one before. */
export function useTableFile() {
  const [state, setState] = useState<TableFile>({ at: 'none' });
  const running = useRef<AbortController | null>(null);
  useEffect(() => () => running.current?.abort(), []);

  async function open(file: File): Promise<void> {
    running.current?.abort();
    const control = new AbortController();
    const { signal } = control;
    running.current = control;
    const { name } = file;
    setState({ at: 'reading', name, done: 0, of: 0 });
    try {
      const onRow = (done: number, of: number) => setState({ at: 'reading', name, done, of });
      const table = await readTableFile({ file, signal, onRow });
      if (!signal.aborted) setState({ at: 'read', name, table });
    } catch (error) {
      if (!signal.aborted) setState({ at: 'refused', name, error });
    }
  }

  function close(): void {
    running.current?.abort();
    setState({ at: 'none' });
  }

  return { state, open, close };
}
