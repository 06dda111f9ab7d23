import type { FileProfile } from './file-profile.ts';
import { DEFAULT_LAYER_TEMPLATE } from './layer-name.ts';

/** A file profile that comes with the product, with its stable id. */
export interface BuiltinProfile {
  readonly id: string;
  readonly profile: FileProfile;
}

const asDrawn: FileProfile = {
  name: 'R2007 as drawn',
  flavour: 'R2007',
  unit: 'as drawn',
  decimals: 6,
  origin: 'pins',
  openingLines: 'both',
  layerTemplate: DEFAULT_LAYER_TEMPLATE,
  labels: false,
};

/** The profiles that every shop has and nobody can change; the first one is the default. */
export const BUILTIN_PROFILES: readonly BuiltinProfile[] = [
  { id: 'r2007', profile: asDrawn },
  { id: 'r12', profile: { ...asDrawn, name: 'R12 for older programs', flavour: 'R12' } },
  { id: 'axis-only', profile: { ...asDrawn, name: 'Axis lines only', openingLines: 'axis' } },
];
