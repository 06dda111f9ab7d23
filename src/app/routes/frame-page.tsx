import { lazy, Suspense } from 'react';
import { useQuery } from '@tanstack/react-query';
import { useParams } from 'react-router';
import type { StoredEdgePreset } from '#shared/contracts/edge-presets.ts';
import type { DrawerCutter } from '#shared/kernel/cutter-drawer/drawer-cutter.ts';
import { useCutters } from '../../features/cutters/api/list-cutters.ts';
import { useEdgePresets } from '../../features/frame-page/api/list-edge-presets.ts';
import { frameQuery } from '../../features/frame-page/api/get-frame.ts';
import { FramePage } from '../../features/frame-page/frame-page.tsx';
import { useProfiles } from '../../features/profiles/api/list-profiles.ts';
import { useSignedIn } from '../../features/session/signed-in.tsx';
import { Fetched } from '../../ui/fetched.tsx';
import { ProgressText } from '../../ui/progress-text.tsx';
import { Sheet } from '../../ui/sheet.tsx';

/** While the shop's drawer and edges are not there a frame can be worked on all the same. */
const NO_DRAWER: readonly DrawerCutter[] = [];
const NO_EDGES: readonly StoredEdgePreset[] = [];

// Three dimensions are large: fetched when somebody looks.
const CutPart = lazy(async () => ({ default: (await import('../../features/cut-part/cut-part.tsx')).CutPart }));

/** /frames/:frameId */
export function FramePageRoute() {
  const { frameId = '' } = useParams();
  const { shop, mayDo } = useSignedIn();
  const frame = useQuery({ ...frameQuery(frameId), refetchOnMount: 'always' });
  const profiles = useProfiles();
  const cutters = useCutters();
  const edges = useEdgePresets();
  // Work starts from the draft as it is now: one that was fetched for a list may be older.
  if (frame.data !== undefined && frame.isFetchedAfterMount && profiles.data !== undefined) {
    return (
      <FramePage
        key={frameId}
        frame={frame.data}
        profiles={profiles.data}
        defaultProfileId={shop.defaultProfileId}
        drawer={cutters.data ?? NO_DRAWER}
        savedEdges={edges.data ?? NO_EDGES}
        shopName={shop.name}
        mayEdit={mayDo('edit-frames') && !frame.data.removed}
        mayRelease={mayDo('release') && !frame.data.removed}
        renderCutPart={(worked, stops) => (
          <Suspense fallback={<ProgressText>The view is fetched.</ProgressText>}>
            <CutPart worked={worked} stops={stops} />
          </Suspense>
        )}
      />
    );
  }
  return (
    <Sheet title="Frame">
      <Fetched query={frame} what="the frame">
        {() => (
          <Fetched query={profiles} what="the file profiles">
            {() => null}
          </Fetched>
        )}
      </Fetched>
    </Sheet>
  );
}
