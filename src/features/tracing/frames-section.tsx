import { memo } from 'react';
import { LIMITS } from '#shared/contracts/limits.ts';
import { svgPath } from '#shared/kernel/contour/svg-path.ts';
import { contourOfVertices } from '#shared/kernel/tracing/contour-of-vertices.ts';
import type { MembersFromTraced } from '#shared/kernel/tracing/frames/members-from-traced.ts';
import type { MembersOutline, TracedOutline } from '#shared/kernel/particulars/particulars.ts';
import { formatLength } from '#shared/kernel/units/format-length.ts';
import type { Unit } from '#shared/kernel/units/unit.ts';
import { Checkbox } from '../../ui/checkbox.tsx';
import { plural } from '../../ui/plural.ts';
import { Section } from '../../ui/section.tsx';
import { TextField } from '../../ui/text-field.tsx';
import { sayOtherSize, saySize } from './drawing-size.ts';
import type { FramePlans } from './model/frame-plans.ts';
import { loopName } from './model/words.ts';

interface FramesSectionProps {
  readonly plans: FramePlans;
  readonly unit: Unit;
  readonly mayEdit: boolean;
  /** What is wrong with a name, by its frame's place; '' when nothing is. */
  readonly wrongName: (place: number) => string;
  readonly onName: (perimeter: number, name: string) => void;
  readonly onMembers: (perimeter: number, chosen: boolean) => void;
  readonly onChoose: (loop: number) => void;
}

/** Room around a picture, as a share of the frame's longer side, for the width of the line. */
const MARGIN = 0.03;

interface FramePictureProps {
  readonly outline: TracedOutline;
  readonly width: number;
  readonly height: number;
}

/** Drawn anew only when its outline changes. */
const FramePicture = memo(function FramePicture({ outline, width, height }: FramePictureProps) {
  const margin = MARGIN * Math.max(width, height);
  const box = [-margin, -height - margin, width + 2 * margin, height + 2 * margin];
  const openings = outline.openings.map((opening) => svgPath(contourOfVertices(opening))).join('');
  return (
    <svg viewBox={box.join(' ')} aria-hidden="true" className="h-14 w-16 shrink-0">
      <g transform="scale(1,-1)">
        <path
          d={svgPath(contourOfVertices(outline.perimeter))}
          vectorEffect="non-scaling-stroke"
          className="fill-board-light stroke-ink"
        />
        <path d={openings} vectorEffect="non-scaling-stroke" className="fill-paper stroke-front" />
      </g>
    </svg>
  );
});

function memberWords({ stiles, rails, feet }: MembersOutline, unit: Unit): string {
  const say = (length: number) => formatLength(length, unit);
  const legs = feet > 0 ? `, feet ${say(feet)}` : '';
  return `Stiles ${say(stiles.left)} and ${say(stiles.right)}, top rail ${say(rails.top)}, bottom rail ${say(rails.bottom)}${legs} ${unit}; sizes can then be typed.`;
}

const sayMembers = (members: MembersFromTraced, unit: Unit): string =>
  members.ok ? memberWords(members.outline, unit) : members.problem.message;

/** The frames that would be added, each with its name and what it is made of. */
export function FramesSection(props: FramesSectionProps) {
  const { plans, unit, mayEdit, wrongName, onName, onMembers, onChoose } = props;
  return (
    <Section heading="Frames" aside={String(plans.frames.length)}>
      {plans.frames.length === 0 && (
        <p className="text-pencil">
          No loop is a perimeter. Pick the outer line of a frame on the drawing or in the list of loops, and make it
          one.
        </p>
      )}
      <ol>
        {plans.frames.map((frame, i) => (
          <li key={frame.perimeterLoop} className="mb-3 border-b border-rule pb-2">
            <div className="mb-1.5 flex items-center gap-3">
              <FramePicture outline={frame.outline} width={frame.width} height={frame.height} />
              <div className="min-w-0 text-12">
                <button
                  type="button"
                  onClick={() => onChoose(frame.perimeterLoop)}
                  className="text-left font-bold underline decoration-pencil underline-offset-4"
                >
                  {saySize(frame.width, frame.height, unit)}
                </button>
                <span className="block text-pencil">{sayOtherSize(frame.width, frame.height, unit)}</span>
                <span className="block">
                  {plural(frame.outline.openings.length, 'opening')}, {plural(frame.dados.length, 'dado')}
                </span>
              </div>
            </div>
            <TextField
              label={`Name of frame ${i + 1}`}
              value={frame.name}
              error={wrongName(i)}
              readOnly={!mayEdit}
              maxLength={LIMITS.nameLength}
              autoComplete="off"
              enterMoves
              onValue={(name) => onName(frame.perimeterLoop, name)}
            />
            <Checkbox
              label={`Frame ${i + 1} as stiles and rails`}
              checked={frame.asMembers}
              disabled={!mayEdit || frame.members?.ok !== true}
              onChecked={(on) => onMembers(frame.perimeterLoop, on)}
              hint={frame.members ? sayMembers(frame.members, unit) : frame.takes}
            />
          </li>
        ))}
      </ol>
      {plans.problems.length > 0 && (
        <ul aria-label="Loops that fit no frame" className="text-12">
          {plans.problems.map(({ message, loop }, i) => (
            <li key={i} className="mb-1 border-l-4 border-caution py-0.5 pl-2">
              <strong className="text-caution">Caution: </strong>
              {message}
              {loop !== null && (
                <>
                  {' '}
                  <button
                    type="button"
                    onClick={() => onChoose(loop)}
                    className="min-h-6 underline decoration-pencil underline-offset-4"
                  >
                    {loopName(loop)}
                  </button>
                </>
              )}
            </li>
          ))}
        </ul>
      )}
    </Section>
  );
}
