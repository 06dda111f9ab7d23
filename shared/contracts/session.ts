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

const password = z.string().min(LIMITS.passwordShortest).max(LIMITS.passwordLongest);
const name = words(LIMITS.nameLength);

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
