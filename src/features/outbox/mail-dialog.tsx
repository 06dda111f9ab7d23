import type { OutboxMail } from '#shared/contracts/outbox.ts';
import { Dialog } from '../../ui/dialog.tsx';
import { Fetched } from '../../ui/fetched.tsx';
import { useMail } from './api/get-mail.ts';
import { MailState } from './mail-state.tsx';
import { splitLinks } from './split-links.ts';

const MailText = ({ text }: { readonly text: string }) => (
  <p className="whitespace-pre-line wrap-anywhere">
    {splitLinks(text).map((part, i) =>
      part.isLink ? (
        <a key={i} href={part.text} target="_blank" rel="noreferrer" className="underline underline-offset-4">
          {part.text}
        </a>
      ) : (
        part.text
      ),
    )}
  </p>
);

/** One mail as text, with its links to follow. */
export function MailDialog({ mail, onClose }: { readonly mail: OutboxMail; readonly onClose: () => void }) {
  const query = useMail(mail.id);
  return (
    <Dialog title={mail.subject} onClose={onClose}>
      <p className="mb-3 text-12 text-pencil wrap-anywhere">
        To {mail.to}, <MailState mail={mail} />
      </p>
      <Fetched query={query} what="the mail">
        {({ text }) =>
          text === null ? (
            <p>Its words are for whoever it goes to: a mail server carries it, so they are not shown here.</p>
          ) : (
            <MailText text={text} />
          )
        }
      </Fetched>
    </Dialog>
  );
}
