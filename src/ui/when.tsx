const FULL = new Intl.DateTimeFormat('en-GB', { dateStyle: 'long', timeStyle: 'medium' });
const DAY = new Intl.DateTimeFormat('en-GB', { day: 'numeric', month: 'short', year: 'numeric' });
const TIME = new Intl.DateTimeFormat('en-GB', { hour: '2-digit', minute: '2-digit' });

/** A time as a person says it: the hour for today, else the day; all of it on hover. `iso` is an ISO 8601 date-time. */
export function When({ iso, now = new Date() }: { readonly iso: string; readonly now?: Date }) {
  const time = new Date(iso);
  const today = DAY.format(time) === DAY.format(now);
  return (
    <time dateTime={iso} title={FULL.format(time)}>
      {today ? `today ${TIME.format(time)}` : DAY.format(time)}
    </time>
  );
}
