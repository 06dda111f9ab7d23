import { useMemo } from 'react';
import { useParams, useSearchParams } from 'react-router';
import type { Frame, RevisionPage } from '#shared/contracts/frames.ts';
import type { StoredProfile } from '#shared/contracts/profiles.ts';
import type { SheetPage } from '#shared/kernel/sheet/sheet-model.ts';
import { describeSheet } from '#shared/kernel/sheet/describe-sheet.ts';
import { workFrame } from '#shared/kernel/work-frame.ts';
import { useFrame } from '../../features/frame-page/api/get-frame.ts';
import { useProfiles } from '../../features/profiles/api/list-profiles.ts';
import { useSignedIn } from '../../features/session/signed-in.tsx';
import { useRevision } from '../../features/setup-sheet/api/get-revision.ts';
import { sayProof } from '../../features/setup-sheet/say-proof.ts';
import { SetupSheetPage } from '../../features/setup-sheet/setup-sheet-page.tsx';
import { Fetched } from '../../ui/fetched.tsx';
import { Sheet } from '../../ui/sheet.tsx';

interface ShownSheetProps {
  readonly frame: Frame;
  /** null: the draft. */
  readonly revision: RevisionPage | null;
  readonly stored: StoredProfile;
}

function ShownSheet({ frame, revision, stored }: ShownSheetProps) {
  const { shop } = useSignedIn();
  const [search] = useSearchParams();
  const particulars = revision?.particulars ?? frame.particulars;
  const model = useMemo(() => {
    const described = describeSheet(workFrame(particulars), {
      shopName: shop.name,
      jobName: frame.jobName,
      revision: revision?.letter ?? '',
      author: revision?.author ?? frame.changedBy,
      releasedAt: revision?.releasedAt ?? frame.changedAt,
      note: revision?.note ?? '',
      profile: stored.profile,
      proof: null,
    });
    return revision === null ? described : sayProof(described);
  }, [particulars, shop.name, frame, revision, stored]);
  const newest = frame.revisions[0]?.letter ?? '';
  const at = `/api/frames/${encodeURIComponent(frame.id)}`;
  const of = revision === null ? 'draft' : `revisions/${encodeURIComponent(revision.letter)}`;
  const addressOf = (id: SheetPage['id']) => {
    const to = new URLSearchParams(search);
    to.set('page', id);
    return `?${to.toString()}`;
  };
  return (
    <SetupSheetPage
      model={model}
      frame={{ id: frame.id, name: particulars.name }}
      jobName={frame.jobName}
      newerRevision={revision !== null && newest !== revision.letter ? newest : ''}
      pdf={`${at}/${of}/setup-sheet.pdf${revision === null ? '' : `?profile=${encodeURIComponent(stored.id)}`}`}
      shown={model.pages.find((page) => page.id === search.get('page'))?.id ?? 'back'}
      addressOf={addressOf}
    />
  );
}

/** Fetches the revision, which the draft's sheet does without. */
function RevisionSheet({
  frame,
  letter,
  stored,
}: {
  readonly frame: Frame;
  readonly letter: string;
  readonly stored: StoredProfile;
}) {
  const revision = useRevision(frame.id, letter);
  if (revision.data !== undefined) return <ShownSheet frame={frame} revision={revision.data} stored={stored} />;
  return (
    <Sheet title={`Setup sheet of ${frame.particulars.name}`}>
      <Fetched query={revision} what={`revision ${letter}`}>
        {() => null}
      </Fetched>
    </Sheet>
  );
}

/** /frames/:frameId/sheet?revision=A&profile=ID&page=front; without a revision, the draft's. */
export function SetupSheetRoute() {
  const { frameId = '' } = useParams();
  const [search] = useSearchParams();
  const { shop } = useSignedIn();
  const frame = useFrame(frameId);
  const profiles = useProfiles();
  const wanted = search.get('profile') ?? shop.defaultProfileId;
  const stored = profiles.data?.find(({ id }) => id === wanted) ?? profiles.data?.[0];
  const letter = search.get('revision') ?? '';
  if (frame.data !== undefined && stored !== undefined) {
    return letter === '' ? (
      <ShownSheet frame={frame.data} revision={null} stored={stored} />
    ) : (
      <RevisionSheet frame={frame.data} letter={letter} stored={stored} />
    );
  }
  return (
    <Sheet title="Setup sheet">
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
