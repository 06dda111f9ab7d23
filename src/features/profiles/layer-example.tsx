import { checkLayerTemplate } from '#shared/kernel/profiles/check-layer-template.ts';
import type { FileProfile } from '#shared/kernel/profiles/file-profile.ts';
import { classNames } from '../../ui/class-names.ts';

/** What each line set is called where people read it. */
const SET_WORDS: Record<string, string> = {
  DADO: 'Dados',
  SQUARING: 'Squaring edge',
  BLANK: 'Blank',
  BEAD_INNER: 'Bead, opening side',
  BEAD_OUTER: 'Bead, frame side',
  QUIRK: 'Quirk',
  QUIRK_CORNER: 'Quirk corners',
  OPENING: 'Openings, entered size',
  OPENING_AXIS: 'Openings, cutter axis',
  CORNER_LIFT: 'Corner lift',
  CORNER_VEE: 'Corner V',
  PERIMETER: 'Perimeter',
  LABELS: 'Labels',
};

/** Whether files of this profile hold the line set. */
function carries(profile: FileProfile, set: string): boolean {
  if (set === 'OPENING') return profile.openingLines !== 'axis';
  if (set === 'OPENING_AXIS') return profile.openingLines !== 'entered';
  if (set === 'LABELS') return profile.labels;
  return true;
}

/** The layer names that a template gives, for all line sets that a frame may have. Empty while the template is wrong. */
export function LayerExample({ profile }: { readonly profile: FileProfile }) {
  const checked = checkLayerTemplate(profile.layerTemplate);
  if (!checked.ok) return <p className="text-pencil">The names show here once the template can be read.</p>;
  const rows = checked.example
    .map(({ key, name }) => ({ face: key.split('/')[0] ?? '', set: key.split('/')[1] ?? '', name }))
    .filter(({ set }) => carries(profile, set));
  return (
    <table className="w-full border-collapse text-left">
      <caption className="sr-only">Layer names that this template gives</caption>
      <thead>
        <tr className="border-b border-ink text-11 text-pencil">
          <th scope="col" className="py-1 pr-2 font-normal">
            Face
          </th>
          <th scope="col" className="px-2 py-1 font-normal">
            Lines
          </th>
          <th scope="col" className="py-1 pl-2 font-normal">
            Layer
          </th>
        </tr>
      </thead>
      <tbody>
        {rows.map(({ face, set, name }) => (
          <tr key={`${face}/${set}`} className="border-b border-rule">
            <td className={classNames('py-1 pr-2', face === 'back' ? 'text-back' : 'text-front')}>{face}</td>
            <td className="px-2 py-1">{SET_WORDS[set]}</td>
            <td className="py-1 pl-2 font-bold wrap-anywhere">{name}</td>
          </tr>
        ))}
      </tbody>
    </table>
  );
}
