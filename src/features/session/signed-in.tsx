import { createContext, useContext } from 'react';
import { may, type Act } from '#shared/contracts/roles.ts';
import type { Session } from '#shared/contracts/session.ts';

export interface SignedIn {
  readonly user: NonNullable<Session['user']>;
  readonly shop: NonNullable<Session['shop']>;
}

const signedInContext = createContext<SignedIn | null>(null);

export const SignedInProvider = signedInContext.Provider;

/** The person and the shop. Throws on pages that are open to everybody. */
export function useSignedIn(): SignedIn & { readonly mayDo: (act: Act) => boolean } {
  const signedIn = useContext(signedInContext);
  if (signedIn === null) throw new Error('useSignedIn: this page is not inside the signed-in layout');
  return { ...signedIn, mayDo: (act) => may(signedIn.user.role, act) };
}
