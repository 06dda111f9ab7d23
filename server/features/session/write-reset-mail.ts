import { writeLinkMail } from '../../mail/write-link-mail.ts';

/** What goes to somebody who forgot the password, or whose address somebody typed. */
export const writeResetMail = (name: string, link: string): { subject: string; text: string; html: string } => ({
  subject: 'Set a new password for Stilepost',
  ...writeLinkMail({
    before: [
      `Hello ${name},`,
      'somebody asked for a new password for this e-mail address. Set it here within an hour:',
    ],
    linkText: 'Set a new password',
    link,
    after: ['If that was not you, do nothing: the old password stays.'],
  }),
});
