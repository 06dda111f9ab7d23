import type { FileProfile } from '#shared/kernel/profiles/file-profile.ts';
import { FLAVOUR_WORDS, OPENING_WORDS, ORIGIN_WORDS, UNIT_WORDS } from './profile-words.ts';

/** A file profile to read: built-in ones, and all of them for people who may not change them. */
export function ProfileReading({ profile }: { readonly profile: FileProfile }) {
  const rows: [string, string][] = [
    ['DXF flavour', FLAVOUR_WORDS[profile.flavour]],
    ['Unit', UNIT_WORDS[profile.unit]],
    ['Digits behind the point', String(profile.decimals)],
    ['Where 0, 0 lies', ORIGIN_WORDS[profile.origin]],
    ['Openings as', OPENING_WORDS[profile.openingLines]],
    ['Labels as text', profile.labels ? 'Yes' : 'No'],
    ['Layer name template', profile.layerTemplate],
  ];
  return (
    <dl className="grid grid-cols-[auto_minmax(0,1fr)]">
      {rows.map(([label, value]) => (
        <div key={label} className="col-span-2 grid grid-cols-subgrid gap-x-6 border-b border-rule py-1">
          <dt className="text-pencil">{label}</dt>
          <dd className="text-right wrap-anywhere">{value}</dd>
        </div>
      ))}
    </dl>
  );
}
