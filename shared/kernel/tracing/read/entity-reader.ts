import type { CurveSink } from './curve-sink.ts';
import { drawArc } from './draw-arc.ts';
import { drawEllipse } from './draw-ellipse.ts';
import { drawLine } from './draw-line.ts';
import { drawLwpolyline } from './draw-lwpolyline.ts';
import { drawPolyline } from './draw-polyline.ts';
import { drawSpline } from './draw-spline.ts';
import type { DrawingPen } from './drawing-pen.ts';
import { DrawingTooBig } from './drawing-too-big.ts';
import type { EntityCensus } from './entity-census.ts';
import { drawn, type Drawn } from './entity-plane.ts';
import { ASIDE_TYPES, SOLID_TYPES, type AsideReason, type Reason } from './entity-reasons.ts';
import { EntityTags } from './entity-tags.ts';
import type { Block } from './index-blocks.ts';
import type { NameTable } from './name-table.ts';
import { placeWithin, type Placement } from './placement.ts';
import type { ProblemList } from './problem-list.ts';
import { whyHidden, type Include } from './why-hidden.ts';
import { readInsert, type Insert } from './read-insert.ts';
import type { LayerStates } from './read-layers.ts';
import type { ReadLimits } from './read-limits.ts';
import { tellBlock, tellCutShort, tellFitted, tellKept, tellRefusal } from './tell-entities.ts';
import { atSectionEnd } from './scan-sections.ts';
import type { TagReader } from './tag-reader.ts';
import { VertexRow } from './vertex-row.ts';
import type { BlockWeight } from './weigh-blocks.ts';

/** What the entities of a file are read with and into. */
export interface ReadingDesk {
  readonly reader: TagReader;
  readonly sink: CurveSink;
  readonly pen: DrawingPen;
  readonly problems: ProblemList;
  readonly types: NameTable;
  readonly layers: NameTable;
  readonly blockNames: NameTable;
  readonly states: LayerStates;
  readonly blocks: ReadonlyMap<number, Block>;
  readonly weights: ReadonlyMap<number, BlockWeight>;
  readonly include: Include;
  readonly limits: ReadLimits;
  /** How far arcs and lines may lie from a curve, in words. */
  readonly within: string;
  /** Entities of the file, and those that blocks put there, once for each time. */
  readonly census: EntityCensus;
  readonly placed: EntityCensus;
}

/** Where the entities that are being read stand. */
interface Surroundings {
  readonly placement: Placement;
  /** Layer of the INSERT, which entities on layer 0 take over; −1 in the drawing itself. */
  readonly layer: number;
  readonly census: EntityCensus;
}

const PARTS: ReadonlySet<string> = new Set(['VERTEX', 'SEQEND', 'ATTRIB']);

/**
 * Reads entities from where the reader stands to the end of the section or block: each is drawn and kept, set aside or
 * refused, and counted once. A POLYLINE counts with its vertices, an INSERT with its attributes; what an INSERT puts
 * there is counted apart. Recursion goes as deep as blocks may nest.
 */
export class EntityReader {
  readonly #desk: ReadingDesk;
  readonly #tags = new EntityTags();
  readonly #vertexTags = new EntityTags();
  readonly #row = new VertexRow();
  readonly #layerZero: number;
  readonly #typeNames: string[] = [];
  #placedBytes = 0;

  constructor(desk: ReadingDesk) {
    this.#desk = desk;
    this.#layerZero = desk.layers.idOf('0');
  }

  /** How many entities were kept. */
  readAll(around: Surroundings): number {
    const { reader, types } = this.#desk;
    let kept = 0;
    const inBlock = around.layer >= 0;
    while (!atSectionEnd(reader) && !(inBlock && (reader.is('ENDBLK') || reader.is('BLOCK')))) {
      const type = types.idAt(reader.start, reader.end);
      this.#tags.collect(reader);
      if (this.#readOne(type, around) === null) kept++;
    }
    return kept;
  }

  #readOne(type: number, around: Surroundings): Reason | null {
    const tags = this.#tags;
    const { line } = tags;
    const own =
      tags.layerEnd > tags.layerStart ? this.#desk.layers.idAt(tags.layerStart, tags.layerEnd) : this.#layerZero;
    const layer = own === this.#layerZero && around.layer >= 0 ? around.layer : own;
    const reason = this.#judge(this.#typeName(type), layer, around);
    around.census.add(type, layer, reason, line);
    const { census, placed, limits } = this.#desk;
    if (census.total + placed.total > limits.entities)
      throw new DrawingTooBig(
        'too-many-entities',
        `This drawing has more than ${limits.entities.toLocaleString('en')} entities, those of blocks included. Export what belongs to the frame only.`,
      );
    return reason;
  }

  #typeName(type: number): string {
    return (this.#typeNames[type] ??= this.#desk.types.names[type]!.toUpperCase());
  }

  /** Reads the entity that was collected, with all its parts, and says why it is not kept; null when it is. */
  #judge(name: string, layer: number, around: Surroundings): Reason | null {
    const tags = this.#tags;
    const { include, states } = this.#desk;
    const aside = ASIDE_TYPES[name] ?? whyHidden(tags, name, layer, states, include, around.layer >= 0);
    if (name === 'INSERT') return this.#insert(layer, aside, around);
    if (name === 'POLYLINE') return this.#finish(name, aside, tags.line, this.#polyline(tags));
    if (aside !== null) return aside;
    if (PARTS.has(name)) return this.#refuse('stray-part', tags.line);
    if (SOLID_TYPES.has(name)) return this.#refuse('three-dimensional', tags.line);
    const answer = this.#draw(name);
    return answer === null ? this.#refuse('unknown-entity', tags.line) : this.#finish(name, null, tags.line, answer);
  }

  #draw(name: string): Drawn | null {
    const { pen, problems } = this.#desk;
    const tags = this.#tags;
    pen.begin();
    switch (name) {
      case 'LINE':
        return drawLine(tags, pen);
      case 'LWPOLYLINE':
        return drawLwpolyline(tags, pen, this.#row);
      case 'ARC':
        return drawArc(tags, pen, false);
      case 'CIRCLE':
        return drawArc(tags, pen, true);
      case 'ELLIPSE':
        return drawEllipse(tags, pen);
      case 'SPLINE':
        return drawSpline(tags, pen, problems);
      default:
        return null;
    }
  }

  #polyline(tags: EntityTags): Drawn {
    const { reader, pen, problems } = this.#desk;
    pen.begin();
    const { line } = tags;
    const answer = drawPolyline(reader, tags, this.#vertexTags, pen, this.#row);
    if (!answer.hasEnd && answer.refused === null) problems.tally('polyline-without-end', tellCutShort, line);
    return answer;
  }

  /** Keeps or drops what was drawn. */
  #finish(name: string, aside: AsideReason | null, line: number, answer: Drawn): Reason | null {
    const { sink, pen, problems } = this.#desk;
    const why = this.#whyNot(aside, answer);
    if (why !== null) {
      sink.drop();
      return why === aside || why === 'no-length' ? why : this.#refuse(why, line);
    }
    sink.keep();
    tellKept(problems, answer, line);
    if (pen.fitted > 0) tellFitted(problems, name, this.#desk.within, line);
    return null;
  }

  #whyNot(aside: AsideReason | null, answer: Drawn): Reason | null {
    if (aside !== null) return aside;
    if (answer.refused !== null) return answer.refused;
    // The last value may have lost its last digits.
    if (this.#tags.cut && this.#desk.reader.cut) return 'cut-off';
    if (this.#desk.pen.lost) return 'curve-lost';
    if (this.#desk.sink.outOfRange) return 'out-of-range';
    return this.#desk.sink.hasDrawn ? null : 'no-length';
  }

  #refuse(reason: Reason, line: number): Reason {
    tellRefusal(this.#desk.problems, reason, this.#tags.fault, line);
    return reason;
  }

  #insert(layer: number, aside: AsideReason | null, around: Surroundings): Reason | null {
    const { reader, problems, blockNames } = this.#desk;
    const tags = this.#tags;
    const { line, cut } = tags;
    const insert = readInsert(tags, blockNames);
    const { fault } = tags;
    this.#passAttributes();
    if (aside !== null) return aside;
    const refuse = (reason: Reason): Reason => {
      tellRefusal(problems, reason, fault, line);
      return reason;
    };
    if ('refused' in insert) return refuse(insert.refused ?? 'bad-size');
    if (cut && reader.cut) return refuse('cut-off');
    const block = this.#desk.blocks.get(insert.block);
    const name = block?.name ?? blockNames.names[insert.block] ?? '';
    const why = this.#blockTrouble(insert, block);
    if (why !== null) {
      const cycle = why === 'block-cycle' ? this.#desk.weights.get(insert.block)?.cycle : null;
      tellBlock(problems, why, cycle ? cycle.join(' → ') : name, line);
      return why;
    }
    const kept = block && block.entities > 0 ? this.#place(insert, block, layer, around) : 0;
    if (kept === 0) return 'empty-block';
    if (insert.lifted) tellKept(problems, drawn(true), line);
    return null;
  }

  #passAttributes(): void {
    const { reader } = this.#desk;
    while (reader.code === 0 && reader.is('ATTRIB')) this.#vertexTags.collect(reader);
    if (reader.code === 0 && reader.is('SEQEND')) this.#vertexTags.collect(reader);
  }

  #blockTrouble(insert: Insert, block: Block | undefined): Reason | null {
    const { weights, limits, census, placed } = this.#desk;
    if (block === undefined) return 'block-missing';
    if (block.external) return 'block-external';
    if (block.faultLine > 0) return 'not-a-number';
    const weight = weights.get(insert.block)!;
    if (weight.cycle !== null) return 'block-cycle';
    if (weight.nesting > limits.nesting) return 'block-too-deep';
    const times = insert.columns * insert.rows;
    const entities = census.total + placed.total + times * weight.entities;
    const bytes = this.#placedBytes + times * weight.bytes;
    return entities > limits.entities || bytes > limits.placedBytes ? 'block-bomb' : null;
  }

  /** Reads the block's contents as often as it is put there; how many entities were kept. */
  #place(insert: Insert, block: Block, layer: number, around: Surroundings): number {
    const { reader, pen, placed } = this.#desk;
    const back = reader.placeOfPair();
    const atEnd = reader.code !== 0;
    const { placement: own, column, row } = insert;
    const toBase: Placement = { a: 1, b: 0, c: 0, d: 1, e: -block.baseX, f: -block.baseY };
    let kept = 0;
    for (let r = 0; r < insert.rows; r++)
      for (let c = 0; c < insert.columns; c++) {
        const e = own.e + c * column[0] + r * row[0];
        const f = own.f + c * column[1] + r * row[1];
        const placement = placeWithin(around.placement, placeWithin({ ...own, e, f }, toBase));
        this.#placedBytes += block.bytes;
        pen.setBase(placement);
        reader.goTo(block.contents);
        reader.next();
        kept += this.readAll({ placement, layer, census: placed });
      }
    pen.setBase(around.placement);
    reader.goTo(back);
    // At the end of the file there is no pair to stand on again.
    if (atEnd) reader.code = -1;
    else reader.next();
    return kept;
  }
}
