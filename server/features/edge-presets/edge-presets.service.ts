import { randomUUID } from 'node:crypto';
import type { z } from 'zod';
import { MOST_EDGE_PRESETS, type edgePreset, type StoredEdgePreset } from '#shared/contracts/edge-presets.ts';
import { isUniqueViolation } from '../../db/unique-violation.ts';
import { AppError, notFound, wrongField } from '../../errors.ts';
import type { EdgePresetRow, EdgePresetsStore } from './edge-presets.store.ts';

export type EdgePresetsService = ReturnType<typeof edgePresetsService>;

/** Edges of openings that a shop saved to use again. Frames copy them: a preset may go without touching any. */
export const edgePresetsService = (store: EdgePresetsStore, now: () => Date) => ({
  async list(shopId: string): Promise<{ presets: EdgePresetRow[] }> {
    const presets = (await store.list(shopId)).map(({ id, preset }) => ({ id, preset }));
    presets.sort((a, b) => a.preset.name.localeCompare(b.preset.name, 'en', { numeric: true }));
    return { presets };
  },

  /** Throws 'name-taken', and 'invalid-input' for more than a shop may save. */
  async add(shopId: string, preset: z.output<typeof edgePreset>): Promise<StoredEdgePreset> {
    if ((await store.count(shopId)) >= MOST_EDGE_PRESETS)
      throw wrongField('name', `one more than ${MOST_EDGE_PRESETS}`, `at most ${MOST_EDGE_PRESETS} saved edges`);
    const stored = { id: randomUUID(), preset };
    try {
      await store.add(shopId, stored, now());
    } catch (error) {
      if (!isUniqueViolation(error)) throw error;
      throw new AppError('name-taken', 'an edge preset of the shop has that name', {
        message: 'Another saved edge has this name. Choose another.',
      });
    }
    return stored;
  },

  async remove(shopId: string, id: string): Promise<void> {
    if (!(await store.remove(shopId, id))) throw notFound('edge preset');
  },
});
