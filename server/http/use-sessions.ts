import type { Router } from 'express';
import session from 'express-session';
import passport from 'passport';
import { SESSION_MS, type DatabaseSessions } from './sessions.store.ts';
import type { SignedIn } from './signed-in.ts';

export const SESSION_COOKIE = 'stilepost';

/** A passport of this server's own, not the one that the package shares. */
export type People = InstanceType<typeof passport.Passport>;

/** Sessions by cookie, and passport on top of them: only the person's id is kept in a session. */
export function useSessions(
  api: Router,
  given: { secret: string; sessions: DatabaseSessions; findPerson: (id: string) => Promise<SignedIn | null> },
): People {
  const people = new passport.Passport();
  people.serializeUser<string>((user, done) => done(null, user.id));
  people.deserializeUser<string>((id, done) => {
    given.findPerson(id).then(
      (person) => done(null, person ?? false),
      (error: unknown) => done(error),
    );
  });
  api.use(
    session({
      name: SESSION_COOKIE,
      secret: given.secret,
      store: given.sessions,
      resave: false,
      saveUninitialized: false,
      cookie: { httpOnly: true, sameSite: 'lax', secure: 'auto', maxAge: SESSION_MS },
    }),
  );
  api.use(people.session());
  return people;
}
