import { LIMITS } from '#shared/contracts/limits.ts';
import { checkLayerTemplate } from '#shared/kernel/profiles/check-layer-template.ts';
import type { FileProfile } from '#shared/kernel/profiles/file-profile.ts';
import type { FieldMessages } from '../../lib/field-messages.ts';
import { Checkbox } from '../../ui/checkbox.tsx';
import { Choice } from '../../ui/choice.tsx';
import { Section } from '../../ui/section.tsx';
import { TextField } from '../../ui/text-field.tsx';
import { FLAVOUR_WORDS, OPENING_WORDS, optionsOf, ORIGIN_WORDS, UNIT_WORDS } from './profile-words.ts';

interface ProfileFormProps {
  readonly profile: FileProfile;
  readonly onProfile: (profile: FileProfile) => void;
  readonly wrong: FieldMessages;
}

const DECIMALS: Record<'4' | '5' | '6', FileProfile['decimals']> = { '4': 4, '5': 5, '6': 6 };

/** What stands beside the template: the clash check while typing, else what the server said. */
function templateProblem(template: string, said: string | undefined): string | undefined {
  const checked = checkLayerTemplate(template);
  return checked.ok ? said : `Got “${template}”; takes ${checked.takes}.`;
}

export function ProfileForm({ profile, onProfile, wrong }: ProfileFormProps) {
  const set = <K extends keyof FileProfile>(key: K, value: FileProfile[K]) => onProfile({ ...profile, [key]: value });
  return (
    <div data-fields>
      <Section heading="Name">
        <TextField
          label="Name of the file profile"
          hideLabel
          value={profile.name}
          onValue={(value) => set('name', value)}
          error={wrong.name}
          maxLength={LIMITS.nameLength}
          autoComplete="off"
          enterMoves
        />
      </Section>
      <Section heading="Layer names">
        <TextField
          label="Template"
          value={profile.layerTemplate}
          onValue={(value) => set('layerTemplate', value)}
          error={templateProblem(profile.layerTemplate, wrong.layerTemplate)}
          hint="Takes {face}, {set}, {cutter}, {depth} (thousandths) and words of your own. Letters become capitals; at most 31 are kept."
          autoComplete="off"
          enterMoves
        />
      </Section>
      <Section heading="File">
        <Choice
          label="DXF flavour"
          options={optionsOf(FLAVOUR_WORDS)}
          value={profile.flavour}
          onValue={(value) => set('flavour', value)}
          hint="R12 for programs that read nothing newer."
        />
        <Choice
          label="Unit"
          options={optionsOf(UNIT_WORDS)}
          value={profile.unit}
          onValue={(value) => set('unit', value)}
        />
        <Choice
          label="Digits behind the point"
          options={optionsOf({ '4': '4', '5': '5', '6': '6' })}
          value={String(profile.decimals) as keyof typeof DECIMALS}
          onValue={(value) => set('decimals', DECIMALS[value])}
        />
        <Choice
          label="Where 0, 0 lies"
          options={optionsOf(ORIGIN_WORDS)}
          value={profile.origin}
          onValue={(value) => set('origin', value)}
        />
      </Section>
      <Section heading="Lines">
        <Choice
          label="Openings as"
          options={optionsOf(OPENING_WORDS)}
          value={profile.openingLines}
          onValue={(value) => set('openingLines', value)}
          hint="Both layers say the same cut: cut one, not both."
        />
        <Checkbox
          label="Labels as text"
          checked={profile.labels}
          onChecked={(checked) => set('labels', checked)}
          hint="Opening labels and part names on a layer of their own."
        />
      </Section>
    </div>
  );
}
