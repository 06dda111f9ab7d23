/** PostgreSQL, Appendix A: unique_violation. */
const UNIQUE_VIOLATION = '23505';

/** True when a query failed because another row already has the value; drizzle wraps the driver's error as its cause. */
export function isUniqueViolation(error: unknown): boolean {
  for (let at: unknown = error; at instanceof Error; at = at.cause) {
    if ('code' in at && at.code === UNIQUE_VIOLATION) return true;
  }
  return false;
}
