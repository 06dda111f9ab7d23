import { useState, type ReactNode } from 'react';
import { useNavigate } from 'react-router';
import type { StoredProfile } from '#shared/contracts/profiles.ts';
import { LIMITS } from '#shared/contracts/limits.ts';
import { sayError } from '../../lib/say-error.ts';
import { Button } from '../../ui/button.tsx';
import { Notice } from '../../ui/notice.tsx';
import { Section } from '../../ui/section.tsx';
import { Sheet } from '../../ui/sheet.tsx';
import { TitleBlock, TitleCell } from '../../ui/title-block.tsx';
import { useCreateProfile } from './api/create-profile.ts';
import { DeleteProfileDialog } from './delete-profile-dialog.tsx';
import { LayerExample } from './layer-example.tsx';
import { LeaveUnsavedDialog } from '../../ui/leave-unsaved-dialog.tsx';
import { ProfileForm } from './profile-form.tsx';
import { ProfileReading } from './profile-reading.tsx';
import { useProfileEditor } from './use-profile-editor.ts';

interface ProfilePageProps {
  readonly stored: StoredProfile;
  readonly mayEdit: boolean;
  readonly shopName: string;
  /** The list of all profiles. */
  readonly list: ReactNode;
}

/** The sheet of one file profile: to read, or to edit with a live example. */
export function ProfilePage({ stored, mayEdit, shopName, list }: ProfilePageProps) {
  const editor = useProfileEditor(stored);
  const [deleting, setDeleting] = useState(false);
  const copy = useCreateProfile();
  const navigate = useNavigate();
  const editable = mayEdit && !stored.builtIn;
  const failed = editor.error ?? copy.error;

  const makeCopy = () =>
    copy.mutate(
      { ...stored.profile, name: `Copy of ${stored.profile.name}`.slice(0, LIMITS.nameLength) },
      { onSuccess: ({ id }) => void navigate(`?profile=${encodeURIComponent(id)}`) },
    );
  const state = editor.saving ? 'saving' : editor.unsaved ? 'not saved yet' : stored.builtIn ? 'built in' : 'saved';

  return (
    <Sheet
      title="File profiles"
      titleBlock={
        <TitleBlock
          action={
            editable ? (
              <Button
                kind="main"
                wide
                disabled={!editor.unsaved}
                busy={editor.saving ? 'Saving' : ''}
                onClick={editor.save}
              >
                Save the file profile
              </Button>
            ) : mayEdit ? (
              <Button kind="main" wide busy={copy.isPending ? 'Copying' : ''} onClick={makeCopy}>
                Copy this profile
              </Button>
            ) : undefined
          }
          actionNote={
            editable
              ? 'holds for downloads from now on'
              : mayEdit
                ? 'then change the copy'
                : 'Programmers and the owner change file profiles'
          }
        >
          <TitleCell label="Shop">{shopName}</TitleCell>
          <TitleCell label="File profile" main>
            {editor.entered.name || 'no name'}
          </TitleCell>
          <TitleCell label="Saved">
            <span role="status">{state}</span>
          </TitleCell>
        </TitleBlock>
      }
    >
      <div className="grid gap-x-10 gap-y-4 md:grid-cols-[14rem_minmax(0,1fr)] xl:grid-cols-[16rem_minmax(0,26rem)_minmax(0,32rem)]">
        {list}
        <div>
          {failed && (
            <Notice level="stop" word="Not saved" live>
              {sayError(failed)}
            </Notice>
          )}
          {editable ? (
            <ProfileForm profile={editor.entered} onProfile={editor.enter} wrong={editor.wrong} />
          ) : (
            <Section heading={stored.profile.name} aside={stored.builtIn ? 'built in, cannot be changed' : undefined}>
              <ProfileReading profile={stored.profile} />
            </Section>
          )}
          {editable && (
            <div className="flex flex-wrap gap-3">
              <Button disabled={!editor.unsaved} onClick={editor.discard}>
                Back to what is saved
              </Button>
              <Button busy={copy.isPending ? 'Copying' : ''} onClick={makeCopy} disabled={editor.unsaved}>
                Copy
              </Button>
              <Button onClick={() => setDeleting(true)}>Delete</Button>
            </div>
          )}
        </div>
        <div className="md:col-start-2 xl:col-start-auto">
          <Section heading="Layers it gives" aside="of all lines that a frame can have">
            <LayerExample profile={editor.entered} />
          </Section>
        </div>
      </div>
      {deleting && (
        <DeleteProfileDialog
          stored={stored}
          onClose={() => setDeleting(false)}
          onDeleted={() => void navigate('/profiles', { replace: true })}
        />
      )}
      <LeaveUnsavedDialog name={stored.profile.name} unsaved={editable && editor.unsaved} />
    </Sheet>
  );
}
