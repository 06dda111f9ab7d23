import type { Unit } from '../units/unit.ts';
import type { Dado, Particulars } from './particulars.ts';

/** Sizes of the frame that a new one begins as, in each unit: round numbers of the trade, common practice, no source. */
const BASE = {
  in: {
    width: 33,
    height: 30.5,
    thickness: 0.75,
    stile: 1.75,
    top: 1.75,
    bottom: 1.25,
    between: 1.5,
    panel: 0.75,
    clearance: 0.01,
    depth: 0.25,
    set: 0.25,
    low: 0.5,
    allowance: 1,
    trim: 0.25,
    spoilboard: 0.02,
    straight: 0.375,
    flute: 1.25,
    tip: 0.0625,
    pass: 0.5,
  },
  mm: {
    width: 840,
    height: 775,
    thickness: 19,
    stile: 45,
    top: 45,
    bottom: 32,
    between: 40,
    panel: 18,
    clearance: 0.3,
    depth: 6,
    set: 6,
    low: 14,
    allowance: 25,
    trim: 6,
    spoilboard: 0.5,
    straight: 10,
    flute: 32,
    tip: 1.5,
    pass: 12,
  },
} as const;

/** A two-door base frame with square edges and its four dados, to begin a new frame from. Valid, without a stop. */
export function newFrame(unit: Unit, name: string): Particulars {
  const b = BASE[unit];
  const dado = { panel: b.panel, clearance: b.clearance, depth: b.depth };
  const end = (part: string, at: number): Dado => ({
    part,
    runs: 'vertical',
    at,
    ...dado,
    from: 0,
    to: b.height,
    ends: ['open', 'open'],
  });
  const bottomTop = b.low + b.panel;
  const middle = (b.width - b.panel) / 2;
  const straight = { kind: 'straight', diameter: b.straight, fluteLength: b.flute, maxPass: b.pass } as const;
  return {
    format: 'stilepost.frame/1',
    name,
    unit,
    thickness: b.thickness,
    outline: {
      kind: 'members',
      width: b.width,
      height: b.height,
      stiles: { left: b.stile, right: b.stile },
      rails: { top: b.top, bottom: b.bottom },
      feet: 0,
      layout: { columns: [{ opening: { label: 'A' } }, { opening: { label: 'B' } }], between: b.between },
    },
    edge: { style: 'square', sizeHeldAt: 'face' },
    dados: [
      end('Left end', b.set),
      end('Right end', b.width - b.set - b.panel),
      {
        part: 'Partition',
        runs: 'vertical',
        at: middle,
        ...dado,
        from: bottomTop,
        to: b.height,
        ends: ['meets', 'open'],
      },
      {
        part: 'Bottom',
        runs: 'horizontal',
        at: b.low,
        ...dado,
        from: b.set + b.panel,
        to: b.width - b.set - b.panel,
        ends: ['meets', 'meets'],
      },
    ],
    setup: {
      flip: 'side-to-side',
      allowance: b.allowance,
      trim: b.trim,
      squaring: 'two-edges',
      spoilboard: b.spoilboard,
    },
    cutters: {
      dado: straight,
      squaring: straight,
      opening: { kind: 'tapered', tipRadius: b.tip, sideAngle: 1.5, fluteLength: b.flute, maxPass: b.pass },
      perimeter: straight,
    },
  };
}
