import { AppError } from '../../errors.ts';

/** Wrong tries that cost nothing. */
const FREE = { account: 5, address: 30 };
const LONGEST_WAIT_MS = 60_000;
/** After this long without a try, all is forgotten. */
const FORGET_AFTER_MS = 15 * 60_000;
const MOST_REMEMBERED = 50_000;

interface Tries {
  count: number;
  last: number;
}

/**
 * Slows guessing down, by account and by address: after the free tries each next one must wait twice as long as the one before.
 * A try counts when it begins, so that many at once gain nothing. Kept in memory: a restart forgives.
 */
export class SignInBrake {
  readonly #now: () => Date;
  readonly #what: string;
  readonly #tries = new Map<string, Tries>();

  /** `what`: what is counted, as the person reads it. */
  constructor(now: () => Date, what = 'wrong tries') {
    this.#now = now;
    this.#what = what;
  }

  /** Counts a try. Throws 'too-many-requests' with the seconds to wait; the same whether or not the account exists. */
  begin(email: string, address: string): void {
    const keys = [
      { key: `account ${email}`, free: FREE.account },
      { key: `address ${address}`, free: FREE.address },
    ];
    const now = this.#now().getTime();
    this.#forget(now);
    for (const { key, free } of keys) {
      const tries = this.#tries.get(key);
      if (!tries || tries.count < free) continue;
      const wait = tries.last + Math.min(LONGEST_WAIT_MS, 1000 * 2 ** (tries.count - free)) - now;
      if (wait > 0) {
        const seconds = Math.ceil(wait / 1000);
        throw new AppError('too-many-requests', `sign-in held back: ${key}`, {
          message: `Too many ${this.#what}. Wait ${seconds} ${seconds === 1 ? 'second' : 'seconds'} and try again.`,
          retryAfter: seconds,
        });
      }
    }
    for (const { key } of keys) {
      const count = (this.#tries.get(key)?.count ?? 0) + 1;
      // Delete first: a map keeps the order of insertion, so the oldest stand in front.
      this.#tries.delete(key);
      this.#tries.set(key, { count, last: now });
    }
  }

  /** The try was right: the account starts afresh, and the address is not held to this one. */
  succeeded(email: string, address: string): void {
    this.#tries.delete(`account ${email}`);
    const tries = this.#tries.get(`address ${address}`);
    if (tries) tries.count -= 1;
  }

  #forget(now: number): void {
    for (const [key, tries] of this.#tries) {
      if (now - tries.last < FORGET_AFTER_MS && this.#tries.size <= MOST_REMEMBERED) break;
      this.#tries.delete(key);
    }
  }
}
