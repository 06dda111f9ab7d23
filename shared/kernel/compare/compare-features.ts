import type { Contour, Extents } from '../contour/contour.ts';
import { contourArea } from '../contour/contour-area.ts';
import type { FeatureId, Member, Opening } from '../frame/members.ts';
import type { ComparedDado, ComparedState } from './compared-state.ts';
import { compareLines } from './compare-lines.ts';
import type { FeatureChange, LineChange, NumberChange, WordChange } from './comparison.ts';
import { matchPairs, overlapShare, type Matched } from './match-pairs.ts';
import { LABEL_WORTH, LEAST_OVERLAP } from './compare-tolerances.ts';

type Numbers = readonly (readonly [name: string, was: number, is: number, measure?: NumberChange['measure']])[];
type Words = readonly (readonly [name: string, was: string, is: string])[];

interface Thing {
  readonly id: FeatureId;
  readonly extents: Extents;
}

const place = ({ id, extents }: Thing) => ({ id, extents });

const differing = (numbers: Numbers, within: number): NumberChange[] =>
  numbers
    .filter(([, was, is]) => Math.abs(is - was) > within)
    .map(([name, was, is, measure = 'length']) => ({ name, measure, was, is }));

const reworded = (words: Words): WordChange[] =>
  words.filter(([, was, is]) => was !== is).map(([name, was, is]) => ({ name, was, is }));

/** One list for what changed, what came and what went. */
function listed<T extends Thing>(
  kind: FeatureChange['kind'],
  { pairs, gone, came }: Matched<T>,
  label: (thing: T) => string,
  compare: (a: T, b: T) => { numbers: NumberChange[]; words: WordChange[]; line: LineChange | null },
): FeatureChange[] {
  const changes: FeatureChange[] = [];
  for (const [a, b] of pairs) {
    const { numbers, words, line } = compare(a, b);
    if (numbers.length > 0 || words.length > 0 || line !== null)
      changes.push({ kind, label: label(b), before: place(a), after: place(b), numbers, words, line });
  }
  const alone = { kind, numbers: [], words: [], line: null };
  for (const b of came) changes.push({ ...alone, label: label(b), before: null, after: place(b) });
  for (const a of gone) changes.push({ ...alone, label: label(a), before: place(a), after: null });
  return changes;
}

const byOverlap = (a: Thing, b: Thing): number | undefined => {
  const share = overlapShare(a.extents, b.extents);
  return share >= LEAST_OVERLAP ? share : undefined;
};

const places = (a: Thing, b: Thing): Numbers => [
  ['from left', a.extents.minX, b.extents.minX],
  ['from bottom', a.extents.minY, b.extents.minY],
];

const isUprightRectangle = ({ vertices }: Contour): boolean =>
  vertices.length === 4 &&
  vertices.every((v, i) => {
    const next = vertices[(i + 1) % 4]!;
    return v.bulge === 0 && (v.x === next.x || v.y === next.y);
  });

/** The outer line, by its size, and by its shape where that is more than a rectangle. */
export function comparePerimeters(before: ComparedState, after: ComparedState, within: number): FeatureChange[] {
  const thing = (state: ComparedState): Thing => ({
    id: 'perimeter',
    extents: { minX: 0, minY: 0, maxX: state.width, maxY: state.height },
  });
  const shaped = !(isUprightRectangle(before.perimeter) && isUprightRectangle(after.perimeter));
  return listed(
    'perimeter',
    { pairs: [[thing(before), thing(after)]], gone: [], came: [] },
    () => 'Perimeter',
    () => ({
      numbers: differing(
        [
          ['width', before.width, after.width],
          ['height', before.height, after.height],
        ],
        within,
      ),
      words: [],
      line: shaped ? compareLines(before.perimeter, after.perimeter, within) : null,
    }),
  );
}

/** Openings by greatest overlap, the label deciding between equals; what is left by label and size, for one that moved clear of its place. */
export function compareOpenings(before: ComparedState, after: ComparedState, within: number): FeatureChange[] {
  const traced = before.outline === 'traced' || after.outline === 'traced';
  const overlapThenLabel = (a: Opening, b: Opening) => {
    const share = byOverlap(a, b);
    return share === undefined ? undefined : share + (a.label === b.label ? LABEL_WORTH : 0);
  };
  const sameButPlace = (a: Opening, b: Opening) =>
    a.label === b.label && Math.abs(a.width - b.width) <= within && Math.abs(a.height - b.height) <= within
      ? 1
      : undefined;
  const edge = ({ square }: Opening) => (square ? 'square' : 'as the frame’s');
  return listed(
    'opening',
    matchPairs(before.openings, after.openings, [overlapThenLabel, sameButPlace]),
    ({ label }) => `Opening ${label}`,
    (a, b) => {
      const line = traced ? compareLines(a.contour, b.contour, within) : null;
      // The area of a shape that stayed differs by rounding alone, which grows with its size.
      const area: Numbers = line === null ? [] : [['area', contourArea(a.contour), contourArea(b.contour), 'area']];
      return {
        numbers: differing(
          [
            ['width', a.width, b.width],
            ['height', a.height, b.height],
            ['arch', a.arch, b.arch],
            ...places(a, b),
            ...area,
          ],
          within,
        ),
        words: reworded([
          ['label', a.label, b.label],
          ['edge', edge(a), edge(b)],
        ]),
        line,
      };
    },
  );
}

/** Dados by part name and overlap, then by name alone, then those renamed in their place. Numbers are the entered ones. */
export function compareDados(before: ComparedState, after: ComparedState, within: number): FeatureChange[] {
  const alike = (a: ComparedDado, b: ComparedDado) => a.part === b.part && a.entered.runs === b.entered.runs;
  const reach = (a: ComparedDado, b: ComparedDado) => -Math.abs(a.entered.at - b.entered.at);
  return listed(
    'dado',
    matchPairs(before.dados, after.dados, [
      (a, b) => (alike(a, b) ? byOverlap(a, b) : undefined),
      (a, b) => (alike(a, b) ? reach(a, b) : undefined),
      (a, b) => (a.entered.runs === b.entered.runs ? byOverlap(a, b) : undefined),
    ]),
    ({ part }) => `Dado ${part}`,
    ({ entered: a }, { entered: b }) => ({
      numbers: differing(
        [
          [b.runs === 'vertical' ? 'from left' : 'from bottom', a.at, b.at],
          ['panel', a.panel, b.panel],
          ['clearance', a.clearance, b.clearance],
          ['depth', a.depth, b.depth],
          ['from', a.from, b.from],
          ['to', a.to, b.to],
        ],
        within,
      ),
      words: reworded([
        ['part', a.part, b.part],
        ['end at “from”', a.ends[0], b.ends[0]],
        ['end at “to”', a.ends[1], b.ends[1]],
      ]),
      line: null,
    }),
  );
}

/** Members by their place in the layout tree, what is left by overlap. A traced outline has none: then there is nothing to compare. */
export function compareMembers(before: ComparedState, after: ComparedState, within: number): FeatureChange[] {
  if (before.outline === 'traced' || after.outline === 'traced') return [];
  return listed(
    'member',
    matchPairs<Member>(before.members, after.members, [
      (a, b) => (a.id === b.id && a.kind === b.kind ? 1 : undefined),
      (a, b) => (a.kind === b.kind ? byOverlap(a, b) : undefined),
    ]),
    ({ label }) => label,
    (a, b) => ({
      numbers: differing([['width', a.width, b.width], ['length', a.length, b.length], ...places(a, b)], within),
      words: [],
      line: null,
    }),
  );
}
