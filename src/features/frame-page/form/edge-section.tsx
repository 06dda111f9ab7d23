import { Section } from '../../../ui/section.tsx';
import { useEditor } from '../model/desk.ts';
import { Entry } from './entry.tsx';
import { SwitchEntry } from './switch-entry.tsx';

const FACE_OR_BACK = [
  { value: 'face', label: 'Face' },
  { value: 'back', label: 'Back' },
] as const;

const BEADED = [...FACE_OR_BACK, { value: 'bead base', label: 'Bead base' }] as const;

/** The numbers of a bead, as a frame file brings them. */
function BeadEntries() {
  return (
    <>
      <Entry path="edge.bead.radius" label="Bead radius" />
      <Entry path="edge.bead.drop" label="Below the face" />
      <Entry path="edge.bead.quirk" label="Quirk" />
    </>
  );
}

/** Where through the board the entered size of an opening is true. */
export function EdgeSection() {
  const style = useEditor((s) => s.history.present.edge.style);
  const isBeaded = style === 'beaded';
  return (
    <Section heading="Edge of the openings" aside={style}>
      {isBeaded && <BeadEntries />}
      <SwitchEntry path="edge.sizeHeldAt" label="Size held at" options={isBeaded ? BEADED : FACE_OR_BACK} whenAbsent="bead base" />
    </Section>
  );
}
