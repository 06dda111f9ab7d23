import { z } from 'zod';
import { role } from './roles.ts';
import { email, name, password } from './session.ts';

/** Times are ISO 8601 in UTC. */
const moment = z.string();

const person = z.object({
  id: z.string(),
  name: z.string(),
  email: z.string(),
  role,
  since: moment,
  /** Null until the first time. */
  lastSignInAt: moment.nullable(),
  /** Access was taken away. */
  disabled: z.boolean(),
  /** Anybody may enter as this person of the demo shop, so nothing about them changes. */
  demo: z.boolean(),
});
export type Person = z.infer<typeof person>;

/** Not used and not revoked; one past its time can still be sent anew. */
export const invitation = z.object({
  id: z.string(),
  email: z.string(),
  role,
  invitedBy: z.string(),
  invitedAt: moment,
  expiresAt: moment,
  expired: z.boolean(),
});
export type Invitation = z.infer<typeof invitation>;

/** GET /api/people (owner). */
export const people = z.object({ people: z.array(person), invitations: z.array(invitation) });
export type People = z.infer<typeof people>;

/**
 * PATCH /api/people/:personId (owner): one of the two. Answers 204. Refused with 'last-owner' when no owner would be left,
 * 'own-role' for one's own role and 'demo-person' for those whom anybody may be.
 */
export const personChange = z.union([z.strictObject({ role }), z.strictObject({ disabled: z.boolean() })], {
  error: 'takes a role, or disabled true or false',
});
export type PersonChange = z.infer<typeof personChange>;

/** POST /api/invitations (owner): mails a link. An open invitation of this address ends. Answers an invitation; 'email-taken' when the address has an account. */
export const invitationRequest = z.strictObject({ email, role });
export type InvitationRequest = z.input<typeof invitationRequest>;

/** POST /api/invitations/:invitationId/resend mails a new link, and the old one ends. DELETE /api/invitations/:invitationId revokes it. */

/** GET /api/join/:token: what the link leads into. 404 alike for links that are unknown, used, revoked or past their time. */
export const joinOffer = z.object({ shopName: z.string(), role, email: z.string() });
export type JoinOffer = z.infer<typeof joinOffer>;

/** POST /api/join. Answers a session. */
export const joinRequest = z.strictObject({ token: z.string().max(200), name, password });
export type JoinRequest = z.input<typeof joinRequest>;
