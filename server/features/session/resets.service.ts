import type { resetPasswordRequest } from '#shared/contracts/session.ts';
import type { z } from 'zod';
import { AppError } from '../../errors.ts';
import { hashToken, newToken } from '../../secret-token.ts';
import { hashPassword } from './hash-password.ts';
import type { ResetsStore } from './resets.store.ts';
import { writeResetMail } from './write-reset-mail.ts';

/** A mailed link works this long. */
const LINK_MS = 60 * 60_000;
/** More links than this are not mailed to one person while they work, however often somebody asks. */
const MOST_OPEN_LINKS = 5;

export type ResetsService = ReturnType<typeof resetsService>;

/** New passwords for people who forgot theirs. */
export const resetsService = (store: ResetsStore, now: () => Date) => ({
  /** Mails a link to whoever has this address; to nobody when nobody has, when access was taken away, or in the demo. */
  async sendLink(email: string, origin: string): Promise<void> {
    const person = await store.findForgetful(email);
    if (!person) return;
    const at = now();
    if ((await store.countOpen(person.id, at)) >= MOST_OPEN_LINKS) return;
    const { token, tokenHash } = newToken();
    const mail = {
      event: `reset-${tokenHash}`,
      // Where no mail goes out, the owner hands the link on: it lies in the shop's outbox.
      shopId: person.shopId,
      to: person.email,
      ...writeResetMail(person.name, `${origin}/reset-password/${token}`),
    };
    await store.add({ tokenHash, userId: person.id, expiresAt: new Date(at.getTime() + LINK_MS) }, mail, at);
  },

  /** Throws 'not-found' alike for links that are unknown, used or past their time. */
  async reset({ token, password }: z.output<typeof resetPasswordRequest>): Promise<void> {
    const tokenHash = hashToken(token);
    const refused = () => new AppError('not-found', 'a reset link that does not work');
    // Asked before the hashing, so that a made-up link costs little.
    if (!(await store.isOpen(tokenHash, now()))) throw refused();
    if (!(await store.use(tokenHash, await hashPassword(password), now()))) throw refused();
  },
});
