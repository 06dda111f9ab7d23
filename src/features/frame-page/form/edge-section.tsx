import { Section } from '../../../ui/section.tsx';
import { SwitchEntry } from './switch-entry.tsx';

const HELD_AT = [
  { value: 'face', label: 'Face' },
  { value: 'back', label: 'Back' },
] as const;

/** Square edges: where through the board the entered size of an opening is true. */
export function EdgeSection() {
  return (
    <Section heading="Edge of the openings" aside="square">
      <SwitchEntry path="edge.sizeHeldAt" label="Size held at" options={HELD_AT} />
    </Section>
  );
}
