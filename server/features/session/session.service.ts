import { randomUUID } from 'node:crypto';
import type { Role } from '#shared/contracts/roles.ts';
import type { Session, Shop, signUpRequest } from '#shared/contracts/session.ts';
import type { DrawerCutter } from '#shared/kernel/cutter-drawer/drawer-cutter.ts';
import { startingCutters } from '#shared/kernel/cutter-drawer/starting-cutters.ts';
import { BUILTIN_PROFILES } from '#shared/kernel/profiles/builtin-profiles.ts';
import type { z } from 'zod';
import { isUniqueViolation } from '../../db/unique-violation.ts';
import { AppError } from '../../errors.ts';
import type { SignedIn } from '../../http/signed-in.ts';
import { hashPassword, passwordFits } from './hash-password.ts';
import type { SessionStore } from './session.store.ts';

export type SessionService = ReturnType<typeof sessionService>;

/** What lies in the cutter drawer of a new shop. */
const startingDrawer = (unit: Shop['unit']): DrawerCutter[] =>
  startingCutters(unit).map((entry) => ({ id: randomUUID(), ...entry }));

/** Who is here: signing up, in and out. */
export const sessionService = (store: SessionStore, now: () => Date) => ({
  /** Opens a shop with its first person as the owner. Throws 'email-taken'. */
  async signUp(request: z.output<typeof signUpRequest>): Promise<SignedIn> {
    const shopId = randomUUID();
    const owner: SignedIn = { id: randomUUID(), shopId, name: request.name, email: request.email, role: 'owner' };
    const passwordHash = await hashPassword(request.password);
    const createdAt = now();
    const shop = {
      id: shopId,
      name: request.shopName,
      unit: request.unit,
      paper: request.unit === 'in' ? ('Letter' as const) : ('A4' as const),
      defaultProfileId: BUILTIN_PROFILES[0]!.id,
      demo: false,
      createdAt,
    };
    try {
      await store.openShop(shop, [{ ...owner, passwordHash, createdAt }], startingDrawer(request.unit));
    } catch (error) {
      if (isUniqueViolation(error)) throw new AppError('email-taken', 'sign-up with a taken address');
      throw error;
    }
    return owner;
  },

  /** Opens the shop that anybody may enter; its people have no password. */
  async openDemoShop(
    shop: Pick<Shop, 'name' | 'unit' | 'paper'>,
    people: readonly Pick<SignedIn, 'name' | 'email' | 'role'>[],
  ): Promise<SignedIn[]> {
    const shopId = randomUUID();
    const createdAt = now();
    const persons = people.map((person) => ({ ...person, id: randomUUID(), shopId }));
    const demo = { ...shop, id: shopId, defaultProfileId: BUILTIN_PROFILES[0]!.id, demo: true, createdAt };
    await store.openShop(
      demo,
      persons.map((person) => ({ ...person, passwordHash: null, createdAt })),
      startingDrawer(shop.unit),
    );
    return persons;
  },

  /** Null alike for an unknown address and a wrong password, and after the same time. */
  async findByPassword(email: string, password: string): Promise<SignedIn | null> {
    const found = await store.findByEmail(email);
    const fits = await passwordFits(found?.passwordHash ?? null, password);
    return found && fits ? found.person : null;
  },

  /** Throws 'not-found' where there is no demo shop. */
  async findDemoPerson(role: Role): Promise<SignedIn> {
    const person = await store.findDemoPerson(role);
    if (!person) throw new AppError('not-found', 'demo sign-in where there is no demo shop');
    return person;
  },

  async describe(who: SignedIn | undefined): Promise<Session> {
    const demoAvailable = await store.demoExists();
    if (!who) return { user: null, shop: null, demoAvailable };
    return {
      user: { id: who.id, name: who.name, email: who.email, role: who.role },
      shop: await store.shopOf(who.shopId),
      demoAvailable,
    };
  },

  noteSignIn: (who: SignedIn): Promise<void> => store.noteSignIn(who.id, now()),

  endAllSessions: (who: SignedIn): Promise<void> => store.endSessionsOf(who.id),
});
