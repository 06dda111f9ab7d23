import type { Request } from 'express';
import type { SignedIn } from './signed-in.ts';

/** A new session for this person; the old id is of no use afterwards. */
export const beginSession = (req: Request, who: SignedIn): Promise<void> =>
  new Promise((resolve, reject) => req.login(who, (error: unknown) => (error ? reject(error as Error) : resolve())));
