import { memo } from 'react';
import { Section } from '../../../ui/section.tsx';
import { CuttersSection } from './cutters-section.tsx';
import { EdgeSection } from './edge-section.tsx';
import { Entry } from './entry.tsx';
import { JointsSection } from './joints-section.tsx';
import { MembersSection } from './members-section.tsx';
import { OpeningsSection } from './openings-section.tsx';
import { SizeSection } from './size-section.tsx';
import { TurningSection } from './turning-section.tsx';

/** Everything a person enters for a frame, in the order in which one goes over the board. */
export const ParticularsForm = memo(function ParticularsForm() {
  return (
    <div data-fields="">
      <SizeSection />
      <MembersSection />
      <OpeningsSection />
      <EdgeSection />
      <JointsSection />
      <TurningSection />
      <CuttersSection />
      <Section heading="Name">
        <Entry path="name" label="Frame" kind="text" />
      </Section>
    </div>
  );
});
