import { Section } from '../../../ui/section.tsx';
import { useEditor } from '../model/desk.ts';
import { Entry } from './entry.tsx';
import { LightsUp } from './lights-up.tsx';

const MEMBERS = [
  { path: 'outline.stiles.left', label: 'Left stile', feature: 'stile-left' },
  { path: 'outline.stiles.right', label: 'Right stile', feature: 'stile-right' },
  { path: 'outline.rails.top', label: 'Top rail', feature: 'rail-top' },
  { path: 'outline.rails.bottom', label: 'Bottom rail', feature: 'rail-bottom' },
] as const;

/** Widths of the outer stiles and rails. A traced outline has none. */
export function MembersSection() {
  const traced = useEditor((s) => s.history.present.outline.kind === 'traced');
  if (traced) return null;
  return (
    <Section heading="Members">
      {MEMBERS.map(({ path, label, feature }) => (
        <LightsUp key={path} of={() => [feature]}>
          <Entry path={path} label={label} />
        </LightsUp>
      ))}
      <Entry path="outline.feet" label="Feet" />
    </Section>
  );
}
