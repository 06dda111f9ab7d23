import { readFileSync } from 'node:fs';
import { fieldErrors } from '#shared/contracts/field-errors.ts';
import { fileProfile } from '#shared/contracts/profiles.ts';
import { BUILTIN_PROFILES } from '#shared/kernel/profiles/builtin-profiles.ts';
import { checkLayerTemplate } from '#shared/kernel/profiles/check-layer-template.ts';
import type { FileProfile } from '#shared/kernel/profiles/file-profile.ts';
import { InputError } from './input-error.ts';

function parseProfile(text: string, path: string): FileProfile {
  let data: unknown;
  try {
    data = JSON.parse(text.replace(/^\uFEFF/, ''));
  } catch (error) {
    throw new InputError(`${path}: not a file profile: it is not JSON (${(error as Error).message})`);
  }
  const read = fileProfile.safeParse(data);
  if (!read.success) {
    throw new InputError(
      `${path}: not a valid file profile`,
      fieldErrors(read.error, data).map((f) => f.message),
    );
  }
  const template = checkLayerTemplate(read.data.layerTemplate);
  if (!template.ok) {
    throw new InputError(`${path}: not a valid file profile`, [
      `layerTemplate: got ${JSON.stringify(read.data.layerTemplate)}, takes ${template.takes}`,
    ]);
  }
  return read.data;
}

/** A built-in file profile by its id or name, whatever the case, else the one in the JSON file at that path. Throws InputError. */
export function loadProfile(nameOrPath: string): FileProfile {
  const wanted = nameOrPath.toLowerCase();
  const builtin = BUILTIN_PROFILES.find(({ id, profile }) => id === wanted || profile.name.toLowerCase() === wanted);
  if (builtin) return builtin.profile;
  let text: string;
  try {
    text = readFileSync(nameOrPath, 'utf8');
  } catch (error) {
    const names = BUILTIN_PROFILES.map((p) => p.id).join(', ');
    throw new InputError(
      `--profile: got "${nameOrPath}", takes ${names} or the path of a profile file (${(error as Error).message})`,
    );
  }
  return parseProfile(text, nameOrPath);
}
