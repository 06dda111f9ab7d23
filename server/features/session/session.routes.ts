import { Router, type Request, type RequestHandler, type Response } from 'express';
import { Strategy } from 'passport-local';
import { demoSignInRequest, signInRequest, signUpRequest } from '#shared/contracts/session.ts';
import { AppError } from '../../errors.ts';
import { beginSession } from '../../http/begin-session.ts';
import { readBody } from '../../http/read-input.ts';
import { signedIn, whoAsks, type SignedIn } from '../../http/signed-in.ts';
import { SESSION_COOKIE, type People } from '../../http/use-sessions.ts';
import type { SessionService } from './session.service.ts';
import type { SignInBrake } from './sign-in-brake.ts';

interface Given {
  readonly people: People;
  readonly service: SessionService;
  readonly brake: SignInBrake;
  readonly limitSignUps: RequestHandler;
}

const end = (req: Request, res: Response): Promise<void> =>
  new Promise((resolve, reject) =>
    req.session.destroy((error: unknown) => {
      if (error) return reject(error as Error);
      res.clearCookie(SESSION_COOKIE);
      resolve();
    }),
  );

/** Signing up, in and out. */
export function sessionRoutes({ people, service, brake, limitSignUps }: Given): Router {
  people.use(
    new Strategy({ usernameField: 'email', session: false }, (email, password, done) => {
      service.findByPassword(email, password).then(
        (person) => done(null, person ?? false),
        (error: unknown) => done(error),
      );
    }),
  );
  const checkPassword = (req: Request, res: Response): Promise<SignedIn | false> =>
    new Promise((resolve, reject) => {
      const decide = (error: unknown, who?: SignedIn | false | null) =>
        error ? reject(error as Error) : resolve(who || false);
      (people.authenticate('local', decide) as RequestHandler)(req, res, reject);
    });

  const begin = async (req: Request, who: SignedIn): Promise<void> => {
    await beginSession(req, who);
    await service.noteSignIn(who);
  };

  const router = Router();

  router.get('/session', async (req, res) => {
    res.json(await service.describe(req.user));
  });

  router.post('/sign-up', limitSignUps, async (req, res) => {
    const owner = await service.signUp(readBody(req, signUpRequest));
    await begin(req, owner);
    res.status(201).json(await service.describe(owner));
  });

  router.post('/sign-in', async (req, res) => {
    const request = readBody(req, signInRequest);
    const address = req.ip ?? 'unknown';
    brake.begin(request.email, address);
    req.body = request;
    const who = await checkPassword(req, res);
    if (!who) throw new AppError('wrong-sign-in', 'wrong e-mail address or password');
    brake.succeeded(request.email, address);
    await begin(req, who);
    res.json(await service.describe(who));
  });

  router.post('/demo-sign-in', async (req, res) => {
    const who = await service.findDemoPerson(readBody(req, demoSignInRequest).role);
    await begin(req, who);
    res.json(await service.describe(who));
  });

  router.post('/sign-out', async (req, res) => {
    await end(req, res);
    res.status(204).end();
  });

  router.post('/sign-out-everywhere', signedIn, async (req, res) => {
    await service.endAllSessions(whoAsks(req));
    await end(req, res);
    res.status(204).end();
  });

  return router;
}
