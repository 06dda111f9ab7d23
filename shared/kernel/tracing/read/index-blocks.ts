import { DrawingTooBig } from './drawing-too-big.ts';
import type { EntityTags } from './entity-tags.ts';
import type { NameTable } from './name-table.ts';
import type { ProblemList } from './problem-list.ts';
import { atSectionEnd } from './scan-sections.ts';
import type { FilePlace, TagReader } from './tag-reader.ts';

/** A block's definition: where its contents stand, and what they are in number. */
export interface Block {
  readonly name: string;
  readonly baseX: number;
  readonly baseY: number;
  /** Drawn in another file that is not here. */
  readonly external: boolean;
  /** Its base point is no number, on this line; 0 when all is well. */
  readonly faultLine: number;
  readonly contents: FilePlace;
  readonly bytes: number;
  readonly entities: number;
  /** Blocks that it puts into itself, and how many times each. */
  readonly inserts: readonly { readonly block: number; readonly times: number }[];
}

/** Flags of a block that stand for another file (DXF Reference, BLOCK, group 70). */
const EXTERNAL = 4 | 8;

/** Finds the blocks by their numbers in the name table (DXF Reference, BLOCKS section). Of two with one name the first counts. Throws DrawingTooBig for more than `most`. */
export function indexBlocks(
  reader: TagReader,
  places: readonly FilePlace[],
  tags: EntityTags,
  names: NameTable,
  problems: ProblemList,
  most: number,
): Map<number, Block> {
  const blocks = new Map<number, Block>();
  for (const place of places) {
    reader.goTo(place);
    if (!reader.next()) continue;
    while (!atSectionEnd(reader)) {
      if (!reader.is('BLOCK')) {
        tags.collect(reader);
        continue;
      }
      const { id, line, block } = readBlock(reader, tags, names);
      if (blocks.size >= most)
        throw new DrawingTooBig(
          'too-many-entities',
          `This drawing has more than ${most.toLocaleString('en')} blocks. Export what belongs to the frame only.`,
        );
      if (!blocks.has(id)) blocks.set(id, block);
      else problems.add('block-twice', `Block ${block.name} is there twice; the first is taken.`, line);
    }
  }
  return blocks;
}

function readBlock(reader: TagReader, tags: EntityTags, names: NameTable) {
  tags.collect(reader);
  const { line } = tags;
  let id = names.idOf('');
  let baseX = 0;
  let baseY = 0;
  let flags = 0;
  let named = false;
  for (let i = 0; i < tags.count; i++) {
    const code = tags.codes[i];
    if (code === 2 && !named) {
      id = names.idAt(tags.startOf(i), tags.endOf(i));
      named = true;
    } else if (code === 10) baseX = tags.number(i);
    else if (code === 20) baseY = tags.number(i);
    else if (code === 70) flags = tags.whole(i);
  }
  const faultLine = tags.fault?.line ?? 0;
  const contents = reader.placeOfPair();
  const counted = countContents(reader, tags, names);
  const bytes = reader.placeOfPair().at - contents.at;
  const external = (flags & EXTERNAL) !== 0;
  return {
    id,
    line,
    block: { name: names.names[id]!, baseX, baseY, external, faultLine, contents, bytes, ...counted },
  };
}

/** Counts what stands in a block, up to its end. */
function countContents(reader: TagReader, tags: EntityTags, names: NameTable) {
  const inserts: { block: number; times: number }[] = [];
  let entities = 0;
  while (!atSectionEnd(reader) && !reader.is('ENDBLK') && !reader.is('BLOCK')) {
    const isInsert = reader.is('INSERT');
    const isPart = reader.is('VERTEX') || reader.is('SEQEND') || reader.is('ATTRIB');
    tags.collect(reader);
    if (!isPart) entities++;
    if (!isInsert) continue;
    let block = -1;
    let columns = 1;
    let rows = 1;
    for (let i = 0; i < tags.count; i++) {
      const code = tags.codes[i];
      if (code === 2) block = names.idAt(tags.startOf(i), tags.endOf(i));
      else if (code === 70) columns = tags.whole(i);
      else if (code === 71) rows = tags.whole(i);
    }
    // Numbers that are none are told of where the insert is read.
    if (block >= 0 && tags.fault === null) inserts.push({ block, times: Math.max(columns, 1) * Math.max(rows, 1) });
  }
  return { entities, inserts };
}
