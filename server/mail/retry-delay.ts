const MINUTE = 60_000;
const HOUR = 60 * MINUTE;
const LONGEST = 6 * HOUR;

/** A mail that could not be sent for this long, counted from its first try, has failed. Milliseconds. */
export const GIVE_UP_AFTER = 48 * HOUR;

/** How long to wait after the given number of tries that failed: 1 minute, then twice as long each time, up to 6 hours. Milliseconds. */
export function retryDelay(tries: number): number {
  if (!Number.isInteger(tries) || tries < 1) throw new Error(`retryDelay: tries is ${tries}, not a count from 1`);
  return Math.min(MINUTE * 2 ** (tries - 1), LONGEST);
}
