import { STRAIGHT_BULGE } from '../../tolerances.ts';
import { MM_PER_INCH, type Unit } from '../../units/unit.ts';
import type { FoundDrawing } from '../found-drawing.ts';
import { CurveSink } from './curve-sink.ts';
import { DrawingPen } from './drawing-pen.ts';
import { DrawingTooBig } from './drawing-too-big.ts';
import { EntityCensus } from './entity-census.ts';
import { EntityReader } from './entity-reader.ts';
import { EntityTags } from './entity-tags.ts';
import { findUnit } from './find-unit.ts';
import { indexBlocks } from './index-blocks.ts';
import { NameTable } from './name-table.ts';
import { AS_DRAWN } from './placement.ts';
import { ProblemList } from './problem-list.ts';
import { namedLayers } from './named-layers.ts';
import { readHeader } from './read-header.ts';
import { readLayers } from './read-layers.ts';
import { READ_LIMITS, type ReadLimits } from './read-limits.ts';
import { unitChord } from './read-tolerances.ts';
import { scanSections } from './scan-sections.ts';
import { TagReader } from './tag-reader.ts';
import { weighBlocks } from './weigh-blocks.ts';
import type { Include } from './why-hidden.ts';

export interface ReadOptions {
  readonly include?: Include;
  /** Layers, by name whatever its case, whose entities are set aside. */
  readonly leaveOut?: readonly string[];
  /**
   * How far lines and arcs may lie from an ellipse or spline, in drawing units. Where it is not given: 0.01 mm when the
   * file says its unit, otherwise a 100,000th of the curve's own size (the larger extent of its control points), which
   * is 0.01 mm for a curve one metre long.
   */
  readonly chordTolerance?: number;
  readonly limits?: Partial<ReadLimits>;
}

/** A line with handle, owner and subclass marks takes about so many bytes. */
const BYTES_A_SEGMENT = 128;

/**
 * Reads a DXF that somebody else wrote, of whatever version, as far as it can be read: what an entity came to stands in
 * the census, what is wrong with the file among the problems, and nothing but a drawing beyond the limits throws
 * (DrawingTooBig). Time and memory grow with the file, not with the counts that it claims.
 */
export function readDrawing(bytes: Uint8Array, options: ReadOptions = {}): FoundDrawing {
  const { chordTolerance } = options;
  if (chordTolerance !== undefined && !(chordTolerance > STRAIGHT_BULGE && chordTolerance < Infinity))
    throw new RangeError(`chordTolerance: got ${chordTolerance}, takes a length above 0`);
  const limits: ReadLimits = { ...READ_LIMITS, ...options.limits };
  if (bytes.length > limits.bytes)
    throw new DrawingTooBig(
      'too-many-bytes',
      `This file has ${(bytes.length / 2 ** 20).toFixed(1)} MB; at most ${limits.bytes / 2 ** 20} MB are read. Export what belongs to the frame only.`,
    );
  // Nearly every file has its entities behind what they need; then one way through it is enough.
  return readOnce(bytes, options, limits, 'entities') ?? readOnce(bytes, options, limits, 'end')!;
}

/** Reads what the sections up to there say; null when more of them come behind the first entities. */
function readOnce(
  bytes: Uint8Array,
  { include = {}, leaveOut = [], chordTolerance }: ReadOptions,
  limits: ReadLimits,
  to: 'entities' | 'end',
): FoundDrawing | null {
  const reader = new TagReader(bytes);
  const problems = new ProblemList();
  const sections = scanSections(reader, to);
  const header = readHeader(reader, sections.header);
  const { unit, problem } = findUnit(header);
  if (problem) problems.add(problem.code, problem.message);
  if (header.unknownCodePage !== null)
    problems.add(
      'code-page-unknown',
      `Names are in code page ${header.unknownCodePage}, which is read as Windows-1252.`,
    );

  const tags = new EntityTags();
  const layers = new NameTable(bytes, header.encoding);
  const blockNames = new NameTable(bytes, header.encoding);
  const shown = readLayers(reader, sections.tables, tags, layers, problems);
  const states = { ...shown, leftOut: namedLayers(layers, leaveOut) };
  const blocks = indexBlocks(reader, sections.blocks, tags, blockNames, problems, limits.entities);
  const sink = new CurveSink(limits, bytes.length / BYTES_A_SEGMENT);
  const types = new NameTable(bytes, header.encoding);
  const census = new EntityCensus();
  const placed = new EntityCensus();
  const chord = chordTolerance ?? (unit === null ? null : unitChord(unit));
  const entities = new EntityReader({
    reader,
    sink,
    pen: new DrawingPen(sink, chord, AS_DRAWN),
    problems,
    types,
    layers,
    blockNames,
    states,
    blocks,
    weights: weighBlocks(blocks),
    include,
    limits,
    within: chord === null ? 'a 100,000th of their own size' : sayLength(chord, unit),
    census,
    placed,
  });
  for (const place of sections.entities) {
    reader.goTo(place);
    if (reader.next()) entities.readAll({ placement: AS_DRAWN, layer: -1, census });
  }
  let { ended } = sections;
  if (to === 'entities' && sections.entities.length > 0) {
    const behind = scanSections(reader, 'end');
    if ([behind.header, behind.tables, behind.blocks, behind.entities].some((places) => places.length > 0)) return null;
    ended = behind.ended;
  }
  if (sections.entities.length === 0)
    problems.add('no-entities', 'The file has no ENTITIES section: nothing is drawn in it.');
  if (!ended)
    problems.add('incomplete', 'The file ends without its end mark (EOF): part of the drawing may be missing.');
  return {
    unit,
    curves: sink.curves(),
    census: census.rows(types.names, layers.names),
    placed: placed.rows(types.names, layers.names),
    problems: problems.list(),
    incomplete: !ended,
  };
}

/** A tolerance as a person reads it: in millimetres, where the unit is known. */
const sayLength = (length: number, unit: Unit | null): string =>
  unit === null
    ? `${Number(length.toPrecision(3))} drawing units`
    : `${Number((unit === 'in' ? length * MM_PER_INCH : length).toPrecision(3))} mm`;
