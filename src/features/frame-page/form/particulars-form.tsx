import { memo } from 'react';
import { Section } from '../../../ui/section.tsx';
import { CuttersSection } from './cutters-section.tsx';
import { EdgeSection } from './edge-section.tsx';
import { Entry } from './entry.tsx';
import { FrameFacts } from './frame-facts.tsx';
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

const SECTIONS = [
  SizeSection,
  MembersSection,
  OpeningsSection,
  EdgeSection,
  JointsSection,
  TurningSection,
  CuttersSection,
  NameSection,
];

/** Everything a person enters for a frame, in the order in which one goes over the board. */
export const ParticularsForm = memo(function ParticularsForm() {
  return (
    <FrameFacts>
      <div data-fields="">
        {SECTIONS.map((FormSection, i) => (
          // Sections out of sight are neither laid out nor painted: a keystroke must not wait for them.
          <div key={i} className="-mx-2 px-2 [contain-intrinsic-height:auto_20rem] [content-visibility:auto]">
            <FormSection />
          </div>
        ))}
      </div>
    </FrameFacts>
  );
});
