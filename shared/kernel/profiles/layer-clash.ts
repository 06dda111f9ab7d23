import { DrawingRefused } from '../drawing/drawing-refused.ts';

/** A template gave two line sets one layer name. They are never merged. */
export class LayerClash extends DrawingRefused {
  readonly layer: string;
  readonly keys: readonly [string, string];

  constructor(layer: string, keys: readonly [string, string]) {
    super(
      `${keys[0]} and ${keys[1]} would both be on layer ${layer}; tell them apart with {face}, {set}, {cutter} or {depth}`,
    );
    this.name = 'LayerClash';
    this.layer = layer;
    this.keys = keys;
  }
}

/**
 * Throws a LayerClash when two line sets have the same name, whatever the case. Both faces are looked at together,
 * although they are two files, so that nothing runs together in a program that takes both into one drawing.
 */
export function refuseClash(names: readonly { readonly key: string; readonly name: string }[]): void {
  const seen = new Map<string, string>();
  for (const { key, name } of names) {
    const folded = name.toUpperCase();
    const other = seen.get(folded);
    if (other !== undefined) throw new LayerClash(name, [other, key]);
    seen.set(folded, key);
  }
}
