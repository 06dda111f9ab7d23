import { BUILTIN_PROFILES } from '#shared/kernel/profiles/builtin-profiles.ts';
import type { LayoutPart, Particulars } from '#shared/kernel/particulars/particulars.ts';
import type { SheetContext } from '#shared/kernel/sheet/sheet-model.ts';
import { dado, workedExample } from '../../../builders/worked-example.ts';

/** A released sheet of the demo shop; `changes` name what matters. */
export const sheetContext = (changes: Partial<SheetContext> = {}): SheetContext => ({
  shopName: 'Tern & Alder Joinery',
  jobName: 'Fenwick Lane kitchen',
  revision: 'A',
  author: 'Ines Marlow',
  releasedAt: '2026-03-31T09:12:00.000Z',
  note: '',
  profile: BUILTIN_PROFILES[0]!.profile,
  proof: { ok: true, checks: [{ name: 'back: unit', ok: true, got: 'in', wanted: 'in' }] },
  ...changes,
});

export const flipped = (particulars: Particulars): Particulars => ({
  ...particulars,
  setup: { ...particulars.setup, flip: particulars.setup.flip === 'side-to-side' ? 'end-over-end' : 'side-to-side' },
});

const opening = (label: string, arch?: number): LayoutPart => ({ opening: { label, arch } });

/** An arched niche over two openings, on feet; a stopped bottom. */
export const archOnFeet = (): Particulars =>
  workedExample({
    name: 'Hearth arch',
    outline: {
      kind: 'members',
      width: 36,
      height: 42,
      stiles: { left: 2, right: 2 },
      rails: { top: 2.5, bottom: 1.5 },
      feet: 4,
      layout: {
        rows: [opening('Niche', 3), { columns: [opening('Left'), opening('Right')], between: 1.5, size: 9 }],
        between: 1.75,
      },
    },
    dados: [
      dado({ at: 0.5, to: 42 }),
      dado({ part: 'Right end', at: 34.75, to: 42 }),
      dado({ part: 'Shelf', runs: 'horizontal', at: 15, from: 1.25, to: 34.75, ends: ['meets', 'meets'] }),
      dado({
        part: 'Bottom',
        runs: 'horizontal',
        at: 4.75,
        from: 1.5,
        to: 34.5,
        ends: ['stopped', 'stopped'],
        depth: 0.375,
      }),
    ],
  });

/** Four by three openings, crossing dados that enclose islands. */
export const wallOfTwelve = (): Particulars =>
  workedExample({
    name: 'Larder wall',
    outline: {
      kind: 'members',
      width: 92,
      height: 46,
      stiles: { left: 1.75, right: 1.75 },
      rails: { top: 1.75, bottom: 1.75 },
      feet: 0,
      layout: {
        rows: [1, 2, 3].map((row) => ({
          columns: [1, 2, 3, 4].map((column) => opening(`R${row}C${column}`)),
          between: 1.5,
        })),
        between: 1.5,
      },
    },
    dados: [
      dado({ to: 46 }),
      dado({ part: 'Right end', at: 91, to: 46 }),
      ...[1, 2, 3].map((i) => dado({ part: `Partition ${i}`, at: 0.625 + i * 22.5625, to: 46 })),
      ...[1, 2].map((i) =>
        dado({ part: `Fixed shelf ${i}`, runs: 'horizontal', at: 15 * i, from: 1, to: 91, ends: ['meets', 'meets'] }),
      ),
    ],
  });

/** Millimetres, squared on all edges, cutters with names, numbers and passes. */
export const inMillimetres = (): Particulars => {
  const straight = {
    kind: 'straight',
    diameter: 9.5,
    fluteLength: 32,
    maxPass: 8,
    name: 'Compression 9.5',
    number: 3,
  } as const;
  return workedExample({
    name: 'Unterschrank 900',
    unit: 'mm',
    thickness: 19,
    outline: {
      kind: 'members',
      width: 900,
      height: 762,
      stiles: { left: 44, right: 44 },
      rails: { top: 44, bottom: 36 },
      feet: 0,
      layout: { columns: [opening('A'), opening('B')], between: 38 },
    },
    dados: [
      dado({ part: 'Linke Seite', at: 6.5, panel: 19, clearance: 0.3, depth: 6, to: 762 }),
      dado({ part: 'Rechte Seite', at: 874.5, panel: 19, clearance: 0.3, depth: 6, to: 762 }),
    ],
    setup: { flip: 'side-to-side', allowance: 25, trim: 12, squaring: 'all-edges', spoilboard: 0.5 },
    cutters: {
      dado: straight,
      squaring: straight,
      perimeter: straight,
      opening: { kind: 'tapered', tipRadius: 1.5, sideAngle: 1.5, fluteLength: 32, number: 7 },
    },
  });
};

/** As many openings and dados as a frame takes, with long names; with stops and cautions beyond number. */
export const fullToTheLimits = (): Particulars =>
  workedExample({
    name: 'Every opening and dado that a frame takes',
    outline: {
      kind: 'members',
      width: 94,
      height: 46,
      stiles: { left: 1.75, right: 1.75 },
      rails: { top: 1.75, bottom: 1.75 },
      feet: 0,
      layout: {
        rows: Array.from({ length: 10 }, (_, row) => ({
          columns: Array.from({ length: 10 }, (_, column) =>
            opening(`Opening with a long label, no ${row * 10 + column}`),
          ),
          between: 0.75,
        })),
        between: 0.75,
      },
    },
    dados: Array.from({ length: 100 }, (_, i) =>
      dado({
        part: `Box part with a long name, no ${i}`,
        at: 0.3 + i * 0.92,
        panel: 0.5,
        to: 46,
        depth: i % 3 === 0 ? 0.25 : 0.375,
      }),
    ),
  });
