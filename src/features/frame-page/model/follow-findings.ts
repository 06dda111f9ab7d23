import { checkFrame } from '#shared/kernel/check-frame.ts';
import type { Finding } from '#shared/kernel/checks/finding.ts';
import type { EditorState } from './frame-editor.ts';
import { createStore, type Store } from './store.ts';

/** What the checks say of the editor's frame. Follows its settled state, so that no keystroke waits for them. */
export function followFindings(settled: Store<EditorState>): Store<readonly Finding[]> {
  let { lines } = settled.get();
  const findings = createStore(checkFrame(lines).findings);
  settled.subscribe(() => {
    const now = settled.get().lines;
    if (now === lines) return;
    lines = now;
    findings.set(checkFrame(now).findings);
  });
  return findings;
}
