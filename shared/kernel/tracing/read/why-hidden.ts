import type { AsideReason } from './entity-reasons.ts';
import type { EntityTags } from './entity-tags.ts';
import type { LayerStates } from './read-layers.ts';

/** What is otherwise set aside and a person wants in. */
export interface Include {
  readonly paperSpace?: boolean;
  readonly offLayers?: boolean;
  readonly frozenLayers?: boolean;
  readonly invisible?: boolean;
}

/** Why an entity on this layer (its number) is not to be seen; null when it is, or is wanted all the same. */
export function whyHidden(
  tags: EntityTags,
  type: string,
  layer: number,
  states: LayerStates,
  include: Include,
  inBlock: boolean,
): AsideReason | null {
  if (tags.inPaperSpace && !inBlock && !include.paperSpace) return 'paper-space';
  if (tags.invisible && !include.invisible) return 'invisible';
  if (states.frozen.has(layer) && !include.frozenLayers) return 'layer-frozen';
  // A block on a layer that is off or left out is so only as far as its contents take that layer over.
  if (type === 'INSERT') return null;
  if (states.leftOut.has(layer)) return 'layer-left-out';
  return states.off.has(layer) && !include.offLayers ? 'layer-off' : null;
}
