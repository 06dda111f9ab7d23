import type { TracedDrawing, TraceProblem } from '#shared/kernel/tracing/traced-drawing.ts';
import { formatDecimal } from '#shared/kernel/units/format-length.ts';
import type { Unit } from '#shared/kernel/units/unit.ts';
import { Button } from '../../ui/button.tsx';
import { classNames } from '../../ui/class-names.ts';
import { plural } from '../../ui/plural.ts';
import { Section } from '../../ui/section.tsx';
import { problemLook } from './model/words.ts';

interface ProblemsListProps {
  readonly problems: readonly TraceProblem[];
  readonly origin: TracedDrawing['origin'];
  /** null before it is chosen: places are then told without it. */
  readonly unit: Unit | null;
  readonly counts: TracedDrawing['counts'];
  readonly pinned: number | null;
  readonly onShow: (place: number) => void;
}

const BORDERS = { stop: 'border-stop', caution: 'border-caution', note: 'border-ink' } as const;
const COLOURS = { stop: 'text-stop', caution: 'text-caution', note: 'text-ink' } as const;

/** What was done to the lines that no single place shows; '' when nothing was. */
function countWords(counts: TracedDrawing['counts']): string {
  if (counts === null) return '';
  const said = [
    counts.duplicates > 0 && `${plural(counts.duplicates, 'line')} drawn twice left out`,
    counts.overlaps > 0 && `${plural(counts.overlaps, 'piece')} along another line left out`,
    counts.slivers > 0 && `${plural(counts.slivers, 'sliver')} left out`,
    counts.tJunctions > 0 && `lines cut at ${plural(counts.tJunctions, 'T-junction')}`,
    counts.gapsClosed > 0 && `${plural(counts.gapsClosed, 'gap')} closed`,
    counts.arcsRecognised > 0 && `${plural(counts.arcsRecognised, 'arc')} made of short lines`,
  ].filter((part) => part !== false);
  return said.join(', ');
}

/** Digits of a place: to find it in the program that the drawing came from. */
const PLACE_DIGITS = 3;

/** Where it is in the drawing's own coordinates. */
function sayPlace([x, y]: readonly [number, number], origin: TracedDrawing['origin'], unit: Unit | null): string {
  const say = (value: number) => formatDecimal(value, PLACE_DIGITS);
  return `At ${say(x + origin[0])}, ${say(y + origin[1])}${unit === null ? '' : ` ${unit}`}.`;
}

/** What a person should know of the drawing, by the numbers that stand on it. */
export function ProblemsList({ problems, origin, unit, counts, pinned, onShow }: ProblemsListProps) {
  const done = countWords(counts);
  return (
    <Section heading="What was found" aside={String(problems.length)}>
      {done !== '' && <p className="mb-1.5 text-12 first-letter:uppercase">{done}.</p>}
      {problems.length === 0 ? (
        <p className="text-12 text-pencil">Nothing that needs a look.</p>
      ) : (
        <ol aria-label="What was found" tabIndex={0} className="max-h-72 overflow-y-auto">
          {problems.map(({ code, message, line, at }, i) => {
            const { level, word } = problemLook(code);
            return (
              <li
                key={i}
                className={classNames(
                  'mb-1 flex items-baseline gap-2 border-l-4 py-0.5 pl-2',
                  BORDERS[level],
                  i === pinned && 'bg-board-light',
                )}
              >
                <span className="min-w-0 flex-1 text-12 wrap-anywhere">
                  <span className="text-pencil">{i + 1} </span>
                  <strong className={COLOURS[level]}>{word}: </strong>
                  {message}
                  {at !== undefined && <span className="text-pencil"> {sayPlace(at, origin, unit)}</span>}
                  {line !== undefined && <span className="text-pencil"> Line {line} of the file.</span>}
                </span>
                {at !== undefined && (
                  <Button kind="quiet" aria-label={`Show ${i + 1} on the drawing`} onClick={() => onShow(i)}>
                    Show
                  </Button>
                )}
              </li>
            );
          })}
        </ol>
      )}
    </Section>
  );
}
