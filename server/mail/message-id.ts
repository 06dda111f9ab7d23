import { createHash } from 'node:crypto';

/**
 * Message-ID of an event's mail, the same at each try: a mail that was taken by the server but not marked as sent, for the
 * process died between, is known again by whoever gets it twice. Format: RFC 5322, 3.6.4. `from` ends in the sender's
 * address, in angle brackets or without.
 */
export function messageId(event: string, from: string): string {
  const domain = /@([^\s@>]+)>?\s*$/.exec(from)?.[1];
  if (domain === undefined) throw new Error(`messageId: no address in the sender ${JSON.stringify(from)}`);
  // 128 bits tell any two events apart, and leave room for the domain on an unfolded line.
  return `<${createHash('sha256').update(event).digest('hex').slice(0, 32)}@${domain}>`;
}
