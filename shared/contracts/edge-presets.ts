import { z } from 'zod';
import type { EdgePreset } from '../kernel/starters/edge-preset.ts';
import { LIMITS } from './limits.ts';
import { cutter, edge } from './particulars.ts';
import { words } from './words.ts';

/** How many edges a shop may save. */
export const MOST_EDGE_PRESETS = 200;

/** POST /api/edge-presets takes an edge with the cutters that make it, and answers a storedEdgePreset. Names are unique in a shop. */
export const edgePreset = z.strictObject({
  name: words(LIMITS.nameLength),
  unit: z.enum(['in', 'mm'], { error: 'takes "in" or "mm"' }),
  edge,
  cutters: z.strictObject({
    opening: cutter.optional(),
    bead: cutter.optional(),
    quirk: cutter.optional(),
    corner: cutter.optional(),
  }),
}) satisfies z.ZodType<EdgePreset>;
export type EdgePresetInput = z.input<typeof edgePreset>;

export const storedEdgePreset = z.object({ id: z.string(), preset: edgePreset });
export type StoredEdgePreset = z.output<typeof storedEdgePreset>;

/** GET /api/edge-presets, by name. DELETE /api/edge-presets/:presetId answers 204. */
export const edgePresetList = z.object({ presets: z.array(storedEdgePreset) });
