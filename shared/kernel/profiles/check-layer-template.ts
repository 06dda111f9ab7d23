import type { CutterRole } from '../cutters/cutter.ts';
import { DrawingRefused } from '../drawing/drawing-refused.ts';
import { DEFAULT_LINE_SETS } from './default-line-sets.ts';
import { refuseClash } from './layer-clash.ts';
import { depthDigits, layerName, strayTokens } from './layer-name.ts';

/** A line set's key and the layer name that a template gives it. */
export interface LayerExample {
  readonly key: string;
  readonly name: string;
}

export type CheckedTemplate =
  { readonly ok: true; readonly example: readonly LayerExample[] } | { readonly ok: false; readonly takes: string };

/** Depths in inches, for the example only. */
const EXAMPLE_DEPTHS: Record<CutterRole, number> = {
  dado: 0.25,
  squaring: 0.77,
  opening: 0.8125,
  perimeter: 0.77,
  bead: 0.1038,
  quirk: 0.1038,
  corner: 0.1038,
};

/**
 * Tries a layer template on every line set that a frame can have, beaded ones and labels too. A frame may still clash
 * where its own cutters or depths make two names the same: nameLayers refuses that frame.
 */
export function checkLayerTemplate(template: string): CheckedTemplate {
  const stray = strayTokens(template);
  if (stray.length > 0)
    return { ok: false, takes: `{face}, {set}, {cutter} and {depth} in braces, not ${stray.join(', ')}` };
  try {
    const example = DEFAULT_LINE_SETS.map(({ face, set, cutter }) => ({
      key: `${face}/${set}`,
      name: layerName(template, {
        face,
        set,
        cutter: cutter ?? 'none',
        depth: depthDigits(cutter === null ? 0 : EXAMPLE_DEPTHS[cutter], 'in'),
      }),
    }));
    refuseClash(example);
    return { ok: true, example };
  } catch (error) {
    if (!(error instanceof DrawingRefused)) throw error;
    return { ok: false, takes: `a template that gives each line set its own name: ${error.message}` };
  }
}
