import { writeFileSync } from 'node:fs';
import { workFrame } from '#shared/kernel/work-frame.ts';
import { writeFrameFile } from '#shared/contracts/write-frame-file.ts';
import type { Particulars, Dado, Cutters, LayoutPart } from '#shared/kernel/particulars/particulars.ts';

const inCutters: Cutters = {
  dado: { kind: 'straight', diameter: 0.375, fluteLength: 1.25 },
  squaring: { kind: 'straight', diameter: 0.375, fluteLength: 1.25 },
  opening: { kind: 'tapered', tipRadius: 0.0625, sideAngle: 1.5, fluteLength: 1.25 },
  perimeter: { kind: 'straight', diameter: 0.375, fluteLength: 1.25 },
};
const named: Cutters = {
  dado: { kind: 'straight', diameter: 0.375, fluteLength: 1.25, name: '3/8 compression', number: 2 },
  squaring: { kind: 'straight', diameter: 0.375, fluteLength: 1.25, maxPass: 0.5, name: '3/8 compression', number: 2 },
  opening: { kind: 'tapered', tipRadius: 0.0625, sideAngle: 1.5, fluteLength: 1.25, maxPass: 0.5, name: '1.5 degree ball-nose taper', number: 5 },
  perimeter: { kind: 'straight', diameter: 0.375, fluteLength: 1.25, maxPass: 0.5, name: '3/8 compression', number: 2 },
};
const inSetup = { flip: 'side-to-side', allowance: 1, trim: 0.25, squaring: 'two-edges', spoilboard: 0.02 } as const;
const v = (part: string, at: number, from: number, to: number, ends: Dado['ends'], more: Partial<Dado> = {}): Dado => ({ part, runs: 'vertical', at, panel: 0.75, clearance: 0.01, depth: 0.25, from, to, ends, ...more });
const h = (part: string, at: number, from: number, to: number, ends: Dado['ends'], more: Partial<Dado> = {}): Dado => ({ ...v(part, at, from, to, ends, more), runs: 'horizontal' });
const o = (label: string, size?: number, arch?: number): LayoutPart => ({ opening: { label, ...(arch ? { arch } : {}) }, ...(size ? { size } : {}) });

const frames: Record<string, Particulars> = {
  'two-door-base': {
    format: 'stilepost.frame/1', name: 'B33 two-door base', unit: 'in', thickness: 0.75,
    outline: { kind: 'members', width: 33, height: 30.5, stiles: { left: 1.75, right: 1.75 }, rails: { top: 1.75, bottom: 1.25 }, feet: 0,
      layout: { columns: [o('A'), o('B')], between: 1.5 } },
    edge: { style: 'square', sizeHeldAt: 'face' },
    dados: [v('Left end', 0.25, 0, 30.5, ['open', 'open']), v('Right end', 32, 0, 30.5, ['open', 'open']),
      v('Partition', 16.125, 1.25, 30.5, ['meets', 'open']), h('Bottom', 0.5, 1, 32, ['meets', 'meets'])],
    setup: inSetup, cutters: inCutters,
  },
  'drawer-stack': {
    format: 'stilepost.frame/1', name: 'B18 drawer stack', unit: 'in', thickness: 0.75,
    outline: { kind: 'members', width: 18, height: 30.5, stiles: { left: 1.75, right: 1.75 }, rails: { top: 1.75, bottom: 1.25 }, feet: 0,
      layout: { rows: [o('1', 5), o('2', 6.5), o('3'), o('4')], between: 1.5 } },
    edge: { style: 'square', sizeHeldAt: 'back' },
    dados: [v('Left end', 0.25, 0, 30.5, ['open', 'open']), v('Right end', 17, 0, 30.5, ['open', 'open']), h('Bottom', 0.35, 1, 17, ['meets', 'meets'])],
    setup: { ...inSetup, squaring: 'all-edges' }, cutters: named,
  },
  'wall-three-doors': {
    format: 'stilepost.frame/1', name: 'W42 wall, three doors', unit: 'in', thickness: 0.75,
    outline: { kind: 'members', width: 42, height: 36, stiles: { left: 1.75, right: 1.75 }, rails: { top: 2, bottom: 1.5 }, feet: 0,
      layout: { columns: [o('Left', 11.5), { rows: [o('Open shelf', 9), o('Middle')], between: 1.5 }, o('Right', 11.5)], between: 1.5 } },
    edge: { style: 'square', sizeHeldAt: 'face' },
    dados: [v('Left end', 0.25, 0, 36, ['open', 'open']), v('Right end', 41, 0, 36, ['open', 'open']),
      v('Left partition', 13.625, 1, 35, ['meets', 'meets']), v('Right partition', 27.625, 1, 35, ['meets', 'meets']),
      h('Bottom', 0.5, 1, 41, ['meets', 'meets']), h('Top', 34.75, 1, 41, ['meets', 'meets'])],
    setup: inSetup, cutters: named,
  },
  'pantry-with-feet': {
    format: 'stilepost.frame/1', name: 'T24 pantry on feet', unit: 'in', thickness: 0.75,
    outline: { kind: 'members', width: 24, height: 90, stiles: { left: 2, right: 2 }, rails: { top: 2.5, bottom: 2 }, feet: 4,
      layout: { rows: [o('Upper'), o('Lower', 48)], between: 2 } },
    edge: { style: 'square', sizeHeldAt: 'face' },
    dados: [v('Left end', 0.25, 0, 90, ['open', 'open']), v('Right end', 23, 0, 90, ['open', 'open']),
      h('Bottom', 4.75, 1, 23, ['meets', 'meets']), h('Fixed shelf', 54.625, 1, 23, ['meets', 'meets'])],
    setup: { ...inSetup, allowance: 0.75 }, cutters: named,
    blank: { width: 26.5, height: 92.5 },
  },
  'arched-bookcase': {
    format: 'stilepost.frame/1', name: 'K46 arched bookcase', unit: 'in', thickness: 0.75,
    outline: { kind: 'members', width: 46, height: 80, stiles: { left: 2.25, right: 2.25 }, rails: { top: 3, bottom: 3.5 }, feet: 0,
      layout: { columns: [
        { rows: [o('A1', undefined, 2.5), o('A2', 22)], between: 2 },
        { rows: [o('B1', undefined, 2.5), o('B2', 22)], between: 2 },
        { rows: [o('C1', undefined, 2.5), o('C2', 22)], between: 2 }], between: 2 } },
    edge: { style: 'square', sizeHeldAt: 'face' },
    dados: [v('Left end', 0.5, 0, 80, ['open', 'open']), v('Right end', 44.75, 0, 80, ['open', 'open']),
      v('Left partition', 15.0417, 0, 78.5, ['open', 'stopped']), v('Right partition', 30.2083, 0, 78.5, ['open', 'stopped']),
      h('Shelf', 26.125, 1.25, 44.75, ['meets', 'meets'])],
    setup: inSetup, cutters: { ...named, opening: { kind: 'straight', diameter: 0.25, fluteLength: 1.125, maxPass: 0.4, name: '1/4 down-cut', number: 3 } },
  },
  'vanity-mm': {
    format: 'stilepost.frame/1', name: 'V900 vanity', unit: 'mm', thickness: 19,
    outline: { kind: 'members', width: 900, height: 760, stiles: { left: 45, right: 45 }, rails: { top: 45, bottom: 38 }, feet: 90,
      layout: { columns: [{ rows: [o('Drawer 1', 140), o('Drawer 2', 140), o('Drawer 3')], between: 38 }, { opening: { label: 'Basin' }, size: 420 }], between: 38 } },
    edge: { style: 'square', sizeHeldAt: 'face' },
    dados: [v('Left end', 6, 0, 760, ['open', 'open'], { panel: 18, clearance: 0.3, depth: 6 }), v('Right end', 876, 0, 760, ['open', 'open'], { panel: 18, clearance: 0.3, depth: 6 }),
      v('Partition', 407, 122, 760, ['meets', 'open'], { panel: 18, clearance: 0.3, depth: 6 }), h('Bottom', 104, 24, 876, ['meets', 'meets'], { panel: 18, clearance: 0.3, depth: 6 })],
    setup: { flip: 'end-over-end', allowance: 25, trim: 6, squaring: 'two-edges', spoilboard: 0.5 },
    cutters: {
      dado: { kind: 'straight', diameter: 10, fluteLength: 32, name: '10 mm compression', number: 1 },
      squaring: { kind: 'straight', diameter: 10, fluteLength: 32, maxPass: 10, name: '10 mm compression', number: 1 },
      opening: { kind: 'straight', diameter: 6, fluteLength: 28, maxPass: 7, name: '6 mm down-cut', number: 4 },
      perimeter: { kind: 'straight', diameter: 10, fluteLength: 32, maxPass: 10, name: '10 mm compression', number: 1 },
    },
  },
  'hearth-surround-traced': {
    format: 'stilepost.frame/1', name: 'Hearth surround, traced', unit: 'in', thickness: 0.75,
    // bottom edge with a shallow arc, top corners rounded r 2
    outline: { kind: 'traced',
      perimeter: [[0, 0], [8, 0, 0], [8, 3, -0.2], [40, 3, 0], [40, 0], [48, 0], [48, 34, Math.round(Math.tan(Math.PI/8)*1e9)/1e9], [46, 36], [2, 36, Math.round(Math.tan(Math.PI/8)*1e9)/1e9], [0, 34]],
      openings: [
        [[3, 8], [15, 8], [15, 30, 0.25], [3, 30]],
        [[24, 14, 1], [24, 26, 1]],
        [[33, 8], [45, 8], [45, 30, 0.25], [33, 30]],
      ] },
    edge: { style: 'square', sizeHeldAt: 'face' },
    dados: [v('Left end', 0.75, 0, 32, ['open', 'stopped']), v('Right end', 46.5, 0, 32, ['open', 'stopped'])],
    setup: inSetup, cutters: named,
  },
  'corner-base-unfinished': {
    format: 'stilepost.frame/1', name: 'C36 corner base, unfinished', unit: 'in', thickness: 0.75,
    outline: { kind: 'members', width: 36, height: 30.5, stiles: { left: 3, right: 1.75 }, rails: { top: 1.75, bottom: 1.25 }, feet: 0,
      layout: { columns: [o('Door', 18), { rows: [o('Drawer', 6), o('Below')], between: 1.5 }], between: 1.5 } },
    edge: { style: 'square', sizeHeldAt: 'face' },
    dados: [v('Left end', 0.25, 0, 30.5, ['open', 'open']), v('Right end', 35, 0, 30.5, ['open', 'open'], { depth: 0.5625 })],
    setup: inSetup, cutters: named,
  },
};
for (const [file, p] of Object.entries(frames)) {
  writeFileSync(`samples/${file}.frame.json`, writeFrameFile(p));
  const t = performance.now(); const w = workFrame(p); const ms = performance.now() - t;
  console.log(`\n${file} ${ms.toFixed(1)} ms ${w.contours.width}x${w.contours.height}, ${w.contours.openings.length} openings, blank ${JSON.stringify(w.blank.rough)}`);
  for (const f of w.findings) if (f.level !== 'note') console.log(`  ${f.level} ${f.code}: ${f.text} (${f.field ?? ''})`);
}
