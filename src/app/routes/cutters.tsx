import { useCutters } from '../../features/cutters/api/list-cutters.ts';
import { CuttersPage } from '../../features/cutters/cutters-page.tsx';
import { useSignedIn } from '../../features/session/signed-in.tsx';
import { Fetched } from '../../ui/fetched.tsx';
import { Sheet } from '../../ui/sheet.tsx';

/** /cutters */
export function CuttersRoute() {
  const { shop, mayDo } = useSignedIn();
  const query = useCutters();
  if (query.data !== undefined) {
    return (
      <CuttersPage
        cutters={query.data}
        shopName={shop.name}
        unit={shop.unit}
        mayEdit={mayDo('edit-cutters')}
        mayEditFrames={mayDo('edit-frames')}
      />
    );
  }
  return (
    <Sheet title="Cutters">
      <Fetched query={query} what="the cutters">
        {() => null}
      </Fetched>
    </Sheet>
  );
}
