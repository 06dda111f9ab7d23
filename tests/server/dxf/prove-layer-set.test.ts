import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { buildDrawing } from '#shared/kernel/drawing/build-drawing.ts';
import type { LineSet, Shape } from '#shared/kernel/line-sets/line-set.ts';
import type { FileProfile } from '#shared/kernel/profiles/file-profile.ts';
import { workFrame } from '#shared/kernel/work-frame.ts';
import type { WorkedFrame } from '#shared/kernel/worked-frame.ts';
import { proveLayerSet, type DxfPair } from '../../../server/dxf/prove-layer-set.ts';
import { writeDxf } from '../../../server/dxf/write-dxf.ts';
import { arbitraryFrame } from '../../builders/arbitrary-frame.ts';
import { lineSet } from '../../builders/line-sets.ts';
import { workedExample } from '../../builders/worked-example.ts';
import { SITUATIONS } from './situations.ts';
import { AXIS_ONLY, R12, R2007 } from './written-files.ts';

const filesOf = (worked: WorkedFrame, profile: FileProfile): DxfPair => ({
  back: writeDxf(buildDrawing(worked, 'back', profile), profile.flavour),
  front: writeDxf(buildDrawing(worked, 'front', profile), profile.flavour),
});

const failedIn = (worked: WorkedFrame, profile: FileProfile, files: DxfPair): string[] => {
  const proof = proveLayerSet(worked, profile, files);
  const failed = proof.checks.filter((c) => !c.ok).map((c) => c.name);
  expect(proof.ok).toBe(failed.length === 0);
  return failed;
};

const situation = (name: string): WorkedFrame => workFrame(SITUATIONS.find((s) => s.name === name)!.particulars);
/** With arcs and climbing lines on the front. */
const arched = situation('an arched opening');
/** Not the same from left and right, so that a mirrored back cannot pass for a right one. */
const lopsided = situation('dados of two depths, sharp cutter');

describe.each(SITUATIONS)('When the files of a frame are as written ($name)', ({ particulars }) => {
  const worked = workFrame(particulars);
  const other = particulars.unit === 'in' ? 'mm' : 'in';
  test.each<[string, FileProfile]>([
    ['R2007', R2007],
    ['R12', R12],
    ['axis lines only', AXIS_ONLY],
    [
      'labels, frame origin, other unit, four decimals',
      { ...R2007, labels: true, origin: 'frame', unit: other, decimals: 4 },
    ],
    ['the same as R12', { ...R12, labels: true, origin: 'frame', unit: other, decimals: 5 }],
  ])('then they pass: %s', (_, profile) => {
    expect(failedIn(worked, profile, filesOf(worked, profile))).toEqual([]);
  });
});

test('When a sharp cutter runs on the line itself, then both layers of the cut may lie on each other', () => {
  const { setup, cutters } = workedExample();
  const particulars = workedExample({
    edge: { style: 'square', sizeHeldAt: 'back' },
    setup: { ...setup, spoilboard: 0 },
    cutters: { ...cutters, opening: { kind: 'vee', includedAngle: 60, fluteLength: 3 } },
  });
  const worked = workFrame(particulars);
  const placesOn = (name: LineSet['set']) =>
    lineSet(worked.front, name).shapes.map((s) => (s.kind === 'contour' ? s.contour.vertices : []));
  expect(placesOn('OPENING_AXIS')).toEqual(placesOn('OPENING'));
  expect(failedIn(worked, R2007, filesOf(worked, R2007))).toEqual([]);
});

test('When frames of all kinds are written in profiles of all kinds, then all that may be released pass', () => {
  const profile = fc.record({
    flavour: fc.constantFrom('R2007', 'R12'),
    unit: fc.constantFrom('as drawn', 'mm'),
    decimals: fc.constantFrom(4, 5, 6),
    origin: fc.constantFrom('pins', 'frame'),
    openingLines: fc.constantFrom('entered', 'axis', 'both'),
    labels: fc.boolean(),
  });
  let released = 0;
  fc.assert(
    fc.property(arbitraryFrame, profile, (particulars, changes) => {
      const worked = workFrame(particulars);
      if (worked.findings.some((f) => f.level === 'stop')) return;
      released++;
      const asked = { ...R2007, ...changes } as FileProfile;
      expect(failedIn(worked, asked, filesOf(worked, asked))).toEqual([]);
    }),
    { numRuns: 60 },
  );
  expect(released).toBeGreaterThan(5);
});

type Tags = [code: string, value: string][];

function edit(text: string, change: (tags: Tags) => void): string {
  const lines = text.split('\n');
  const tags: Tags = Array.from({ length: Math.floor(lines.length / 2) }, (_, i) => [lines[2 * i]!, lines[2 * i + 1]!]);
  change(tags);
  const edited = `${tags.map((t) => t.join('\n')).join('\n')}\n`;
  expect(edited).not.toBe(text);
  return edited;
}

const inEntities = (tags: Tags) => tags.findIndex(([, value]) => value === 'ENTITIES');

/** Index of the nth tag of a code within ENTITIES that suits. */
function find(tags: Tags, code: number, nth = 0, suits = (_value: string) => true): number {
  const found = tags.flatMap(([c, value], i) =>
    i > inEntities(tags) && c === String(code) && suits(value) ? [i] : [],
  );
  expect(found.length).toBeGreaterThan(nth);
  return found[nth]!;
}

const nudge = (code: number, nth: number, by: number, suits?: (value: string) => boolean) => (tags: Tags) => {
  const tag = tags[find(tags, code, nth, suits)]!;
  tag[1] = (Number(tag[1]) + by).toFixed(6);
};

const set = (code: number, nth: number, value: string, suits?: (value: string) => boolean) => (tags: Tags) => {
  tags[find(tags, code, nth, suits)]![1] = value;
};

const setHeader = (name: string, code: number, value: string) => (tags: Tags) => {
  const at = tags.findIndex(([, v]) => v === name);
  tags[tags.findIndex(([c], i) => i > at && c === String(code))]![1] = value;
};

/** From the first entity of this kind to the next one. */
function entitySpan(tags: Tags, kinds: readonly string[]): [from: number, to: number] {
  const from = find(tags, 0, 0, (v) => kinds.includes(v));
  const to = tags.findIndex(([code, value], i) => i > from && code === '0' && !['VERTEX', 'SEQEND'].includes(value));
  return [from, to];
}

const LINES = ['LWPOLYLINE', 'POLYLINE'];
const dropLine = (tags: Tags) => {
  const [from, to] = entitySpan(tags, LINES);
  tags.splice(from, to - from);
};
const doubleLine = (tags: Tags) => {
  const [from, to] = entitySpan(tags, LINES);
  tags.splice(to, 0, ...tags.slice(from, to));
};

/** R2007 names the layer's colour, 256, on each line; R12 names none. */
const ownColour = (tags: Tags) => {
  const at = find(tags, 8) + 1;
  const named = tags.findIndex(([code], i) => i > at && code === '62');
  tags.splice(named === -1 ? at : named, named === -1 ? 0 : 1, ['62', '3']);
};

/** x becomes 35.5 − x, so that the board lies as it is seen from the other side. */
const mirror = (tags: Tags) => {
  for (const tag of tags.slice(inEntities(tags))) if (tag[0] === '10') tag[1] = (35.5 - Number(tag[1])).toFixed(6);
};

describe.each<[string, FileProfile]>([
  ['R2007', R2007],
  ['R12', R12],
])('When a file is tampered with (%s), then its proof fails', (_, profile) => {
  const isNotNull = (v: string) => Number(v) !== 0;
  const good = filesOf(arched, profile);

  test.each<[string, 'back' | 'front', (tags: Tags) => void, string]>([
    ['a vertex moved by two hundred-thousandths', 'front', nudge(10, 1, 0.00002), 'front: places of vertices'],
    ['a vertex moved that is the lowest', 'back', nudge(20, 3, -60), 'back: extents of the lines'],
    ['a bulge changed', 'front', nudge(42, 0, 0.00001, isNotNull), 'front: bulges of arcs'],
    ['a bulge turned round', 'front', nudge(42, 0, -0.43, isNotNull), 'front: bulges of arcs'],
    [
      'a line on another layer',
      'back',
      set(8, 0, 'BACK_BLANK'),
      profile === R12 ? 'back: read back' : 'back: lines on each layer',
    ],
    ['a line on layer 0', 'back', set(8, 0, '0'), profile === R12 ? 'back: read back' : 'back: lines on each layer'],
    ['a closed line opened', 'back', set(70, 0, '0', (v) => v === '1'), 'back: open or closed, number of vertices'],
    ['a climbing line made flat', 'front', set(70, 0, '0', (v) => v === '8'), 'front: lines on each layer'],
    ['a climbing line less deep', 'front', nudge(30, 0, 0.1, (v) => Number(v) < 0), 'front: depths of climbing lines'],
    ['a vertex of a climbing line without its flag', 'front', set(70, 0, '0', (v) => v === '32'), 'front: read back'],
    ['a line missing', 'front', dropLine, 'front: lines on each layer'],
    ['a line twice', 'front', doubleLine, 'front: lines that lie twice'],
    ['a file in another unit', 'back', setHeader('$INSUNITS', 70, '4'), 'back: unit'],
    ['a file in another measurement', 'front', setHeader('$MEASUREMENT', 70, '1'), 'front: unit'],
    ['another version', 'front', setHeader('$ACADVER', 1, 'AC1015'), 'front: flavour'],
    ['an extent of the header', 'front', setHeader('$EXTMAX', 10, '99.000000'), 'front: extents in the header'],
    ['a limit of the header', 'back', setHeader('$LIMMIN', 20, '-1.000000'), 'back: extents in the header'],
    [
      'a layer of another colour',
      'back',
      (tags) => void (tags[tags.findIndex(([c, v]) => c === '62' && v === '1')]![1] = '2'),
      'back: layers and colours',
    ],
    ['a line with a colour of its own', 'back', ownColour, 'back: lines off the plane or with a colour of their own'],
    ['a mirrored back', 'back', mirror, 'back turned over: squared edges on the pins'],
    [
      'a circle added',
      'back',
      (tags) =>
        void tags.splice(
          find(tags, 0),
          0,
          ['0', 'CIRCLE'],
          ['8', 'BACK_DADO'],
          ['10', '1.0'],
          ['20', '1.0'],
          ['40', '1.0'],
        ),
      'back: read back',
    ],
    [
      'a polyline without its end',
      'front',
      (tags) =>
        void tags.splice(
          find(tags, 0, 0, (v) => v === 'SEQEND'),
          1,
        ),
      'front: read back',
    ],
  ])('%s', (_what, face, change, check) => {
    expect(failedIn(arched, profile, { ...good, [face]: edit(good[face], change) })).toContain(check);
  });

  test('a file cut short', () => {
    expect(failedIn(arched, profile, { ...good, back: good.back.slice(0, -200) })).toContain('back: read back');
  });

  test('the files of the two faces exchanged', () => {
    expect(failedIn(arched, profile, { back: good.front, front: good.back })).toContain('back: layers and colours');
  });

  test('the files of another frame', () => {
    expect(failedIn(arched, profile, filesOf(lopsided, profile))).toContain('front: places of vertices');
  });
});

/** A frame whose back was worked out wrongly: intended and written lines agree, only the turn can tell. */
function withBack(worked: WorkedFrame, change: (shape: Shape, set: LineSet) => Shape): WorkedFrame {
  const lineSets = worked.back.lineSets.map((s) => ({ ...s, shapes: s.shapes.map((shape) => change(shape, s)) }));
  return { ...worked, back: { ...worked.back, lineSets } };
}

const moved =
  (which: LineSet['set'], move: (x: number, y: number) => [number, number]) =>
  (shape: Shape, { set: name }: LineSet): Shape => {
    if (name !== which || shape.kind !== 'contour') return shape;
    const vertices = shape.contour.vertices.map((v) => {
      const [x, y] = move(v.x, v.y);
      return { ...v, x, y };
    });
    return { ...shape, contour: { ...shape.contour, vertices } };
  };

describe('When the kernel itself put the back in the wrong place, then the turned-over check fails', () => {
  const { maxX } = lopsided.back.board;
  const dados = 'back turned over: dados where frame view has them';
  const edges = 'back turned over: squared edges on the pins';

  test.each<[string, LineSet['set'], (x: number, y: number) => [number, number], string]>([
    ['dados mirrored', 'DADO', (x, y) => [maxX - x, y], dados],
    ['dados moved by the trim', 'DADO', (x, y) => [x + 0.25, y], dados],
    ['dados moved by five hundred-thousandths', 'DADO', (x, y) => [x, y + 0.00005], dados],
    ['squaring mirrored', 'SQUARING', (x, y) => [maxX - x, y], edges],
    ['squaring moved', 'SQUARING', (x, y) => [x, y + 0.001], edges],
  ])('%s', (_, name, move, check) => {
    const wrong = withBack(lopsided, moved(name, move));
    expect(failedIn(wrong, R2007, filesOf(wrong, R2007))).toEqual([check]);
  });

  test('a dado of the wrong depth', () => {
    const lineSets = lopsided.back.lineSets.map((s) =>
      s.set === 'DADO' && s.depth === 0.375 ? { ...s, depth: 0.5 } : s,
    );
    const wrong = { ...lopsided, back: { ...lopsided.back, lineSets } };
    expect(failedIn(wrong, R2007, filesOf(wrong, R2007))).toEqual([dados]);
  });

  test('an opening moved on the front', () => {
    const shift = moved('OPENING', (x, y) => [x + 0.01, y]);
    const lineSets = arched.front.lineSets.map((s) => ({ ...s, shapes: s.shapes.map((shape) => shift(shape, s)) }));
    const wrong = { ...arched, front: { ...arched.front, lineSets } };
    expect(failedIn(wrong, R2007, filesOf(wrong, R2007))).toEqual(['front: openings where frame view has them']);
  });
});
