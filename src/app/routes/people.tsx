import { usePeople } from '../../features/people/api/list-people.ts';
import { PeoplePage } from '../../features/people/people-page.tsx';
import { useSignedIn } from '../../features/session/signed-in.tsx';
import { Empty } from '../../ui/empty.tsx';
import { Fetched } from '../../ui/fetched.tsx';
import { ButtonLink } from '../../ui/button-link.tsx';
import { Sheet } from '../../ui/sheet.tsx';

/** /people, for the owner. */
export function PeopleRoute() {
  const { mayDo } = useSignedIn();
  if (mayDo('manage-people')) return <OwnersPeople />;
  return (
    <Sheet title="People">
      <Empty title="For the owner" actions={<ButtonLink to="/jobs">To the jobs</ButtonLink>}>
        Who is in the shop, and as what, is for the owner to see and to change.
      </Empty>
    </Sheet>
  );
}

function OwnersPeople() {
  const { user, shop } = useSignedIn();
  const query = usePeople();
  if (query.data !== undefined) return <PeoplePage {...query.data} shopName={shop.name} myId={user.id} />;
  return (
    <Sheet title="People">
      <Fetched query={query} what="the people">
        {() => null}
      </Fetched>
    </Sheet>
  );
}
