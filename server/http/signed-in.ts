import type { NextFunction, Request, RequestHandler, Response } from 'express';
import { may, type Act, type Role } from '#shared/contracts/roles.ts';
import { AppError } from '../errors.ts';

/** The person behind a request, read from the database once a request. */
export interface SignedIn {
  readonly id: string;
  readonly shopId: string;
  readonly name: string;
  readonly email: string;
  readonly role: Role;
}

declare global {
  // eslint-disable-next-line @typescript-eslint/no-namespace -- the only way to type passport's req.user
  namespace Express {
    // eslint-disable-next-line @typescript-eslint/no-empty-object-type
    interface User extends SignedIn {}
  }
}

/** Who is asking. Throws 'not-signed-in'. */
export function whoAsks(req: Request): SignedIn {
  if (!req.user) throw new AppError('not-signed-in', `${req.method} ${req.path} without a session`);
  return req.user;
}

/** Lets any signed-in person of a shop pass. */
export const signedIn: RequestHandler = (req: Request, _res: Response, next: NextFunction) => {
  whoAsks(req);
  next();
};

/** Lets those pass whose role may do `act`. */
export const allow =
  (act: Act): RequestHandler =>
  (req, _res, next) => {
    const who = whoAsks(req);
    if (!may(who.role, act)) throw new AppError('not-allowed', `${who.role} ${who.id} may not ${act}`);
    next();
  };
