import type { Role } from '#shared/contracts/roles.ts';
import { writeLinkMail } from '../../mail/write-link-mail.ts';

interface InvitationMail {
  readonly shopName: string;
  readonly invitedBy: string;
  readonly role: Role;
  readonly link: string;
}

/** What goes to somebody who is invited into a shop. */
export const writeInvitationMail = ({ shopName, invitedBy, role, link }: InvitationMail) => ({
  subject: `Join ${shopName} on Stilepost`,
  ...writeLinkMail({
    before: [
      'Hello,',
      `${invitedBy} invites you to ${shopName}, as ${role}. Stilepost draws both faces of one-piece MDF face frames for the router.`,
      'Join within seven days:',
    ],
    linkText: `Join ${shopName}`,
    link,
    after: ['If you did not expect this, do nothing.'],
  }),
});
