import { useSearchParams } from 'react-router';
import { useProfiles } from '../../features/profiles/api/list-profiles.ts';
import { ProfileList } from '../../features/profiles/profile-list.tsx';
import { ProfilePage } from '../../features/profiles/profile-page.tsx';
import { useSignedIn } from '../../features/session/signed-in.tsx';
import { Fetched } from '../../ui/fetched.tsx';
import { Sheet } from '../../ui/sheet.tsx';

/** /profiles?profile=ID; without one, the shop's default. */
export function ProfilesRoute() {
  const { shop, mayDo } = useSignedIn();
  const [search] = useSearchParams();
  const query = useProfiles();
  const wanted = search.get('profile') ?? shop.defaultProfileId;
  const stored = query.data?.find(({ id }) => id === wanted) ?? query.data?.[0];
  if (query.data === undefined || stored === undefined) {
    return (
      <Sheet title="File profiles">
        <Fetched query={query} what="the file profiles">
          {() => null}
        </Fetched>
      </Sheet>
    );
  }
  return (
    <ProfilePage
      key={stored.id}
      stored={stored}
      mayEdit={mayDo('edit-profiles')}
      shopName={shop.name}
      list={<ProfileList profiles={query.data} chosenId={stored.id} defaultId={shop.defaultProfileId} />}
    />
  );
}
