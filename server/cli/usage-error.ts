/** The command line cannot be understood. */
export class UsageError extends Error {}
