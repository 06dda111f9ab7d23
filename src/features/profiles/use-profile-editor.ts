import { useState } from 'react';
import { fileProfile, type StoredProfile } from '#shared/contracts/profiles.ts';
import { checkLayerTemplate } from '#shared/kernel/profiles/check-layer-template.ts';
import type { FileProfile } from '#shared/kernel/profiles/file-profile.ts';
import { checkForm } from '../../lib/check-form.ts';
import { fieldMessagesOf, type FieldMessages } from '../../lib/field-messages.ts';
import { useSaveProfile } from './api/save-profile.ts';

const same = (a: FileProfile, b: FileProfile): boolean =>
  (Object.keys(a) as (keyof FileProfile)[]).every((key) => a[key] === b[key]);

/** One profile being edited: what is entered, whether it differs from what is saved, and saving it. Key the caller by the profile's id. */
export function useProfileEditor(stored: StoredProfile) {
  const [entered, setEntered] = useState(stored.profile);
  const [wrong, setWrong] = useState<FieldMessages>({});
  const save = useSaveProfile();

  return {
    entered,
    wrong,
    unsaved: !same(entered, stored.profile),
    saving: save.isPending,
    error: save.error,
    enter: setEntered,
    discard: () => {
      setEntered(stored.profile);
      setWrong({});
      save.reset();
    },
    save: () => {
      const checked = checkForm(fileProfile, entered);
      setWrong(checked.ok ? {} : checked.fields);
      // A template that clashes is said beside its field already.
      if (!checked.ok || !checkLayerTemplate(checked.value.layerTemplate).ok) return;
      save.mutate(
        { profileId: stored.id, profile: checked.value },
        { onSuccess: ({ profile }) => setEntered(profile), onError: (error) => setWrong(fieldMessagesOf(error)) },
      );
    },
  };
}
