import { readdirSync, readFileSync } from 'node:fs';
import { join } from 'node:path';
import { describe, expect, test } from 'vitest';
import { applyRoles } from '#shared/kernel/tracing/frames/apply-roles.ts';
import type { LoopRole } from '#shared/kernel/tracing/frames/loop-role.ts';
import { contourOfVertices } from '#shared/kernel/tracing/contour-of-vertices.ts';
import { traceDrawing } from '#shared/kernel/tracing/trace-drawing.ts';
import { traceFrames } from '#shared/kernel/tracing/trace-frames.ts';
import { PLAIN_TRACE, type TracedDrawing, type TraceOptions } from '#shared/kernel/tracing/traced-drawing.ts';
import { workFrame } from '#shared/kernel/work-frame.ts';

const FOLDER = join(import.meta.dirname, '../../../../samples/tracing');
const bytesOf = (name: string): Uint8Array => readFileSync(join(FOLDER, `${name}.dxf`));

interface Expected {
  readonly options?: Partial<TraceOptions>;
  readonly confirmed?: boolean;
  /** Changes the roles that the loops were taken for. */
  readonly roles?: (drawing: TracedDrawing) => LoopRole[];
  /** Width × height of each frame, its openings, its dados. */
  readonly frames: readonly (readonly [width: number, height: number, openings: number, dados: number])[];
  /** Codes of what is said of the drawing, each once. */
  readonly says?: readonly string[];
  /** Whether it can be stiles and rails. */
  readonly members?: false;
}

/** Width (0) or height (1) of a loop's corners, to a thousandth. */
const sizeOf = ({ vertices }: TracedDrawing['loops'][number], axis: 0 | 1): number => {
  const at = vertices.map((vertex) => vertex[axis]);
  return Math.round((Math.max(...at) - Math.min(...at)) * 1000) / 1000;
};

/** As samples/tracing/README.md tells a person to take each; sizes as they were drawn. */
const SAMPLES: Record<string, Expected> = {
  clean: { frames: [[24, 30, 2, 0]] },
  'loose-lines': { frames: [[33, 30.5, 2, 0]] },
  blocks: { frames: [[440, 1000, 3, 0]] },
  'mirrored-blocks': { frames: [[800, 760, 2, 0]] },
  gaps: { options: { gap: 0.5 }, frames: [[600, 700, 2, 0]], says: ['gap-closed'] },
  duplicates: { frames: [[18, 30, 1, 0]] },
  r12: { options: { unit: 'in' }, frames: [[33, 30.5, 2, 0]], says: ['unit-not-said'] },
  'no-unit': { options: { unit: 'in' }, frames: [[42, 34.5, 3, 0]], says: ['unit-not-said'] },
  'two-frames': {
    frames: [
      [600, 760, 1, 0],
      [800, 760, 2, 0],
    ],
  },
  arches: { frames: [[980, 2100, 2, 0]] },
  splines: { frames: [[980, 900, 2, 0]], says: ['ellipse-fitted', 'spline-fitted'], members: false },
  'faceted-arch': { options: { arcs: 0.05 }, frames: [[600, 720, 1, 0]] },
  'stiles-and-rails': {
    // Board between two openings looks like one itself.
    roles: ({ loops }) => loops.map((loop) => (sizeOf(loop, 1) === 1.5 ? 'leave-out' : loop.role)),
    frames: [[24, 34, 2, 0]],
    says: ['touches-the-outline'],
  },
  dados: {
    roles: ({ loops }) =>
      loops.map((loop) => {
        const width = sizeOf(loop, 0);
        return width === 24
          ? 'perimeter'
          : width === 20.5
            ? 'opening'
            : width === 0.76 || width === 21.99
              ? 'dado'
              : 'leave-out';
      }),
    frames: [[24, 30, 1, 3]],
    says: ['crosses-itself', 'only-round-cells'],
  },
  broken: { confirmed: true, frames: [[24, 30, 1, 0]], says: ['incomplete', 'missing-number'] },
};

describe('Drawings in samples', () => {
  test('When the folder is listed, then each drawing in it stands in the table of this test', () => {
    const names = readdirSync(FOLDER).filter((name) => name.endsWith('.dxf'));
    expect(names.sort()).toEqual(
      Object.keys(SAMPLES)
        .map((name) => `${name}.dxf`)
        .sort(),
    );
  });

  test.each(Object.entries(SAMPLES))(
    'When %s is taken as its README says, then its frames have no stop',
    (name, sample) => {
      const options = { ...PLAIN_TRACE, ...sample.options };
      const drawing = traceDrawing(bytesOf(name), options);
      expect([...new Set(drawing.problems.map(({ code }) => code))].sort()).toEqual(sample.says ?? []);
      const roles = sample.roles?.(drawing) ?? drawing.loops.map(({ role }) => role);
      const { frames } = applyRoles(
        drawing.loops.map(({ vertices }) => ({ contour: contourOfVertices(vertices) })),
        roles,
        drawing.unit!,
      );
      expect(frames.map((f) => [f.width, f.height, f.outline.openings.length, f.dados.length])).toEqual(sample.frames);

      const asMembers = sample.members !== false;
      const input = { bytes: bytesOf(name), options, confirmed: sample.confirmed ?? false, roles };
      const made = traceFrames({ ...input, frames: frames.map((_, i) => ({ name: `Frame ${i + 1}`, asMembers })) });
      expect(made.map(({ outline }) => outline.kind)).toEqual(frames.map(() => (asMembers ? 'members' : 'traced')));
      for (const particulars of made)
        expect(workFrame(particulars).findings.filter(({ level }) => level === 'stop')).toEqual([]);
    },
  );

  test('When a head of short lines is not asked to be an arc, then it stays as it was drawn', () => {
    const lines = traceDrawing(bytesOf('faceted-arch'), PLAIN_TRACE);
    const arcs = traceDrawing(bytesOf('faceted-arch'), { ...PLAIN_TRACE, arcs: 0.05 });
    const count = (drawing: TracedDrawing) =>
      drawing.loops.map(({ vertices }) => vertices.length).sort((a, b) => a - b);
    expect([count(lines), count(arcs)]).toEqual([
      [4, 51],
      [4, 4],
    ]);
  });

  test('When the end of a drawing is missing, then no frame comes of it before a person confirms', () => {
    const input = { bytes: bytesOf('broken'), options: PLAIN_TRACE, roles: [], frames: [] };
    expect(() => traceFrames({ ...input, confirmed: false })).toThrow(
      expect.objectContaining({ code: 'not-confirmed' }),
    );
  });
});
