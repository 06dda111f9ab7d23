import { formatWithUnit } from '#shared/kernel/units/format-length.ts';
import type { Unit } from '#shared/kernel/units/unit.ts';
import type { PictureFacts, Plane } from '../sweeping/picture.ts';
import type { Place } from './places.ts';
import type { Step } from './steps.ts';

interface Looked {
  readonly steps: readonly Step[];
  readonly done: number;
  readonly place: Place;
  readonly shown: 'front' | 'back' | 'both';
  readonly plane: Plane | null;
  readonly facts: PictureFacts | null;
  readonly unit: Unit;
}

const SQUARE_MM_TO_CM = 100;

/** Two digits at least: what a V-cutter leaves in a corner is a fraction of a square millimetre. */
function areaWords(area: number, unit: Unit): string {
  if (unit === 'in') return `≈${area.toFixed(area < 0.1 ? 5 : 2)} square inches`;
  const cm = area / SQUARE_MM_TO_CM;
  return cm < 1 ? `≈${area.toFixed(2)} square millimetres` : `≈${cm.toFixed(1)} square centimetres`;
}

const startSmall = (words: string): string => words.charAt(0).toLowerCase() + words.slice(1);

const piecesWords = (count: number) =>
  count === 0 ? 'Nothing has come free.' : count === 1 ? 'One piece has come free.' : `${count} pieces have come free.`;

const FACE_WORDS = {
  front: 'Seen from the front',
  back: 'Seen from the back',
  both: 'Both faces about the fold',
} as const;

/** The step that was taken last, in a sentence. */
export function stepSentence({ steps, done, facts, unit }: Pick<Looked, 'steps' | 'done' | 'facts' | 'unit'>): string {
  const step = steps[done - 1];
  if (!step) return 'The board as loaded, before any cut.';
  const area = facts?.marked[step.face][step.order];
  const marked =
    area === undefined
      ? ''
      : area === 0
        ? ' Nothing of it shows at this size: upright walls, or too small. Look closer.'
        : ` Its surfaces here: ${areaWords(area, unit)}.`;
  return `After step ${done} of ${steps.length}, ${step.face}, ${startSmall(step.words)}: ${step.detail}.${marked}`;
}

function planeWords({ runs, at }: Plane, unit: Unit): string {
  return runs === 'upright'
    ? `Cut open at an upright plane ${formatWithUnit(at, unit)} from the left edge.`
    : `Cut open at a level plane ${formatWithUnit(at, unit)} from the lower edge.`;
}

/** What the picture shows, for people who do not see it. */
export function describePart({ steps, done, place, shown, plane, facts, unit }: Looked): string {
  const sentences = [`${place.words}.`, `${FACE_WORDS[shown]}.`, stepSentence({ steps, done, facts, unit })];
  if (plane) sentences.push(planeWords(plane, unit));
  if (facts) sentences.push(piecesWords(facts.loosePieces));
  return sentences.join(' ');
}
