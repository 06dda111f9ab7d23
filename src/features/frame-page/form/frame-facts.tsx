import { useMemo, type ReactNode } from 'react';
import { useEditor } from '../model/desk.ts';
import { FormFactsProvider } from './form-facts.ts';

/** Gives the entries within what they go by: see FormFacts. */
export function FrameFacts({ children }: { readonly children: ReactNode }) {
  const unit = useEditor((s) => s.history.present.unit);
  const epoch = useEditor((s) => s.epoch);
  const facts = useMemo(() => ({ unit, epoch }), [unit, epoch]);
  return <FormFactsProvider value={facts}>{children}</FormFactsProvider>;
}
