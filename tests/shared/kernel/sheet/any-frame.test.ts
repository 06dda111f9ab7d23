import fc from 'fast-check';
import { expect, test } from 'vitest';
import type { Cutter } from '#shared/kernel/cutters/cutter.ts';
import type { Particulars } from '#shared/kernel/particulars/particulars.ts';
import { describeSheet } from '#shared/kernel/sheet/describe-sheet.ts';
import { layOutDrawing } from '#shared/kernel/sheet/lay-out-drawing.ts';
import { workFrame } from '#shared/kernel/work-frame.ts';
import { dado, workedExample } from '../../../builders/worked-example.ts';
import { sheetContext } from './sheet-frames.ts';

const length = fc.double({ min: 0.01, max: 400, noNaN: true });
// Depths that round to one layer name clash, which describeSheet refuses by name; that is not what is looked for here.
const depth = fc.constantFrom(0.125, 0.25, 0.5, 2);
const some = fc.double({ min: 0.01, max: 3, noNaN: true });

const cutter: fc.Arbitrary<Cutter> = fc.oneof(
  fc.record({ kind: fc.constant('straight' as const), diameter: some, fluteLength: some, maxPass: some }),
  fc.record({
    kind: fc.constant('vee' as const),
    includedAngle: fc.double({ min: 5, max: 170, noNaN: true }),
    fluteLength: some,
  }),
  fc.record({
    kind: fc.constant('tapered' as const),
    tipRadius: some,
    sideAngle: fc.double({ min: 0.1, max: 45, noNaN: true }),
    fluteLength: some,
  }),
  fc.record({ kind: fc.constant('beading' as const), profileRadius: some, tipFlat: some, fluteLength: some }),
);

/** Particulars that a form takes, whatever they make of a frame: most of them have stops. */
const particulars: fc.Arbitrary<Particulars> = fc
  .record({
    unit: fc.constantFrom('in' as const, 'mm' as const),
    thickness: some,
    width: length,
    height: length,
    stile: some,
    feet: fc.oneof(fc.constant(0), length),
    arch: fc.oneof(fc.constant(0), some),
    columns: fc.integer({ min: 1, max: 5 }),
    dados: fc.array(fc.record({ at: length, panel: some, depth, from: length, to: length, clearance: some }), {
      maxLength: 6,
    }),
    flip: fc.constantFrom('side-to-side' as const, 'end-over-end' as const),
    squaring: fc.constantFrom('two-edges' as const, 'all-edges' as const),
    trim: some,
    allowance: some,
    spoilboard: fc.oneof(fc.constant(0), some),
    cutters: fc.record({ dado: cutter, squaring: cutter, opening: cutter, perimeter: cutter }),
    sizeHeldAt: fc.constantFrom('face' as const, 'back' as const),
    blank: fc.option(fc.record({ width: length, height: length }), { nil: undefined }),
  })
  .map((r) =>
    workedExample({
      unit: r.unit,
      thickness: r.thickness,
      outline: {
        kind: 'members',
        width: r.width,
        height: r.height,
        stiles: { left: r.stile, right: r.stile },
        rails: { top: r.stile, bottom: r.stile },
        feet: r.feet,
        layout: {
          columns: Array.from({ length: r.columns }, (_, i) => ({ opening: { label: `Nr ${i}`, arch: r.arch } })),
          between: r.stile,
        },
      },
      edge: { style: 'square', sizeHeldAt: r.sizeHeldAt },
      dados: r.dados.map((d, i) =>
        dado({ ...d, part: `Part ${i}`, runs: i % 2 ? 'vertical' : 'horizontal', to: d.from + d.to }),
      ),
      setup: { flip: r.flip, squaring: r.squaring, trim: r.trim, allowance: r.allowance, spoilboard: r.spoilboard },
      cutters: r.cutters,
      blank: r.blank,
    }),
  );

test('For whatever a form takes there is a sheet, with drawings that can be laid out and no number that is none', () => {
  fc.assert(
    fc.property(particulars, (p) => {
      const sheet = describeSheet(workFrame(p), sheetContext({ revision: '', proof: null }));
      for (const block of sheet.pages.flatMap((page) => page.blocks)) {
        const shapes =
          block.kind === 'drawing'
            ? layOutDrawing(block.drawing, { width: 186, height: 120 }).picture.shapes
            : block.kind === 'pictures'
              ? block.pictures.flatMap((picture) => picture.picture.shapes)
              : [];
        for (const shape of shapes)
          expect(shape.kind === 'path' ? shape.d : `${shape.x} ${shape.y}`).not.toMatch(/NaN|Infinity|e-/);
      }
      expect(sheet.pages.map((page) => page.id)).toEqual(['back', 'turn', 'front', 'cutters']);
    }),
    { numRuns: 200 },
  );
});
