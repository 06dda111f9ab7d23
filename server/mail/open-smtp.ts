import { createTransport } from 'nodemailer';
import { RefusedForGood, type MailTransport } from './mail-transport.ts';
import { messageId } from './message-id.ts';

const SECOND = 1_000;

/** How long a mail server may keep silent before the try counts as failed. */
export const PATIENCE = {
  connectionTimeout: 30 * SECOND,
  greetingTimeout: 30 * SECOND,
  // Servers look through a mail before they answer for it. RFC 5321, 4.5.3.2.6 asks for 10 minutes of patience, but a
  // stopped server must not be waited for that long, and a mail that was taken late is known by its Message-ID.
  socketTimeout: 120 * SECOND,
};

/**
 * True for an answer to this very mail that will be the same tomorrow: its recipient or its content is refused (RFC 5321,
 * 4.2.1: 5yz). A refused sign-in or sender is the server's setting, which somebody may mend, and 503 is a matter of order.
 */
function isForGood(error: unknown): boolean {
  if (!(error instanceof Error)) return false;
  const { responseCode, command } = error as { responseCode?: unknown; command?: unknown };
  if (typeof responseCode !== 'number') return false;
  const refused = responseCode >= 500 && responseCode < 600 && responseCode !== 503;
  return refused && (command === 'RCPT TO' || command === 'DATA');
}

/**
 * Mails through an SMTP server. `url` is smtp:// or smtps:// with user and password where the server wants them;
 * `from` is an address, or a name with the address in angle brackets.
 */
export function openSmtp({ url, from }: { url: string; from: string }, patience = PATIENCE): MailTransport {
  const transport = createTransport({ url, ...patience, disableFileAccess: true, disableUrlAccess: true });
  return {
    async send({ event, to, subject, text, html }) {
      try {
        await transport.sendMail({
          from,
          // As an object, so that no address can be read as several.
          to: { name: '', address: to },
          subject,
          text,
          html,
          messageId: messageId(event, from),
          // RFC 3834, 5: keeps away-notices from answering.
          headers: { 'Auto-Submitted': 'auto-generated' },
        });
      } catch (error) {
        if (isForGood(error)) throw new RefusedForGood((error as Error).message, { cause: error });
        throw error;
      }
    },
  };
}
