import { useProfiles } from '../../features/profiles/api/list-profiles.ts';
import { useSignedIn } from '../../features/session/signed-in.tsx';
import { ShopPage } from '../../features/shop/shop-page.tsx';
import { Fetched } from '../../ui/fetched.tsx';
import { Sheet } from '../../ui/sheet.tsx';

export function ShopRoute() {
  const { shop, mayDo } = useSignedIn();
  const profiles = useProfiles();
  if (profiles.data !== undefined)
    return <ShopPage shop={shop} profiles={profiles.data} mayManage={mayDo('manage-shop')} />;
  return (
    <Sheet title="Shop">
      <Fetched query={profiles} what="the settings">
        {() => null}
      </Fetched>
    </Sheet>
  );
}
