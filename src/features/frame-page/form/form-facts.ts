import { createContext, useContext } from 'react';
import type { Unit } from '#shared/kernel/units/unit.ts';

/** What all entries go by and typing never changes, so that each entry follows nothing but its own value. */
export interface FormFacts {
  readonly unit: Unit;
  /** Changes when texts that are being typed must be dropped: see EditorState. */
  readonly epoch: number;
}

const formFacts = createContext<FormFacts | null>(null);

export const FormFactsProvider = formFacts.Provider;

export function useFormFacts(): FormFacts {
  const facts = useContext(formFacts);
  if (facts === null) throw new Error('an entry stands outside the form');
  return facts;
}
