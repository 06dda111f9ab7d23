import { describe, expect, test } from 'vitest';
import { particulars as contract } from '#shared/contracts/particulars.ts';
import type { Particulars } from '#shared/kernel/particulars/particulars.ts';
import { applyEdgePreset } from '#shared/kernel/starters/apply-edge-preset.ts';
import type { StarterId } from '#shared/kernel/starters/starter.ts';
import { STARTERS } from '#shared/kernel/starters/starters.ts';
import { usualEdgePresets } from '#shared/kernel/starters/usual-edge-presets.ts';
import type { Unit } from '#shared/kernel/units/unit.ts';
import { workFrame } from '#shared/kernel/work-frame.ts';

const UNITS: readonly Unit[] = ['in', 'mm'];
const cases = UNITS.flatMap((unit) => STARTERS.map((starter) => ({ id: starter.id, unit, starter })));

const starter = (id: StarterId) => STARTERS.find((s) => s.id === id)!;
const beaded = (unit: Unit) => usualEdgePresets(unit).find(({ edge }) => edge.style === 'beaded')!;
const openingsOf = (p: Particulars) => workFrame(p).contours.openings;

describe('When frames are begun from a starter', () => {
  test('then all seven of the list are there, each told in a line', () => {
    expect(STARTERS.map((s) => s.id)).toEqual([
      'base',
      'drawer-stack',
      'wall',
      'tall',
      'corner-pair',
      'vanity',
      'arched-bookcase',
    ]);
    for (const { name, line } of STARTERS) {
      expect(name).not.toBe('');
      expect(line).toMatch(/^[^\n]{20,160}\.$/);
    }
  });

  test.each(cases)(
    'then $id in $unit is valid, its edges square, and nothing is found but notes',
    ({ starter: s, unit }) => {
      const frames = s.frames(unit);
      expect(frames.length).toBeGreaterThan(0);
      for (const frame of frames) {
        expect(contract.parse(frame)).toEqual(frame);
        expect(frame).toMatchObject({ unit, edge: { style: 'square' } });
        expect(
          workFrame(frame)
            .findings.filter((f) => f.level !== 'note')
            .map((f) => f.text),
        ).toEqual([]);
      }
    },
  );

  test.each(cases)('then $id in $unit takes a beaded edge without a stop', ({ starter: s, unit }) => {
    for (const frame of s.frames(unit, beaded(unit))) {
      expect(contract.safeParse(frame).error).toBeUndefined();
      expect(frame.edge.style).toBe('beaded');
      const worked = workFrame(frame);
      expect(worked.front.lineSets.map((l) => l.set)).toContain('BEAD_OUTER');
      expect(worked.findings.filter((f) => f.level !== 'note').map((f) => f.text)).toEqual([]);
    }
  });

  test.each(cases)(
    'then $id in $unit has round sizes: sixteenths of an inch or whole millimetres',
    ({ starter: s, unit }) => {
      const per = unit === 'in' ? 16 : 1;
      for (const { outline } of s.frames(unit)) {
        if (outline.kind !== 'members') throw new Error('a starter has members');
        const { width, height, stiles, rails, feet } = outline;
        for (const size of [width, height, stiles.left, stiles.right, rails.top, rails.bottom, feet])
          expect(size * per).toBe(Math.round(size * per));
      }
    },
  );

  test.each(cases)('then every opening of $id in $unit has a label of its own', ({ starter: s, unit }) => {
    for (const frame of s.frames(unit)) {
      const labels = openingsOf(frame).map((o) => o.label);
      expect(new Set(labels).size).toBe(labels.length);
    }
  });

  test('then the millimetre sizes are not the inch ones converted', () => {
    const [inch] = starter('base').frames('in');
    const [metric] = starter('base').frames('mm');
    expect(workFrame(metric!).contours.width).not.toBeCloseTo(workFrame(inch!).contours.width * 25.4, 3);
  });

  test.each(UNITS)('then the corner pair in %s shows the same width of stile on both sides of the corner', (unit) => {
    // The right-hand frame’s edge, as thick as its board, hides that much of the left-hand one’s filler stile.
    const [left, right] = starter('corner-pair').frames(unit);
    if (left?.outline.kind !== 'members' || right?.outline.kind !== 'members')
      throw new Error('two frames with members');
    expect(left.outline.stiles.right - right.thickness).toBe(right.outline.stiles.left);
    expect(left.outline.stiles.right).toBeGreaterThan(left.outline.stiles.left);
    expect(left.outline.height).toBe(right.outline.height);
  });

  test.each(UNITS)('then the arched bookcase in %s has arched heads below its hidden top', (unit) => {
    const [frame] = starter('arched-bookcase').frames(unit);
    const top = frame!.dados.find((d) => d.part === 'Top')!;
    for (const opening of openingsOf(frame!)) {
      expect(opening.arch).toBeGreaterThan(0);
      expect(opening.extents.maxY).toBeLessThan(top.at);
    }
  });

  test.each(UNITS)('then the tall one in %s stands on feet, its shelf behind the middle of the mid-rail', (unit) => {
    const [frame] = starter('tall').frames(unit);
    const [upper, lower] = openingsOf(frame!);
    const shelf = frame!.dados.find((d) => d.part === 'Fixed shelf')!;
    expect(frame).toMatchObject({ outline: { feet: expect.any(Number) } });
    expect(shelf.at - lower!.extents.maxY).toBeCloseTo(upper!.extents.minY - (shelf.at + shelf.panel), 9);
    expect(workFrame(frame!).contours.perimeter.vertices).toHaveLength(8);
  });
});

describe('When an edge preset is applied', () => {
  test('then edge and its cutters change and the others stay', () => {
    const [frame] = starter('wall').frames('in');
    const made = applyEdgePreset(frame!, beaded('in'));
    expect(made.cutters).toEqual({ ...frame!.cutters, ...beaded('in').cutters });
    expect({ ...made, edge: frame!.edge, cutters: frame!.cutters }).toEqual(frame);
  });

  test('then one in the other unit is refused', () => {
    expect(() => applyEdgePreset(starter('wall').frames('in')[0]!, beaded('mm'))).toThrow(
      'edge preset: got one in mm, takes one in in',
    );
  });

  test('then the usual beaded one in inches is the specification’s example', () => {
    expect(beaded('in')).toMatchObject({
      edge: { bead: { radius: 3 / 32, drop: 0.01, quirk: 1 / 8 } },
      cutters: { bead: { tipFlat: 1 / 32 }, quirk: { diameter: 1 / 8 }, corner: { includedAngle: 30 } },
    });
  });
});
