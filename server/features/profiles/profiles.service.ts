import { randomUUID } from 'node:crypto';
import type { ProfileList, StoredProfile } from '#shared/contracts/profiles.ts';
import { BUILTIN_PROFILES } from '#shared/kernel/profiles/builtin-profiles.ts';
import { checkLayerTemplate } from '#shared/kernel/profiles/check-layer-template.ts';
import type { FileProfile } from '#shared/kernel/profiles/file-profile.ts';
import { isUniqueViolation } from '../../db/unique-violation.ts';
import { AppError, notFound, wrongField } from '../../errors.ts';
import type { ProfilesStore } from './profiles.store.ts';

export type ProfilesService = ReturnType<typeof profilesService>;

const isBuiltIn = (id: string): boolean => BUILTIN_PROFILES.some((p) => p.id === id);

/** Throws for a template that cannot name every layer, and for the name of a built-in profile. */
function check(profile: FileProfile): void {
  const template = checkLayerTemplate(profile.layerTemplate);
  if (!template.ok) throw wrongField('layerTemplate', JSON.stringify(profile.layerTemplate), template.takes);
  if (BUILTIN_PROFILES.some((p) => p.profile.name.toLowerCase() === profile.name.toLowerCase())) {
    throw new AppError('name-taken', 'a built-in profile has that name');
  }
}

function refuseBuiltIn(id: string): void {
  if (isBuiltIn(id)) {
    throw new AppError('not-allowed', `change of built-in profile ${id}`, {
      message: 'A built-in profile cannot be changed. Make one of your own from it.',
    });
  }
}

async function withFreeName<T>(work: Promise<T>): Promise<T> {
  try {
    return await work;
  } catch (error) {
    if (isUniqueViolation(error)) throw new AppError('name-taken', 'a profile of the shop has that name');
    throw error;
  }
}

/** File profiles: the built-in ones and a shop's own. */
export const profilesService = (store: ProfilesStore, now: () => Date) => ({
  async list(shopId: string): Promise<ProfileList> {
    const own = (await store.list(shopId)).map(({ id, profile }) => ({ id, builtIn: false, profile }));
    own.sort((a, b) => a.profile.name.localeCompare(b.profile.name));
    return { profiles: [...BUILTIN_PROFILES.map(({ id, profile }) => ({ id, builtIn: true, profile })), ...own] };
  },

  async add(shopId: string, profile: FileProfile): Promise<StoredProfile> {
    check(profile);
    const id = randomUUID();
    await withFreeName(store.add(shopId, id, profile, now()));
    return { id, builtIn: false, profile };
  },

  async change(shopId: string, id: string, profile: FileProfile): Promise<StoredProfile> {
    refuseBuiltIn(id);
    check(profile);
    if (!(await withFreeName(store.change(shopId, id, profile, now())))) throw notFound('profile');
    return { id, builtIn: false, profile };
  },

  async remove(shopId: string, id: string): Promise<void> {
    refuseBuiltIn(id);
    if (!(await store.remove(shopId, id, BUILTIN_PROFILES[0]!.id))) throw notFound('profile');
  },
});
