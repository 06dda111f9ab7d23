import type { FilePlace, TagReader } from './tag-reader.ts';

export interface Sections {
  /** Where the contents of each section begin, right behind its name; a file may have several of one name. */
  readonly header: readonly FilePlace[];
  readonly tables: readonly FilePlace[];
  readonly blocks: readonly FilePlace[];
  readonly entities: readonly FilePlace[];
  /** The file has its end mark (group 0, EOF), as far as was looked. */
  readonly ended: boolean;
}

/**
 * Finds the sections from where the reader stands on, in whatever order they come (DXF Reference, General DXF file
 * structure): to the end of the file, or to the first ENTITIES section.
 */
export function scanSections(reader: TagReader, to: 'end' | 'entities'): Sections {
  const found = { header: [], tables: [], blocks: [], entities: [] } as Record<SectionName, FilePlace[]>;
  let more = reader.code !== -1 || reader.next();
  while (more) {
    if (reader.code === 0 && reader.is('EOF')) return { ...found, ended: true };
    if (reader.code === 0 && reader.is('SECTION')) {
      more = reader.next();
      const name = more ? sectionName(reader) : null;
      if (name !== null) found[name].push(reader.place());
      if (name === 'entities' && to === 'entities') break;
      // A section without a name: what stands in its place is looked at again.
      continue;
    }
    more = reader.next();
  }
  return { ...found, ended: false };
}

type SectionName = 'header' | 'tables' | 'blocks' | 'entities';

const NAMES: readonly SectionName[] = ['header', 'tables', 'blocks', 'entities'];

function sectionName(reader: TagReader): SectionName | null {
  if (reader.code !== 2) return null;
  return NAMES.find((name) => reader.is(name.toUpperCase())) ?? null;
}

/** Whether the reader stands where a section ends, as it should or without a word. */
export const atSectionEnd = (reader: TagReader): boolean =>
  reader.code !== 0 || reader.is('ENDSEC') || reader.is('SECTION') || reader.is('EOF');
