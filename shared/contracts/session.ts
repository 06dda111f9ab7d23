import { z } from 'zod';
import { LIMITS } from './limits.ts';
import { role } from './roles.ts';
import { words } from './words.ts';

export const email = z
  .string()
  .trim()
  .toLowerCase()
  .max(LIMITS.emailLength)
  .pipe(z.email({ error: 'takes an e-mail address, such as name@example.com' }));

export const password = z.string().min(LIMITS.passwordShortest).max(LIMITS.passwordLongest);
export const name = words(LIMITS.nameLength);

/** POST /api/sign-up: opens a shop, with the person as its owner, and signs in. Answers a session. */
export const signUpRequest = z.strictObject({
  shopName: name,
  name,
  email,
  password,
  unit: z.enum(['in', 'mm']).default('in'),
});
export type SignUpRequest = z.input<typeof signUpRequest>;

/** POST /api/sign-in. Answers a session. */
export const signInRequest = z.strictObject({ email, password: z.string().min(1).max(LIMITS.passwordLongest) });
export type SignInRequest = z.input<typeof signInRequest>;

/** POST /api/demo-sign-in: into the demo shop, where there is one. Answers a session. */
export const demoSignInRequest = z.strictObject({ role: role.default('owner') });
export type DemoSignInRequest = z.input<typeof demoSignInRequest>;

/** POST /api/forgot-password: mails a link to whoever has this address. Answers 204 whether anybody has it or not. */
export const forgotPasswordRequest = z.strictObject({ email });
export type ForgotPasswordRequest = z.input<typeof forgotPasswordRequest>;

/** POST /api/reset-password: by the mailed link, once. Ends every session of the person. Answers 204, or 404 for a link that is unknown, used or past its time. */
export const resetPasswordRequest = z.strictObject({ token: z.string().max(200), password });
export type ResetPasswordRequest = z.input<typeof resetPasswordRequest>;

/** POST /api/sign-out ends this session, POST /api/sign-out-everywhere every session of the person. Both take nothing and answer 204. */

export const paper = z.enum(['A4', 'Letter']);
export type Paper = z.infer<typeof paper>;

export const shop = z.object({
  id: z.string(),
  name: z.string(),
  unit: z.enum(['in', 'mm']),
  paper,
  defaultProfileId: z.string(),
});
export type Shop = z.infer<typeof shop>;

/** PATCH /api/shop (owner). Answers a shop. */
export const shopChange = z.strictObject({
  name: name.optional(),
  unit: z.enum(['in', 'mm']).optional(),
  paper: paper.optional(),
  defaultProfileId: words(100).optional(),
});
export type ShopChange = z.input<typeof shopChange>;

/** GET /api/session. `user` is null when nobody is signed in. */
export const session = z.object({
  user: z.object({ id: z.string(), name: z.string(), email: z.string(), role }).nullable(),
  shop: shop.nullable(),
  demoAvailable: z.boolean(),
});
export type Session = z.infer<typeof session>;
