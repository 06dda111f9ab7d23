import { readdirSync, readFileSync } from 'node:fs';
import { join } from 'node:path';
import { describe, expect, test } from 'vitest';
import { parseFrameFile } from '#shared/contracts/parse-frame-file.ts';
import { contourExtents } from '#shared/kernel/contour/contour-extents.ts';
import type { Extents } from '#shared/kernel/contour/contour.ts';
import { lineSetKey, type LineSet } from '#shared/kernel/line-sets/line-set.ts';
import { workFrame } from '#shared/kernel/work-frame.ts';
import type { WorkedFrame } from '#shared/kernel/worked-frame.ts';
import { contoursIn } from '../../builders/line-sets.ts';

/** tests/cases: a folder a situation, with a frame file and what must come of it, worked out by hand. */
type Box = [minX: number, minY: number, maxX: number, maxY: number];

interface Expected {
  readonly about: string;
  readonly size?: [number, number];
  readonly blank?: [number, number];
  readonly squaredBlank?: [number, number];
  readonly squaredCorner?: [number, number];
  readonly openings?: Record<string, Box>;
  readonly bulges?: Record<string, number[]>;
  readonly perimeterCorners?: number;
  readonly backDados?: Box[];
  readonly backSquaring?: Box[];
  readonly frontOpenings?: Box[];
  /** How far the axis line lies inside the opening's line, on each side. */
  readonly axisInset?: number;
  readonly layers?: Record<string, number>;
  readonly depths?: Record<string, number>;
  readonly passes?: Record<string, number[]>;
  readonly notes?: string[];
  readonly stops?: string[];
}

const folder = join(import.meta.dirname, '../../cases');
const box = (e: Extents): Box => [e.minX, e.minY, e.maxX, e.maxY];
const near = (numbers: readonly number[]) => numbers.map((n) => expect.closeTo(n, 9));
const allSets = (worked: WorkedFrame): LineSet[] => [...worked.back.lineSets, ...worked.front.lineSets];
const setOf = (worked: WorkedFrame, key: string) => allSets(worked).find((set) => lineSetKey(set) === key);
const boxesIn = (worked: WorkedFrame, key: string) =>
  contoursIn(setOf(worked, key) ? [setOf(worked, key)!] : []).map((c) => box(contourExtents(c)));

/** How each key of an expected.json is looked up in a worked frame. */
const lookUps: {
  [K in Exclude<keyof Expected, 'about'>]-?: (worked: WorkedFrame, wanted: NonNullable<Expected[K]>) => void;
} = {
  size: ({ contours }, wanted) => expect([contours.width, contours.height]).toEqual(near(wanted)),
  blank: ({ blank }, wanted) => expect(box(blank.rough)).toEqual(near([0, 0, ...wanted])),
  squaredBlank: ({ front, blank }, wanted) => {
    expect(box(blank.squared)).toEqual(near([0, 0, ...wanted]));
    expect(box(front.board)).toEqual(near([0, 0, ...wanted]));
  },
  squaredCorner: ({ blank }, wanted) => expect([blank.squaredCorner.x, blank.squaredCorner.y]).toEqual(near(wanted)),
  openings: ({ contours }, wanted) => {
    expect(Object.fromEntries(contours.openings.map((o) => [o.label, box(o.extents)]))).toEqual(
      Object.fromEntries(Object.entries(wanted).map(([label, extents]) => [label, near(extents)])),
    );
  },
  bulges: ({ contours }, wanted) => {
    for (const [label, bulges] of Object.entries(wanted)) {
      const opening = contours.openings.find((o) => o.label === label);
      expect(opening?.contour.vertices.map((v) => v.bulge).filter((b) => b !== 0)).toEqual(near(bulges));
    }
  },
  perimeterCorners: ({ contours }, wanted) => expect(contours.perimeter.vertices).toHaveLength(wanted),
  backDados: (worked, wanted) => expect(boxesIn(worked, 'back/DADO')).toEqual(wanted.map(near)),
  backSquaring: (worked, wanted) => expect(boxesIn(worked, 'back/SQUARING')).toEqual(wanted.map(near)),
  frontOpenings: (worked, wanted) => expect(boxesIn(worked, 'front/OPENING')).toEqual(wanted.map(near)),
  axisInset: (worked, wanted) => {
    const [entered, axis] = [boxesIn(worked, 'front/OPENING'), boxesIn(worked, 'front/OPENING_AXIS')];
    expect(axis).toEqual(entered.map(([a, b, c, d]) => near([a + wanted, b + wanted, c - wanted, d - wanted])));
  },
  layers: (worked, wanted) =>
    expect(Object.fromEntries(allSets(worked).map((s) => [lineSetKey(s), s.shapes.length]))).toEqual(wanted),
  depths: (worked, wanted) => {
    for (const [key, depth] of Object.entries(wanted)) expect(setOf(worked, key)?.depth, key).toBeCloseTo(depth, 9);
  },
  passes: (worked, wanted) => {
    for (const [key, passes] of Object.entries(wanted)) expect(setOf(worked, key)?.passes).toEqual(near(passes));
  },
  notes: ({ findings }, wanted) =>
    expect(findings.filter((f) => f.level === 'note').map((f) => f.code)).toEqual(expect.arrayContaining(wanted)),
  stops: ({ findings }, wanted) => {
    const stops = findings.filter((f) => f.level === 'stop').map((f) => f.code);
    expect([...new Set(stops)].sort()).toEqual([...wanted].sort());
  },
};

const cases = readdirSync(folder, { withFileTypes: true })
  .filter((entry) => entry.isDirectory())
  .map((entry) => entry.name);

test('When the situations are listed, then there are some', () => expect(cases.length).toBeGreaterThanOrEqual(8));

describe.each(cases)('When the situation is %s', (name) => {
  const read = parseFrameFile(readFileSync(join(folder, name, 'input.frame.json'), 'utf8'));
  const expected = JSON.parse(readFileSync(join(folder, name, 'expected.json'), 'utf8')) as Expected;
  const keys = Object.keys(expected).filter((key) => key !== 'about') as (keyof typeof lookUps)[];

  test.each(keys)('then its %s is as worked out by hand', (key) => {
    if (!read.ok) throw new Error(JSON.stringify(read));
    const lookUp = lookUps[key] as (worked: WorkedFrame, wanted: unknown) => void;
    expect(lookUp, `no look-up for ${key}`).toBeTypeOf('function');
    lookUp(workFrame(read.particulars), expected[key]);
  });
});
