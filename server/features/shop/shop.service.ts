import type { Shop, ShopChange } from '#shared/contracts/session.ts';
import { BUILTIN_PROFILES } from '#shared/kernel/profiles/builtin-profiles.ts';
import { notFound } from '../../errors.ts';
import type { ShopStore } from './shop.store.ts';

export type ShopService = ReturnType<typeof shopService>;

/** Changes to a shop's settings. */
export const shopService = (store: ShopStore) => ({
  async change(shopId: string, change: ShopChange): Promise<Shop> {
    const profileId = change.defaultProfileId;
    if (
      profileId !== undefined &&
      !BUILTIN_PROFILES.some((p) => p.id === profileId) &&
      !(await store.ownsProfile(shopId, profileId))
    ) {
      throw notFound('profile');
    }
    return store.change(shopId, change);
  },
});
