import { useMails } from '../../features/outbox/api/list-mails.ts';
import { OutboxPage } from '../../features/outbox/outbox-page.tsx';
import { useSignedIn } from '../../features/session/signed-in.tsx';
import { Empty } from '../../ui/empty.tsx';
import { Fetched } from '../../ui/fetched.tsx';
import { Sheet } from '../../ui/sheet.tsx';

function OwnersOutbox({ shopName }: { readonly shopName: string }) {
  const query = useMails();
  if (query.data !== undefined) return <OutboxPage outbox={query.data} shopName={shopName} />;
  return (
    <Sheet title="Outbox">
      <Fetched query={query} what="the mails">
        {() => null}
      </Fetched>
    </Sheet>
  );
}

/** /outbox */
export function OutboxRoute() {
  const { shop, mayDo } = useSignedIn();
  if (mayDo('manage-people')) return <OwnersOutbox shopName={shop.name} />;
  return (
    <Sheet title="Outbox">
      <Empty title="Not yours to read">The owner of the shop reads its mails.</Empty>
    </Sheet>
  );
}
