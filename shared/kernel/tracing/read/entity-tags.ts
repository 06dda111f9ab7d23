import { faceOf } from './entity-plane.ts';
import { parseNumber } from './parse-number.ts';
import { lineOf, type FilePlace, type PairRows, type TagReader } from './tag-reader.ts';

/** What is wrong with an entity's numbers: the first that was found. */
export interface Fault {
  readonly reason: 'not-a-number' | 'missing-number' | 'not-a-pair';
  readonly line: number;
  /** What stands there instead of a number. */
  readonly text: string;
}

/** No more of a wrong value is shown than this. */
const SHOWN = 40;

/**
 * The pairs of one entity, kept as places in the file and used again for the next one. Numbers are parsed when asked
 * for; the first that is none is kept as the fault, and what was asked for is NaN.
 */
export class EntityTags {
  fault: Fault | null = null;
  /** Line on which the entity's type stands. */
  line = 0;
  /** Place of the layer's name; empty when it has none. */
  layerStart = 0;
  layerEnd = 0;
  inPaperSpace = false;
  invisible = false;
  /** The file ended within this entity. */
  cut = false;
  #bytes: Uint8Array = new Uint8Array(0);
  /** Pairs of the extrusion, groups 210, 220 and 230; −1 where there is none. */
  #extrusion: [x: number, y: number, z: number] = [-1, -1, -1];
  #from: FilePlace = { at: 0, line: 0 };
  readonly #rows: PairRows = {
    count: 0,
    codes: new Int32Array(64),
    starts: new Int32Array(64),
    ends: new Int32Array(64),
  };

  get count(): number {
    return this.#rows.count;
  }

  get codes(): Int32Array {
    return this.#rows.codes;
  }

  /** Takes in the pairs behind the one that names the type, up to the next group 0, which the reader then stands on. */
  collect(reader: TagReader): void {
    this.#bytes = reader.bytes;
    this.#from = reader.place();
    this.fault = null;
    this.line = reader.line;
    this.layerStart = this.layerEnd = 0;
    this.inPaperSpace = this.invisible = false;
    reader.brokenLine = 0;
    const more = reader.readPairs(this.#rows);
    const { count, codes } = this.#rows;
    this.#extrusion[0] = this.#extrusion[1] = this.#extrusion[2] = -1;
    let paper = -1;
    let invisible = -1;
    for (let i = 0; i < count; i++) {
      const code = codes[i];
      if (code === 8) {
        this.layerStart = this.startOf(i);
        this.layerEnd = this.endOf(i);
      } else if (code === 67) paper = i;
      else if (code === 60) invisible = i;
      else if (code === 210) this.#extrusion[0] = i;
      else if (code === 220) this.#extrusion[1] = i;
      else if (code === 230) this.#extrusion[2] = i;
    }
    this.cut = !more;
    if (!more) reader.code = -1;
    // A line that is no group code may have been a coordinate's.
    if (reader.brokenLine > 0) this.fault = { reason: 'not-a-pair', line: reader.brokenLine, text: '' };
    if (paper >= 0) this.inPaperSpace = this.whole(paper) === 1;
    if (invisible >= 0) this.invisible = this.whole(invisible) === 1;
  }

  /** The number that is the value of pair i. */
  number(i: number): number {
    const value = parseNumber(this.#bytes, this.#rows.starts[i]!, this.#rows.ends[i]!);
    if (value !== value) this.#setFault('not-a-number', i);
    return value;
  }

  /** The whole number that is the value of pair i, such as a flag or a count. */
  whole(i: number): number {
    const value = this.number(i);
    if (value === value && (!Number.isInteger(value) || Math.abs(value) > 2 ** 31)) {
      this.#setFault('not-a-number', i);
      return NaN;
    }
    return value;
  }

  /** Which way the entity's extrusion points: up where none is given (DXF Reference, groups 210, 220, 230). */
  facing(): 'up' | 'down' | 'tilted' {
    const [x, y, z] = this.#extrusion;
    if (x < 0 && y < 0 && z < 0) return 'up';
    return faceOf(x < 0 ? 0 : this.number(x), y < 0 ? 0 : this.number(y), z < 0 ? 1 : this.number(z));
  }

  /** Where the value of pair i lies. */
  startOf(i: number): number {
    return this.#rows.starts[i]!;
  }

  endOf(i: number): number {
    return this.#rows.ends[i]!;
  }

  /** Notes a fault when one of the numbers that the entity cannot do without never came. */
  need(...numbers: readonly number[]): void {
    if (this.fault !== null) return;
    for (const value of numbers)
      if (value !== value) {
        this.fault = { reason: 'missing-number', line: this.line, text: '' };
        return;
      }
  }

  #setFault(reason: 'not-a-number', i: number): void {
    if (this.fault !== null) return;
    let text = '';
    const end = Math.min(this.#rows.ends[i]!, this.#rows.starts[i]! + SHOWN);
    for (let at = this.#rows.starts[i]!; at < end; at++) {
      const byte = this.#bytes[at]!;
      text += byte >= 32 && byte < 127 ? String.fromCharCode(byte) : '?';
    }
    this.fault = { reason, line: lineOf(this.#bytes, this.startOf(i), this.#from), text };
  }
}
