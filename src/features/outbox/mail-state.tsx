import type { OutboxMail } from '#shared/contracts/outbox.ts';
import { plural } from '../../ui/plural.ts';
import { When } from '../../ui/when.tsx';

/** What became of a mail, in words. */
export function MailState({ mail: { state, tries, lastError, sentAt, dueAt } }: { readonly mail: OutboxMail }) {
  if (state === 'outbox') return 'to be read here';
  if (state === 'sent') return sentAt === null ? 'sent' : <>sent {<When iso={sentAt} />}</>;
  const said = lastError === null ? '' : `: ${lastError}`;
  if (state === 'failed') {
    return (
      <span className="wrap-anywhere">
        <strong className="text-stop">not sent</strong>, tried {plural(tries, 'time')}
        {said}
      </span>
    );
  }
  if (dueAt === null) return 'waiting to be sent';
  return (
    <span className="wrap-anywhere">
      tried {plural(tries, 'time')}, again {<When iso={dueAt} />}
      {said}
    </span>
  );
}
