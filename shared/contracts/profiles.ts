import { z } from 'zod';
import type { FileProfile } from '../kernel/profiles/file-profile.ts';
import { LIMITS } from './limits.ts';
import { words } from './words.ts';

/** A file profile as a person enters it; see FileProfile in the kernel for the meaning of each field. */
export const fileProfile = z.strictObject({
  name: words(LIMITS.nameLength),
  flavour: z.enum(['R2007', 'R12']),
  unit: z.enum(['as drawn', 'in', 'mm']),
  decimals: z.union([z.literal(4), z.literal(5), z.literal(6)]),
  origin: z.enum(['pins', 'frame']),
  openingLines: z.enum(['entered', 'axis', 'both']),
  layerTemplate: words(120),
  labels: z.boolean(),
}) satisfies z.ZodType<FileProfile>;

/** POST /api/profiles and PUT /api/profiles/:profileId take a fileProfile and answer a storedProfile. DELETE answers 204. Built-in ones cannot be changed. */
export const storedProfile = z.object({ id: z.string(), builtIn: z.boolean(), profile: fileProfile });
export type StoredProfile = z.infer<typeof storedProfile>;

/** GET /api/profiles. Built-in first, then the shop's own by name. */
export const profileList = z.object({ profiles: z.array(storedProfile) });
export type ProfileList = z.infer<typeof profileList>;
