import { framesService, type FramesService } from './features/frames/frames.service.ts';
import { framesStore } from './features/frames/frames.store.ts';
import { releaseService, type ReleaseService } from './features/frames/release.service.ts';
import { jobsService, type JobsService } from './features/jobs/jobs.service.ts';
import { jobsStore } from './features/jobs/jobs.store.ts';
import { sessionService, type SessionService } from './features/session/session.service.ts';
import { sessionStore } from './features/session/session.store.ts';
import type { Database } from './db/database.ts';
import type { SignedIn } from './http/signed-in.ts';
import type { Makers } from './making/tasks.ts';

/** The services that both the routes and the demo scenario use. */
export interface Services {
  readonly session: SessionService;
  readonly jobs: JobsService;
  readonly frames: FramesService;
  readonly releases: ReleaseService;
  findPerson(id: string): Promise<SignedIn | null>;
  /** Throws when the database does not answer. */
  checkDatabase(): Promise<void>;
}

/** Puts services on their stores. */
export function wireServices(database: Database, makers: Makers, now: () => Date): Services {
  const sessions = sessionStore(database);
  const framesGiven = { store: framesStore(database), makers, now };
  const frames = framesService(framesGiven);
  return {
    session: sessionService(sessions, now),
    jobs: jobsService(jobsStore(database), now),
    frames,
    releases: releaseService(framesGiven, frames),
    findPerson: sessions.findPerson,
    checkDatabase: async () => void (await sessions.demoExists()),
  };
}
