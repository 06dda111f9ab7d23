import { z } from 'zod';

export const role = z.enum(['owner', 'designer', 'programmer', 'operator']);
export type Role = z.infer<typeof role>;

/** What a person may do. */
export type Act =
  'manage-shop' | 'manage-people' | 'edit-frames' | 'release' | 'edit-profiles' | 'edit-cutters' | 'download';

const MAY: Record<Act, readonly Role[]> = {
  'manage-shop': ['owner'],
  'manage-people': ['owner'],
  'edit-frames': ['owner', 'designer'],
  release: ['owner', 'designer'],
  'edit-profiles': ['owner', 'programmer'],
  'edit-cutters': ['owner', 'programmer'],
  download: ['owner', 'designer', 'programmer', 'operator'],
};

export const may = (who: Role, act: Act): boolean => MAY[act].includes(who);
