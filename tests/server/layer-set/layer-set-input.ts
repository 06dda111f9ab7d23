import { BUILTIN_PROFILES } from '#shared/kernel/profiles/builtin-profiles.ts';
import type { LayerSetInput } from '../../../server/layer-set/layer-set.ts';
import { workedExample } from '../../builders/worked-example.ts';

/** Revision A of the worked example. */
export const layerSetInput = (changes: Partial<LayerSetInput> = {}): LayerSetInput => ({
  particulars: workedExample(),
  shopName: 'Tern & Alder Joinery',
  jobName: 'Fenwick Lane kitchen',
  revision: 'A',
  author: 'Ines Alder',
  releasedAt: '2031-05-06T07:08:09.000Z',
  note: 'First issue',
  profile: BUILTIN_PROFILES[0]!.profile,
  paper: 'Letter',
  ...changes,
});
