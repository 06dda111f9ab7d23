import { Router, type Request, type RequestHandler } from 'express';
import { invitationRequest, joinRequest, personChange } from '#shared/contracts/people.ts';
import type { Session } from '#shared/contracts/session.ts';
import { beginSession } from '../../http/begin-session.ts';
import { originOf } from '../../http/origin-of.ts';
import { pathParameter, readBody } from '../../http/read-input.ts';
import { allow, whoAsks, type SignedIn } from '../../http/signed-in.ts';
import type { InvitationsService } from './invitations.service.ts';
import type { PeopleService } from './people.service.ts';

interface Given {
  readonly people: PeopleService;
  readonly invitations: InvitationsService;
  readonly session: { describe(who: SignedIn): Promise<Session>; noteSignIn(who: SignedIn): Promise<void> };
  readonly publicUrl: string | undefined;
  /** Each is a mail to an address that its owner did not ask for. */
  readonly limitInvitations: RequestHandler;
  /** Each costs a hash. */
  readonly limitJoins: RequestHandler;
}

/** People of a shop, for its owner; and joining by a mailed link, for whoever has it. */
export function peopleRoutes({ people, invitations, session, publicUrl, limitInvitations, limitJoins }: Given): Router {
  const router = Router();
  const owner = allow('manage-people');
  const invitationId = (req: Request) => pathParameter(req, 'invitationId');

  router.get('/people', owner, async (req, res) => {
    const { shopId } = whoAsks(req);
    res.json({ people: await people.list(shopId), invitations: await invitations.list(shopId) });
  });

  router.patch('/people/:personId', owner, async (req, res) => {
    await people.change(whoAsks(req), pathParameter(req, 'personId'), readBody(req, personChange));
    res.status(204).end();
  });

  router.post('/invitations', owner, limitInvitations, async (req, res) => {
    const request = readBody(req, invitationRequest);
    res.status(201).json(await invitations.invite(whoAsks(req), request, originOf(req, publicUrl)));
  });

  router.post('/invitations/:invitationId/resend', owner, limitInvitations, async (req, res) => {
    res.json(await invitations.resend(whoAsks(req), invitationId(req), originOf(req, publicUrl)));
  });

  router.delete('/invitations/:invitationId', owner, async (req, res) => {
    await invitations.revoke(whoAsks(req).shopId, invitationId(req));
    res.status(204).end();
  });

  router.get('/join/:token', async (req, res) => {
    res.json(await invitations.offer(pathParameter(req, 'token')));
  });

  router.post('/join', limitJoins, async (req, res) => {
    const person = await invitations.join(readBody(req, joinRequest));
    await beginSession(req, person);
    await session.noteSignIn(person);
    res.status(201).json(await session.describe(person));
  });

  return router;
}
