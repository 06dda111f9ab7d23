const LF = 10;
const CR = 13;
const SPACE = 32;
const MINUS = 45;
const ZERO = 48;
/** Comments (DXF Reference, group 999). */
const COMMENT = 999;

/** Pairs in a row: their codes, and where their values lie. */
export interface PairRows {
  count: number;
  codes: Int32Array;
  starts: Int32Array;
  ends: Int32Array;
}

export function growRows(rows: PairRows): void {
  const wider = (old: Int32Array) => {
    const next = new Int32Array(old.length * 2);
    next.set(old);
    return next;
  };
  rows.codes = wider(rows.codes);
  rows.starts = wider(rows.starts);
  rows.ends = wider(rows.ends);
}

/** A place in a file from which reading can go on. */
export interface FilePlace {
  readonly at: number;
  readonly line: number;
}

/** Right behind the end of a line that stands at a place: LF, CR, CR LF or CR CR LF. */
function behindLineEnd(bytes: Uint8Array, at: number): number {
  if (bytes[at] !== CR) return at + 1;
  if (bytes[at + 1] === LF) return at + 2;
  return bytes[at + 1] === CR && bytes[at + 2] === LF ? at + 3 : at + 1;
}

/** The line of a place in the file, counted from 1, by the line ends between it and a place before it. */
export function lineOf(bytes: Uint8Array, place: number, before: FilePlace): number {
  let { line } = before;
  for (let { at } = before; at < place;) {
    if (bytes[at] === LF || bytes[at] === CR) {
      line++;
      at = behindLineEnd(bytes, at);
    } else at++;
  }
  return line + 1;
}

/**
 * Reads a DXF's pairs of lines, a group code and its value, straight from its bytes. Lines end with LF, CR, CR LF or
 * CR CR LF, mixed as they come; space about codes and values does not count. A line that should be a group code and is
 * none is passed over by itself, so that reading falls into step again; an empty one does no harm, any other is told.
 */
export class TagReader {
  readonly bytes: Uint8Array;
  /** The pair that was read last: its code, where its value lies, and the value's line, counted from 1. */
  code = -1;
  start = 0;
  end = 0;
  line = 0;
  /** The first line since then that should have been a group code and was none; 0 when all were. Whoever asks sets it back. */
  brokenLine = 0;
  /** The file ended within the last pair, or right behind its value without a line's end. */
  cut = false;
  #at = 0;
  #line = 0;
  #pairAt = 0;
  #pairLine = 0;

  /** Up to here a line's end lies ahead, with a byte behind it. */
  readonly #safe: number;

  constructor(bytes: Uint8Array) {
    this.bytes = bytes;
    let safe = bytes.length - 2;
    while (safe >= 0 && bytes[safe] !== LF && bytes[safe] !== CR) safe--;
    this.#safe = safe;
    // Byte order mark of UTF-8.
    if (bytes[0] === 0xef && bytes[1] === 0xbb && bytes[2] === 0xbf) this.#at = 3;
  }

  /** Right behind the pair that was read last. */
  place(): FilePlace {
    return { at: this.#at, line: this.#line };
  }

  /** Right before the pair that was read last. */
  placeOfPair(): FilePlace {
    return { at: this.#pairAt, line: this.#pairLine };
  }

  goTo(place: FilePlace): void {
    this.#at = place.at;
    this.#line = place.line;
    this.code = -1;
  }

  /** Reads the next pair; false at the end of the file. */
  next(): boolean {
    const { bytes } = this;
    const size = bytes.length;
    for (;;) {
      if (this.#at >= size) return false;
      this.#pairAt = this.#at;
      this.#pairLine = this.#line;
      const code = this.#readCode();
      if (code === -1) continue;
      if (this.#at >= size) {
        this.cut = true;
        return false;
      }
      this.code = code;
      this.#readValue();
      if (code !== COMMENT) return true;
    }
  }

  /**
   * Reads pairs into the rows up to the next group 0, on which it then stands; false at the end of the file. Pairs as
   * nearly all files have them, ended by LF or CR LF, are read right here, the others by next().
   */
  readPairs(rows: PairRows): boolean {
    const { bytes } = this;
    const safe = this.#safe;
    let { codes, starts, ends } = rows;
    let count = 0;
    let at = this.#at;
    let line = this.#line;
    for (;;) {
      const pairAt = at;
      let code = -1;
      let start = 0;
      let end = 0;
      if (at < safe) {
        let byte = bytes[at]!;
        while (byte === SPACE) byte = bytes[++at]!;
        const first = at;
        let number = 0;
        while (byte >= ZERO && byte <= 57 && at - first < 6) {
          number = number * 10 + byte - ZERO;
          byte = bytes[++at]!;
        }
        const digits = at - first;
        if (byte === CR && bytes[at + 1] === LF) byte = bytes[++at]!;
        if (byte === LF && digits > 0 && at < safe) {
          start = ++at;
          // Control letters and line ends stop it; a line end is never further than `safe`.
          while (bytes[at]! >= SPACE) at++;
          end = at;
          byte = bytes[at]!;
          if (byte === CR && bytes[at + 1] === LF) byte = bytes[++at]!;
          if (byte === LF) {
            at++;
            code = number;
            while (end > start && bytes[end - 1] === SPACE) end--;
            while (start < end && bytes[start] === SPACE) start++;
          }
        }
      }
      if (code < 0) {
        this.#at = pairAt;
        this.#line = line;
        const more = this.next();
        if (!more) {
          rows.count = count;
          return false;
        }
        ({ code, start, end } = this);
        at = this.#at;
        line = this.#line;
        if (code === 0) {
          rows.count = count;
          return true;
        }
      } else {
        line += 2;
        if (code === 0) {
          this.code = 0;
          this.start = start;
          this.end = end;
          this.line = line;
          this.#at = at;
          this.#line = line;
          this.#pairAt = pairAt;
          this.#pairLine = line - 2;
          rows.count = count;
          return true;
        }
        if (code === COMMENT) continue;
      }
      if (count === codes.length) {
        growRows(rows);
        ({ codes, starts, ends } = rows);
      }
      codes[count] = code;
      starts[count] = start;
      ends[count] = end;
      count++;
    }
  }

  /** The group code on this line; -1 when it is none. */
  #readCode(): number {
    const { bytes } = this;
    const size = bytes.length;
    let at = this.#at;
    while (at < size && bytes[at]! <= SPACE && bytes[at] !== LF && bytes[at] !== CR) at++;
    const first = at;
    let negative = false;
    if (bytes[at] === MINUS) {
      negative = true;
      at++;
    }
    const digits = at;
    let code = 0;
    while (at < size && bytes[at]! >= ZERO && bytes[at]! <= 57 && at - digits < 6)
      code = code * 10 + bytes[at++]! - ZERO;
    const isNumber = at > digits;
    while (at < size && bytes[at]! <= SPACE && bytes[at] !== LF && bytes[at] !== CR) at++;
    const ends = at >= size || bytes[at] === LF || bytes[at] === CR;
    if (!ends) while (at < size && bytes[at] !== LF && bytes[at] !== CR) at++;
    this.#pass(at);
    if (isNumber && ends) return negative ? -2 : code;
    if (at > first && this.brokenLine === 0) this.brokenLine = this.#line;
    return -1;
  }

  #readValue(): void {
    const { bytes } = this;
    const size = bytes.length;
    let at = this.#at;
    while (at < size && bytes[at]! <= SPACE && bytes[at] !== LF && bytes[at] !== CR) at++;
    this.start = at;
    while (at < size && bytes[at] !== LF && bytes[at] !== CR) at++;
    if (at >= size) this.cut = true;
    let end = at;
    while (end > this.start && bytes[end - 1]! <= SPACE) end--;
    this.end = end;
    this.#pass(at);
    this.line = this.#line;
  }

  /** Goes past the end of the line that stands at `at`. */
  #pass(at: number): void {
    this.#line++;
    this.#at = behindLineEnd(this.bytes, at);
  }

  /** Whether the last value is this text, in capitals or not. */
  is(text: string): boolean {
    const { bytes, start } = this;
    if (this.end - start !== text.length) return false;
    for (let i = 0; i < text.length; i++) {
      let byte = bytes[start + i]!;
      if (byte >= 97 && byte <= 122) byte -= 32;
      if (byte !== text.charCodeAt(i)) return false;
    }
    return true;
  }
}
