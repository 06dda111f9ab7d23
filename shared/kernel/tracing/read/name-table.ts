import { decodeText, type TextEncoding } from './decode-text.ts';

const SLOTS = 256;

/**
 * Names of a file as small numbers, counted from 0 in the order of their first coming, so that a layer or type that is
 * named 300,000 times is decoded once. Names are the same whatever their case, and keep the case they first came in.
 */
export class NameTable {
  readonly names: string[] = [];
  readonly #bytes: Uint8Array;
  readonly #encoding: TextEncoding;
  readonly #ids = new Map<string, number>();
  // The name last seen in each slot: where it lay, and its number. Another name of the same slot only puts it out.
  readonly #starts = new Int32Array(SLOTS).fill(-1);
  readonly #lengths = new Int32Array(SLOTS);
  readonly #slotIds = new Int32Array(SLOTS);

  constructor(bytes: Uint8Array, encoding: TextEncoding) {
    this.#bytes = bytes;
    this.#encoding = encoding;
  }

  /** The number of the name that lies there. */
  idAt(start: number, end: number): number {
    const bytes = this.#bytes;
    const length = end - start;
    let hash = length;
    for (let at = start; at < end; at++) hash = (hash * 31 + bytes[at]!) | 0;
    const slot = (hash ^ (hash >>> 8)) & (SLOTS - 1);
    if (this.#starts[slot]! >= 0 && this.#lengths[slot] === length) {
      const known = this.#starts[slot]!;
      let i = 0;
      while (i < length && bytes[known + i] === bytes[start + i]) i++;
      if (i === length) return this.#slotIds[slot]!;
    }
    const id = this.idOf(decodeText(bytes, start, end, this.#encoding));
    this.#starts[slot] = start;
    this.#lengths[slot] = length;
    this.#slotIds[slot] = id;
    return id;
  }

  idOf(name: string): number {
    const key = name.toUpperCase();
    let id = this.#ids.get(key);
    if (id === undefined) {
      id = this.names.length;
      this.#ids.set(key, id);
      this.names.push(name);
    }
    return id;
  }
}
