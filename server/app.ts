import compression from 'compression';
import express, { Router, type Express, type RequestHandler } from 'express';
import type { Logger } from 'pino';
import { LIMITS } from '#shared/contracts/limits.ts';
import type { Config } from './config.ts';
import type { Database } from './db/database.ts';
import { cuttersRoutes } from './features/cutters/cutters.routes.ts';
import { cuttersService } from './features/cutters/cutters.service.ts';
import { cuttersStore } from './features/cutters/cutters.store.ts';
import { downloadsRoutes } from './features/downloads/downloads.routes.ts';
import { downloadsService } from './features/downloads/downloads.service.ts';
import { downloadsStore } from './features/downloads/downloads.store.ts';
import { edgePresetsRoutes } from './features/edge-presets/edge-presets.routes.ts';
import { edgePresetsService } from './features/edge-presets/edge-presets.service.ts';
import { edgePresetsStore } from './features/edge-presets/edge-presets.store.ts';
import { framesRoutes } from './features/frames/frames.routes.ts';
import { jobsRoutes } from './features/jobs/jobs.routes.ts';
import { invitationsService } from './features/people/invitations.service.ts';
import { invitationsStore } from './features/people/invitations.store.ts';
import { peopleRoutes } from './features/people/people.routes.ts';
import { peopleService } from './features/people/people.service.ts';
import { peopleStore } from './features/people/people.store.ts';
import { outboxRoutes } from './features/outbox/outbox.routes.ts';
import { outboxService } from './features/outbox/outbox.service.ts';
import { outboxStore } from './features/outbox/outbox.store.ts';
import { profilesRoutes } from './features/profiles/profiles.routes.ts';
import { profilesService } from './features/profiles/profiles.service.ts';
import { profilesStore } from './features/profiles/profiles.store.ts';
import { hashPassword } from './features/session/hash-password.ts';
import { resetsRoutes } from './features/session/resets.routes.ts';
import { resetsService } from './features/session/resets.service.ts';
import { resetsStore } from './features/session/resets.store.ts';
import { sessionRoutes } from './features/session/session.routes.ts';
import { SignInBrake } from './features/session/sign-in-brake.ts';
import { shopRoutes } from './features/shop/shop.routes.ts';
import { shopService } from './features/shop/shop.service.ts';
import { shopStore } from './features/shop/shop.store.ts';
import { tracingsRoutes } from './features/tracings/tracings.routes.ts';
import { tracingsService } from './features/tracings/tracings.service.ts';
import { tracingsStore } from './features/tracings/tracings.store.ts';
import type { FileStore } from './files/file-store.ts';
import { answerError, noSuchRoute } from './http/answer-error.ts';
import { limitRequests } from './http/limit-requests.ts';
import { logRequests } from './http/log-requests.ts';
import { refuseCrossSite } from './http/refuse-cross-site.ts';
import { securityHeaders } from './http/security-headers.ts';
import type { DatabaseSessions } from './http/sessions.store.ts';
import { useSessions } from './http/use-sessions.ts';
import type { Makers } from './making/tasks.ts';
import type { Services } from './services.ts';

const MINUTE = 60_000;

export interface AppGiven {
  readonly config: Pick<
    Config,
    'trustProxy' | 'publicUrl' | 'mail' | 'signUpsPerHour' | 'invitationsPerHour' | 'requestsPerMinute'
  >;
  readonly sessionSecret: string;
  readonly database: Database;
  readonly sessions: DatabaseSessions;
  readonly services: Services;
  readonly makers: Makers;
  /** Makers that read somebody else's drawings, so that those hold up nothing else. */
  readonly tracers: Makers;
  readonly files: FileStore;
  readonly now: () => Date;
  readonly log: Logger;
  /** The client comes from its sources, through Vite. */
  readonly fromSources: boolean;
}

/** Every route under /api. */
function apiRoutes(given: AppGiven): Router {
  const { database, services, makers, now, config } = given;
  const api = Router();
  api.use(limitRequests(config.requestsPerMinute, MINUTE));
  api.use(refuseCrossSite);
  const people = useSessions(api, {
    secret: given.sessionSecret,
    sessions: given.sessions,
    findPerson: services.findPerson,
  });
  api.use(express.json({ limit: LIMITS.jsonBodyBytes }));
  const limitSignUps = limitRequests(config.signUpsPerHour, 60 * MINUTE);
  api.use(sessionRoutes({ people, service: services.session, brake: new SignInBrake(now), limitSignUps }));
  const resets = {
    service: resetsService(resetsStore(database), now),
    askBrake: new SignInBrake(now, 'requests for a link'),
    linkBrake: new SignInBrake(now),
    publicUrl: config.publicUrl,
    log: given.log,
  };
  api.use(resetsRoutes(resets));
  const invitations = { store: invitationsStore(database), hashPassword, now };
  api.use(
    peopleRoutes({
      people: peopleService(peopleStore(database)),
      invitations: invitationsService(invitations),
      session: services.session,
      publicUrl: config.publicUrl,
      limitInvitations: limitRequests(config.invitationsPerHour, 60 * MINUTE),
      limitJoins: limitRequests(config.signUpsPerHour, 60 * MINUTE),
    }),
  );
  api.use(outboxRoutes(outboxService(outboxStore(database), config.mail !== undefined)));
  api.use(shopRoutes(shopService(shopStore(database))));
  api.use(profilesRoutes(profilesService(profilesStore(database), now)));
  api.use(cuttersRoutes(cuttersService(cuttersStore(database), now)));
  api.use(edgePresetsRoutes(edgePresetsService(edgePresetsStore(database), now)));
  api.use(jobsRoutes(services.jobs));
  api.use(framesRoutes(services.frames, services.releases));
  api.use(downloadsRoutes(downloadsService(downloadsStore(database), makers)));
  const tracings = {
    store: tracingsStore(database),
    files: given.files,
    tracers: given.tracers,
    frames: services.frames,
    now,
  };
  api.use(tracingsRoutes(tracingsService(tracings), given.files));
  api.use(noSuchRoute);
  return api;
}

/** Answers are one person's: no cache between may keep them. */
const keepPrivate: RequestHandler = (_req, res, next) => {
  res.setHeader('Cache-Control', 'private, no-cache');
  next();
};

/** The server without the client: that is put on afterwards, before `finishApp`. */
export function createApp(given: AppGiven): Express {
  const app = express();
  app.disable('x-powered-by');
  app.set('trust proxy', given.config.trustProxy);
  app.set('query parser', 'simple');
  app.use(logRequests(given.log));
  app.use(securityHeaders(given.fromSources));
  app.use(
    compression({
      filter: (req, res) =>
        !String(res.getHeader('Content-Type')).startsWith('text/event-stream') && compression.filter(req, res),
    }),
  );
  app.get('/healthz', async (_req, res) => {
    await given.services.checkDatabase();
    res.json({ ok: true });
  });
  app.use('/api', keepPrivate, apiRoutes(given));
  return app;
}

/** Closes the row of handlers. */
export function finishApp(app: Express, log: Logger): void {
  app.use(answerError(log));
}
