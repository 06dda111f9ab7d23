import { z } from 'zod';

/** Stable codes of every error the server answers with. */
export const ERROR_CODES = [
  'invalid-input',
  'not-signed-in',
  'wrong-sign-in',
  'not-allowed',
  'not-found',
  'email-taken',
  'name-taken',
  'last-owner',
  'own-role',
  'demo-person',
  'stale-draft',
  'frame-has-stops',
  'cautions-not-acknowledged',
  'nothing-changed',
  'proof-failed',
  'drawing-refused',
  'too-large',
  'too-many-requests',
  'cross-site',
  'internal',
] as const;

export const errorCode = z.enum(ERROR_CODES);
export type ErrorCode = z.infer<typeof errorCode>;

/** One wrong field: where, what it got, what it takes. */
export const fieldError = z.object({
  path: z.string(),
  message: z.string(),
  got: z.string(),
  takes: z.string(),
});
export type FieldError = z.infer<typeof fieldError>;

/** Body of every answer that is not a success. `details` depends on the code (see each contract). */
export const errorBody = z.object({
  code: errorCode,
  message: z.string(),
  fields: z.array(fieldError).optional(),
  details: z.unknown().optional(),
});
export type ErrorBody = z.infer<typeof errorBody>;
