import type { EntityTags } from './entity-tags.ts';
import type { NameTable } from './name-table.ts';
import type { ProblemList } from './problem-list.ts';
import { atSectionEnd } from './scan-sections.ts';
import type { FilePlace, TagReader } from './tag-reader.ts';

/** Layers that are not shown, by their numbers in the name table. */
export interface LayerStates {
  readonly off: ReadonlySet<number>;
  readonly frozen: ReadonlySet<number>;
  /** What a person wants left out. */
  readonly leftOut: Pick<ReadonlySet<number>, 'has'>;
}

/**
 * Reads the LAYER records of the tables (DXF Reference, LAYER): a colour below 0 is a layer that is off, flag 1 one that
 * is frozen. Other records and wrong counts pass by; a layer whose numbers are none is taken as shown, and told.
 */
export function readLayers(
  reader: TagReader,
  places: readonly FilePlace[],
  tags: EntityTags,
  layers: NameTable,
  problems: ProblemList,
): Omit<LayerStates, 'leftOut'> {
  const off = new Set<number>();
  const frozen = new Set<number>();
  const read = new Set<number>();
  for (const place of places) {
    reader.goTo(place);
    if (!reader.next()) continue;
    while (!atSectionEnd(reader)) {
      const isLayer = reader.is('LAYER');
      tags.collect(reader);
      if (!isLayer) continue;
      let id = -1;
      let colour = 7;
      let flags = 0;
      for (let i = 0; i < tags.count; i++) {
        const code = tags.codes[i];
        if (code === 2) id = layers.idAt(tags.startOf(i), tags.endOf(i));
        else if (code === 62) colour = tags.whole(i);
        else if (code === 70) flags = tags.whole(i);
      }
      if (tags.fault !== null)
        problems.add('layer-unread', 'A layer’s colour or flags are no number; it is taken as shown.', tags.fault.line);
      if (id < 0 || read.has(id) || tags.fault !== null) continue;
      read.add(id);
      if (colour < 0) off.add(id);
      if ((flags & 1) !== 0) frozen.add(id);
    }
  }
  return { off, frozen };
}
