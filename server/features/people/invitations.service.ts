import { randomUUID } from 'node:crypto';
import type { Invitation, invitationRequest, joinRequest, JoinOffer } from '#shared/contracts/people.ts';
import type { z } from 'zod';
import { isUniqueViolation } from '../../db/unique-violation.ts';
import { AppError, notFound } from '../../errors.ts';
import type { SignedIn } from '../../http/signed-in.ts';
import { hashToken, newToken } from '../../secret-token.ts';
import type { InvitationRow, InvitationsStore } from './invitations.store.ts';
import { writeInvitationMail } from './write-invitation-mail.ts';

/** A mailed link works this long. */
const LINK_MS = 7 * 24 * 60 * 60_000;

export interface InvitationsGiven {
  readonly store: InvitationsStore;
  readonly hashPassword: (password: string) => Promise<string>;
  readonly now: () => Date;
}

export type InvitationsService = ReturnType<typeof invitationsService>;

const present = (row: InvitationRow, now: Date): Invitation => ({
  id: row.id,
  email: row.email,
  role: row.role,
  invitedBy: row.invitedBy,
  invitedAt: row.invitedAt.toISOString(),
  expiresAt: row.expiresAt.toISOString(),
  expired: row.expiresAt <= now,
});

/** One answer for every link that does not work, so that nobody learns why. */
const deadLink = () => new AppError('not-found', 'an invitation link that does not work');

/** Invitations into a shop: sending, taking back, and joining by them. */
export function invitationsService({ store, hashPassword, now }: InvitationsGiven) {
  /** A link of this moment, the columns that go with it, and its mail. */
  async function writeLink(who: SignedIn, to: Pick<InvitationRow, 'email' | 'role'>, origin: string) {
    const { token, tokenHash } = newToken();
    const invitedAt = now();
    const link = `${origin}/join/${token}`;
    const shopName = await store.shopName(who.shopId);
    return {
      columns: { tokenHash, invitedBy: who.name, invitedAt, expiresAt: new Date(invitedAt.getTime() + LINK_MS) },
      mail: {
        event: `invitation-${tokenHash}`,
        shopId: who.shopId,
        to: to.email,
        ...writeInvitationMail({ shopName, invitedBy: who.name, role: to.role, link }),
      },
    };
  }

  return {
    async list(shopId: string): Promise<Invitation[]> {
      const at = now();
      return (await store.list(shopId)).map((row) => present(row, at));
    },

    /** Throws 'email-taken', and 'name-taken' when the same address is being invited at this moment. */
    async invite(who: SignedIn, request: z.output<typeof invitationRequest>, origin: string): Promise<Invitation> {
      if (await store.hasAccount(request.email))
        throw new AppError('email-taken', 'invitation of an address with an account', {
          message: 'There is already an account with this e-mail address, here or in another shop.',
        });
      const { columns, mail } = await writeLink(who, request, origin);
      const row = { id: randomUUID(), shopId: who.shopId, ...request, ...columns };
      try {
        await store.add(row, mail);
      } catch (error) {
        if (!isUniqueViolation(error)) throw error;
        throw new AppError('name-taken', 'two invitations of one address at once', {
          message: 'This address is being invited just now. Look at the list again.',
        });
      }
      return present(row, row.invitedAt);
    },

    /** Throws 'not-found'. */
    async resend(who: SignedIn, id: string, origin: string): Promise<Invitation> {
      const old = await store.find(who.shopId, id);
      if (!old) throw notFound('invitation');
      const { columns, mail } = await writeLink(who, old, origin);
      const row = { ...old, ...columns };
      if (!(await store.renew(row, mail))) throw notFound('invitation');
      return present(row, row.invitedAt);
    },

    /** Throws 'not-found'. */
    async revoke(shopId: string, id: string): Promise<void> {
      if (!(await store.revoke(shopId, id, now()))) throw notFound('invitation');
    },

    /** Throws 'not-found'. */
    async offer(token: string): Promise<JoinOffer> {
      const offer = await store.findOffer(hashToken(token), now());
      if (!offer) throw deadLink();
      return offer;
    },

    /** Throws 'not-found', and 'email-taken' when the address got an account since the invitation. */
    async join({ token, name, password }: z.output<typeof joinRequest>): Promise<SignedIn> {
      const tokenHash = hashToken(token);
      // Asked before the hashing, so that a made-up link costs little.
      if (!(await store.findOffer(tokenHash, now()))) throw deadLink();
      const newcomer = { id: randomUUID(), name, passwordHash: await hashPassword(password) };
      try {
        const person = await store.join(tokenHash, newcomer, now());
        if (!person) throw deadLink();
        return person;
      } catch (error) {
        if (isUniqueViolation(error)) throw new AppError('email-taken', 'joining with a taken address');
        throw error;
      }
    },
  };
}
