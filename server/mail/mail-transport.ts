/** A mail as it is handed to the world outside. */
export interface OutgoingMail {
  readonly event: string;
  readonly to: string;
  readonly subject: string;
  readonly text: string;
  readonly html: string;
}

/** What takes mails to a mail server. */
export interface MailTransport {
  /** Resolves once the server has answered for the mail. Throws RefusedForGood, or any other error when a later try may do. */
  send(mail: OutgoingMail): Promise<void>;
}

/** The mail server will never take this mail: trying again is of no use. */
export class RefusedForGood extends Error {
  override name = 'RefusedForGood';
}
