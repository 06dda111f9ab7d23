import { memo, useMemo } from 'react';
import { Section } from '../../../ui/section.tsx';
import { CuttersSection } from './cutters-section.tsx';
import { EdgeSection } from './edge-section.tsx';
import { useEditor } from '../model/desk.ts';
import { Entry } from './entry.tsx';
import { FormFactsProvider } from './form-facts.ts';
import { JointsSection } from './joints-section.tsx';
import { MembersSection } from './members-section.tsx';
import { OpeningsSection } from './openings-section.tsx';
import { SizeSection } from './size-section.tsx';
import { TurningSection } from './turning-section.tsx';

function NameSection() {
  return (
    <Section heading="Name">
      <Entry path="name" label="Frame" kind="text" />
    </Section>
  );
}

const SECTIONS = [SizeSection, MembersSection, OpeningsSection, EdgeSection, JointsSection, TurningSection, CuttersSection, NameSection];

/** Everything a person enters for a frame, in the order in which one goes over the board. */
export const ParticularsForm = memo(function ParticularsForm() {
  const unit = useEditor((s) => s.history.present.unit);
  const epoch = useEditor((s) => s.epoch);
  const facts = useMemo(() => ({ unit, epoch }), [unit, epoch]);
  return (
    <FormFactsProvider value={facts}>
      <div data-fields="">
        {SECTIONS.map((FormSection, i) => (
          // Sections out of sight are neither laid out nor painted: a keystroke must not wait for them.
          <div key={i} className="[contain-intrinsic-height:auto_20rem] [content-visibility:auto]">
            <FormSection />
          </div>
        ))}
      </div>
    </FormFactsProvider>
  );
});
