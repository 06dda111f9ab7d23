import type { AddressInfo } from 'node:net';
import { SMTPServer, type SMTPServerOptions } from 'smtp-server';

export interface ReceivedMail {
  readonly to: string[];
  /** As it came, RFC 5322. */
  readonly source: string;
  readonly messageId: string;
}

export interface MailServer {
  readonly url: string;
  readonly port: number;
  readonly received: ReceivedMail[];
  close(): Promise<void>;
}

interface Manners {
  /** 0: any free one. */
  readonly port?: number;
  /** Answer to an address; undefined takes it. */
  readonly recipient?: (address: string) => { code: number; words: string } | undefined;
  /** Answer to a mail's content; undefined takes it. */
  readonly content?: () => { code: number; words: string } | undefined;
  /** Answer to the sender; undefined takes it. */
  readonly sender?: () => { code: number; words: string } | undefined;
  /** Settles before the server answers for a mail that it has read. */
  readonly beforeAnswer?: () => Promise<void>;
}

const refusal = (answer: { code: number; words: string } | undefined): Error | null =>
  answer ? Object.assign(new Error(answer.words), { responseCode: answer.code }) : null;

/** A real SMTP server on this machine (smtp-server) that keeps what it takes. */
export async function startMailServer(manners: Manners = {}): Promise<MailServer> {
  const received: ReceivedMail[] = [];
  const options: SMTPServerOptions = {
    disabledCommands: ['AUTH', 'STARTTLS'],
    closeTimeout: 100,
    onMailFrom: (_address, _session, answer) => answer(refusal(manners.sender?.())),
    onRcptTo: ({ address }, _session, answer) => answer(refusal(manners.recipient?.(address))),
    onData(stream, session, answer) {
      const chunks: Buffer[] = [];
      stream.on('data', (chunk: Buffer) => chunks.push(chunk));
      stream.on('end', () => {
        const refused = refusal(manners.content?.());
        const source = Buffer.concat(chunks).toString('utf8');
        const messageId = /^Message-ID:\s*(\S+)/im.exec(source)?.[1] ?? '';
        if (!refused) received.push({ to: session.envelope.rcptTo.map(({ address }) => address), source, messageId });
        void (manners.beforeAnswer?.() ?? Promise.resolve()).then(() => answer(refused));
      });
    },
  };
  const server = new SMTPServer(options);
  // A client that goes away in the middle is what some tests are about.
  server.on('error', () => undefined);
  await new Promise<void>((resolve) => server.listen(manners.port ?? 0, '127.0.0.1', resolve));
  const { port } = server.server.address() as AddressInfo;
  return {
    url: `smtp://127.0.0.1:${port}`,
    port,
    received,
    close: () => new Promise((resolve) => server.close(() => resolve())),
  };
}
