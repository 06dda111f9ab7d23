import { formatLength } from '#shared/kernel/units/format-length.ts';
import { Section } from '../../../ui/section.tsx';
import { useEditor } from '../model/desk.ts';
import { LightsUp } from './lights-up.tsx';
import { PartRow } from './part-rows.tsx';
import { SquareEdgeEntry } from './square-edge-entry.tsx';
import { tracedPlace } from './square-edge.ts';
import { TurnIntoMembers } from './turn-into-members.tsx';

/** Openings of a traced outline, to read. */
function TracedOpenings() {
  const openings = useEditor((s) => s.lines.contours.openings);
  const unit = useEditor((s) => s.history.present.unit);
  return (
    <ol>
      {openings.map((opening) => (
        <li key={opening.id}>
          <LightsUp of={() => [opening.id]} className="border-b border-rule py-1">
            <div className="flex justify-between">
              <span>{opening.label}</span>
              <span>
                {formatLength(opening.width, unit)} × {formatLength(opening.height, unit)}
              </span>
            </div>
            <SquareEdgeEntry place={tracedPlace(opening)} />
          </LightsUp>
        </li>
      ))}
    </ol>
  );
}

/** The layout tree; by keyboard alone, each part can be labelled, sized, arched, split, joined by another and removed. */
export function OpeningsSection() {
  const traced = useEditor((s) => s.history.present.outline.kind === 'traced');
  const count = useEditor((s) => s.lines.contours.openings.length);
  return (
    <Section heading="Openings" aside={String(count)}>
      {traced ? (
        <>
          <TracedOpenings />
          <TurnIntoMembers />
        </>
      ) : (
        <PartRow field="outline.layout" />
      )}
    </Section>
  );
}
