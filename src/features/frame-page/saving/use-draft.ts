import { useQueryClient } from '@tanstack/react-query';
import { useEffect, useState } from 'react';
import type { Frame } from '#shared/contracts/frames.ts';
import { frameQuery } from '../api/get-frame.ts';
import { useSaveDraft } from '../api/save-draft.ts';
import { createAutosave, type Autosave } from '../model/autosave.ts';
import { createFrameEditor, type FrameEditor } from '../model/frame-editor.ts';
import { judgeSave } from '../model/judge-save.ts';
import { dropCopy, keepCopy } from '../model/unsaved-copy.ts';

/** Typing writes the browser's copy at most this often. */
const COPY_PAUSE_MS = 150;
/** Browsers refuse keepalive requests above this. */
const KEEPALIVE_BYTES = 60 * 1024;

export interface Draft {
  readonly editor: FrameEditor;
  readonly autosave: Autosave;
  readonly copyKept: boolean;
}

/** The draft of a frame under work: edited, saved by itself, and kept in the browser until it is saved. */
export function useDraft(frame: Frame): Draft {
  const client = useQueryClient();
  const { mutateAsync: saveDraft } = useSaveDraft();
  const [copyKept, setCopyKept] = useState(true);
  const [{ editor, autosave }] = useState(() => {
    const autosave = createAutosave({
      version: frame.version,
      saved: frame.particulars,
      judge: judgeSave,
      async save(draft) {
        const keepalive =
          document.visibilityState === 'hidden' && JSON.stringify(draft.particulars).length < KEEPALIVE_BYTES;
        const saved = await saveDraft({
          frameId: frame.id,
          ...draft,
          particulars: draft.particulars as Frame['particulars'],
          keepalive,
        });
        client.setQueryData(
          frameQuery(frame.id).queryKey,
          (now) => now && { ...now, ...saved, particulars: draft.particulars as Frame['particulars'] },
        );
        return saved;
      },
    });
    return { editor: createFrameEditor(frame.particulars), autosave };
  });

  useEffect(() => {
    let timer: ReturnType<typeof setTimeout> | undefined;
    const keep = () => {
      clearTimeout(timer);
      const mine = editor.store.get().history.present;
      if (mine === autosave.saved()) return;
      setCopyKept(
        keepCopy(localStorage, frame.id, {
          version: autosave.version(),
          base: autosave.saved(),
          mine,
          at: new Date().toISOString(),
        }),
      );
    };
    let last = editor.store.get().history.present;
    const offEditor = editor.store.subscribe(() => {
      const { present } = editor.store.get().history;
      if (present === last) return;
      last = present;
      autosave.change(present);
      clearTimeout(timer);
      timer = setTimeout(keep, COPY_PAUSE_MS);
    });
    const offAutosave = autosave.store.subscribe(() => {
      if (autosave.store.get().kind !== 'saved') return;
      clearTimeout(timer);
      dropCopy(localStorage, frame.id);
    });
    const hide = () => {
      keep();
      if (document.visibilityState === 'hidden') void autosave.flush();
    };
    const warn = (event: BeforeUnloadEvent) => {
      if (autosave.store.get().kind !== 'saved') event.preventDefault();
    };
    const online = () => void autosave.flush();
    autosave.start();
    document.addEventListener('visibilitychange', hide);
    window.addEventListener('pagehide', hide);
    window.addEventListener('beforeunload', warn);
    window.addEventListener('online', online);
    return () => {
      offEditor();
      keep();
      document.removeEventListener('visibilitychange', hide);
      window.removeEventListener('pagehide', hide);
      window.removeEventListener('beforeunload', warn);
      window.removeEventListener('online', online);
      autosave.stop();
      void autosave.flush().finally(() => {
        offAutosave();
        void client.invalidateQueries({ queryKey: ['jobs'] });
      });
    };
  }, [editor, autosave, client, frame.id]);

  return { editor, autosave, copyKept };
}
