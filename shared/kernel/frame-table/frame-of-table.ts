import { layOutBox } from '../box/lay-out-box.ts';
import { newBox } from '../box/new-box.ts';
import { tidyLength } from '../box/tidy-length.ts';
import { newFrame } from '../particulars/new-frame.ts';
import type { Bead, Cutters, Dado, Particulars } from '../particulars/particulars.ts';
import type { EdgePreset } from '../starters/edge-preset.ts';
import { usualEdgePresets } from '../starters/usual-edge-presets.ts';
import type { Unit } from '../units/unit.ts';
import { layOutGrid, type Grid } from './grid.ts';

/** A frame as a row of the table says it; lengths in `unit`. */
export interface TableFrame extends Grid {
  readonly name: string;
  readonly unit: Unit;
  readonly width: number;
  readonly height: number;
  readonly stiles: { readonly left: number; readonly right: number };
  readonly rails: { readonly top: number; readonly bottom: number };
  readonly feet: number;
  readonly thickness: number;
  /** Thickness of the box's ends and bottom; 0 for a frame without dados. */
  readonly box: number;
  /** Square edges without. */
  readonly bead?: Bead;
}

const presetOf = (unit: Unit, style: 'square' | 'beaded'): EdgePreset =>
  usualEdgePresets(unit).find(({ edge }) => edge.style === style)!;

/** The bead of an edge whose row leaves its numbers empty. */
export function usualBead(unit: Unit): Bead {
  const { edge } = presetOf(unit, 'beaded');
  if (edge.style !== 'beaded') throw new Error(`edge preset: got ${edge.style}, takes beaded`);
  return edge.bead;
}

/**
 * Dados for a box's two ends and bottom, where the box helper begins: the frame stands out past the ends by 1/4 in (6 mm)
 * a side, and the bottom lies 1/2 in (14 mm) above the frame's lower edge, or above the feet. Ends run out below and
 * above, the bottom meets them. None for a thickness of 0.
 */
function dadosOfBox({ name, unit, width, height, feet, box: thickness }: TableFrame): readonly Dado[] {
  if (thickness === 0) return [];
  const usual = newBox(unit, name);
  const { overhang } = usual;
  return layOutBox({
    ...usual,
    width: tidyLength(width - overhang.left - overhang.right),
    height: tidyLength(height - overhang.top - overhang.bottom),
    ends: { thickness },
    bottom: { thickness, up: feet },
    partitions: undefined,
    feet,
  }).dados;
}

/** The usual cutters for a bead, with a beading cutter of its radius, and for a narrower quirk a cutter as wide as it. */
function beadCutters(unit: Unit, { radius, quirk }: Bead): Partial<Cutters> {
  const { cutters } = presetOf(unit, 'beaded');
  return {
    ...cutters,
    ...(cutters.bead?.kind === 'beading' && { bead: { ...cutters.bead, profileRadius: radius } }),
    ...(cutters.quirk?.kind === 'straight' && {
      quirk: { ...cutters.quirk, diameter: Math.min(cutters.quirk.diameter, quirk) },
    }),
  };
}

/** The frame of a row: its sizes, the rest as in a new frame. What cannot be cut is for workFrame to find. */
export function frameOfTable(row: TableFrame): Particulars {
  const { name, unit, width, height, stiles, rails, feet, thickness, bead } = row;
  const base = newFrame(unit, name);
  return {
    ...base,
    thickness,
    outline: { kind: 'members', width, height, stiles, rails, feet, layout: layOutGrid(row) },
    edge: bead ? { style: 'beaded', sizeHeldAt: 'bead base', bead } : presetOf(unit, 'square').edge,
    dados: dadosOfBox(row),
    cutters: bead ? { ...base.cutters, ...beadCutters(unit, bead) } : base.cutters,
  };
}
