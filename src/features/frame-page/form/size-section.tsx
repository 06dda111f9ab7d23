import { UNIT_WORDS } from '#shared/kernel/units/unit.ts';
import { Length } from '../../../ui/length.tsx';
import { Section } from '../../../ui/section.tsx';
import { useEditor } from '../model/desk.ts';
import { Entry } from './entry.tsx';

function TracedSize() {
  const width = useEditor((s) => s.lines.contours.width);
  const height = useEditor((s) => s.lines.contours.height);
  const unit = useEditor((s) => s.history.present.unit);
  return (
    <p className="mb-1">
      Traced outline, <Length value={width} unit={unit} /> × <Length value={height} unit={unit} />
    </p>
  );
}

/** Width, height and thickness; a traced outline has its extents, which cannot be typed. */
export function SizeSection() {
  const unit = useEditor((s) => s.history.present.unit);
  const traced = useEditor((s) => s.history.present.outline.kind === 'traced');
  return (
    <Section heading="Size" aside={UNIT_WORDS[unit]}>
      {traced ? (
        <TracedSize />
      ) : (
        <>
          <Entry path="outline.width" label="Width" />
          <Entry path="outline.height" label="Height" />
        </>
      )}
      <Entry path="thickness" label="Board thickness" />
    </Section>
  );
}
