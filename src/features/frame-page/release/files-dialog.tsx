import { useState } from 'react';
import type { Frame, Revision } from '#shared/contracts/frames.ts';
import type { StoredProfile } from '#shared/contracts/profiles.ts';
import { ButtonLink } from '../../../ui/button-link.tsx';
import { Cautions } from '../../../ui/cautions.tsx';
import { Dialog } from '../../../ui/dialog.tsx';
import { DownloadButton } from '../../../ui/download-button.tsx';
import { Empty } from '../../../ui/empty.tsx';
import { Notice } from '../../../ui/notice.tsx';
import { Section } from '../../../ui/section.tsx';
import { Select } from '../../../ui/select.tsx';
import { When } from '../../../ui/when.tsx';

interface FilesDialogProps {
  readonly frame: Frame;
  readonly profiles: readonly StoredProfile[];
  readonly defaultProfileId: string;
  /** The revision that was released just now, '' when the dialog was opened otherwise. */
  readonly released: string;
  readonly onClose: () => void;
}

function RevisionFiles({
  frame,
  revision,
  profileId,
  main,
}: {
  readonly frame: Frame;
  readonly revision: Revision;
  readonly profileId: string;
  readonly main: boolean;
}) {
  const at = `/api/frames/${encodeURIComponent(frame.id)}/revisions/${encodeURIComponent(revision.letter)}`;
  const profile = encodeURIComponent(profileId);
  return (
    <li className="flex flex-wrap items-start justify-between gap-x-6 gap-y-2 border-b border-rule py-2.5 last:border-b-0">
      <div className="min-w-40">
        <p>
          <strong className="text-16">{revision.letter}</strong> <When iso={revision.releasedAt} />, {revision.author}
        </p>
        {revision.note !== '' && <p className="text-12 text-pencil wrap-anywhere">{revision.note}</p>}
      </div>
      <div className="flex flex-wrap items-start gap-2">
        <div className="w-44">
          <DownloadButton path={`${at}/layer-set.zip?profile=${profile}`} kind={main ? 'main' : 'plain'} wide>
            {`Layer set ${revision.letter}`}
          </DownloadButton>
        </div>
        <ButtonLink
          to={`/frames/${encodeURIComponent(frame.id)}/sheet?revision=${encodeURIComponent(revision.letter)}&profile=${profile}`}
        >
          Setup sheet
        </ButtonLink>
        <ButtonLink to={`${at}/setup-sheet.pdf?profile=${profile}`} newTab>
          PDF
        </ButtonLink>
        <ButtonLink to={`${at}/frame-file`} download>
          Frame file
        </ButtonLink>
      </div>
    </li>
  );
}

/** To what differs between the newest revision and the draft, or the revision before it when the draft is the same. */
function CompareLink({ frame: { id, revisions, draftChanged } }: { readonly frame: Frame }) {
  const [newest, earlier] = revisions;
  const pair =
    newest === undefined
      ? undefined
      : draftChanged
        ? { from: newest.letter, to: 'draft', words: `Compare ${newest.letter} with the draft` }
        : earlier && {
            from: earlier.letter,
            to: newest.letter,
            words: `Compare ${earlier.letter} with ${newest.letter}`,
          };
  if (pair === undefined) return null;
  const { from, to, words } = pair;
  return (
    <p className="mb-5">
      <ButtonLink to={`/frames/${encodeURIComponent(id)}/compare?${new URLSearchParams({ from, to }).toString()}`}>
        {words}
      </ButtonLink>
    </p>
  );
}

/** Files of each revision in a file profile, with the cautions that go with them, and the draft's setup sheet to look at. */
export function FilesDialog({ frame, profiles, defaultProfileId, released, onClose }: FilesDialogProps) {
  const [chosen, setChosen] = useState(defaultProfileId);
  const profileId = profiles.some(({ id }) => id === chosen) ? chosen : (profiles[0]?.id ?? '');
  return (
    <Dialog title={`Files of ${frame.particulars.name}`} wide onClose={onClose}>
      {released !== '' && (
        <Notice level="note" word="Released" live>
          Revision {released} is frozen. Its files were written, read back and agree with the frame.
        </Notice>
      )}
      <div className="grid gap-x-8 md:grid-cols-[minmax(0,1fr)_18rem]">
        <div>
          {frame.revisions.length === 0 ? (
            <Empty title="No revision yet">Release the draft first: then its layer set can be downloaded here.</Empty>
          ) : (
            <Section heading="Revisions" aside="newest first" level={3}>
              <ul aria-label="Revisions">
                {frame.revisions.map((revision, i) => (
                  <RevisionFiles
                    key={revision.letter}
                    frame={frame}
                    revision={revision}
                    profileId={profileId}
                    main={i === 0}
                  />
                ))}
              </ul>
            </Section>
          )}
          <CompareLink frame={frame} />
          <Section heading="Draft" aside="not for cutting" level={3}>
            <div className="flex flex-wrap gap-2">
              <ButtonLink to={`/frames/${encodeURIComponent(frame.id)}/sheet`}>Setup sheet of the draft</ButtonLink>
              <ButtonLink to={`/api/frames/${encodeURIComponent(frame.id)}/draft/setup-sheet.pdf`} newTab>
                PDF
              </ButtonLink>
            </div>
          </Section>
        </div>
        <div>
          <Select
            label="File profile"
            layout="stack"
            options={profiles.map(({ id, profile }) => ({ value: id, label: profile.name }))}
            value={profileId}
            onValue={setChosen}
            hint="Layers, unit, decimals and origin as that shop wants them."
          />
          <Cautions />
        </div>
      </div>
    </Dialog>
  );
}
