import type { ReactNode } from 'react';
import { useParams, useSearchParams } from 'react-router';
import type { Frame } from '#shared/contracts/frames.ts';
import type { Particulars } from '#shared/kernel/particulars/particulars.ts';
import { ComparePage, type CompareView } from '../../features/compare/compare-page.tsx';
import { useFrame } from '../../features/frame-page/api/get-frame.ts';
import { useSignedIn } from '../../features/session/signed-in.tsx';
import { useRevision } from '../../features/setup-sheet/api/get-revision.ts';
import { ButtonLink } from '../../ui/button-link.tsx';
import { Empty } from '../../ui/empty.tsx';
import { Fetched } from '../../ui/fetched.tsx';
import { Sheet } from '../../ui/sheet.tsx';

const DRAFT = 'draft';
const VIEWS: readonly CompareView[] = ['overlaid', 'side', 'table'];

interface StateProps {
  readonly frame: Frame;
  readonly letter: string;
  readonly children: (particulars: Particulars) => ReactNode;
}

function RevisionState({ frame, letter, children }: StateProps) {
  const revision = useRevision(frame.id, letter);
  if (revision.data !== undefined) return children(revision.data.particulars);
  return (
    <Sheet title={`Compare ${frame.particulars.name}`}>
      <Fetched query={revision} what={`revision ${letter}`}>
        {() => null}
      </Fetched>
    </Sheet>
  );
}

/** The draft comes with the frame; a revision is fetched. */
const State = (props: StateProps) =>
  props.letter === DRAFT ? props.children(props.frame.particulars) : <RevisionState key={props.letter} {...props} />;

function Compared({ frame }: { readonly frame: Frame }) {
  const { shop } = useSignedIn();
  const [search, setSearch] = useSearchParams();
  const { name } = frame.particulars;
  const newest = frame.revisions[0]?.letter;
  if (newest === undefined) {
    return (
      <Sheet title={`Compare ${name}`}>
        <Empty
          title="Nothing to compare yet"
          actions={<ButtonLink to={`/frames/${encodeURIComponent(frame.id)}`}>To the frame</ButtonLink>}
        >
          Release the draft first: then what is changed after that can be compared with it.
        </Empty>
      </Sheet>
    );
  }
  const from = search.get('from') ?? newest;
  const to = search.get('to') ?? DRAFT;
  return (
    <State frame={frame} letter={from}>
      {(before) => (
        <State frame={frame} letter={to}>
          {(after) => (
            <ComparePage
              shopName={shop.name}
              job={{ id: frame.jobId, name: frame.jobName }}
              frame={{ id: frame.id, name }}
              states={[DRAFT, ...frame.revisions.map(({ letter }) => letter)]}
              choice={{ from, to, view: VIEWS.find((view) => view === search.get('view')) ?? 'overlaid' }}
              before={before}
              after={after}
              onChoice={(choice) => setSearch({ ...choice }, { replace: true })}
            />
          )}
        </State>
      )}
    </State>
  );
}

/** /frames/:frameId/compare?from=A&to=draft&view=table; without them, the newest revision and the draft, overlaid. */
export function CompareRoute() {
  const { frameId = '' } = useParams();
  const frame = useFrame(frameId);
  if (frame.data !== undefined) return <Compared frame={frame.data} />;
  return (
    <Sheet title="Compare">
      <Fetched query={frame} what="the frame">
        {() => null}
      </Fetched>
    </Sheet>
  );
}
