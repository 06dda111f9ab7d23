import { parseString, toPolylines } from 'dxf';

/** A line as npm's dxf sees it: arcs broken into chords. */
export interface DxfLine {
  readonly layer: string;
  readonly points: readonly (readonly number[])[];
}

/** Reads a DXF with npm's dxf package. Throws when it finds no entities. */
export function readWithDxf(text: string): { readonly types: readonly string[]; readonly lines: readonly DxfLine[] } {
  const file = parseString(text);
  if (file.entities.length === 0) throw new Error('npm dxf finds no entities');
  const types = file.entities.map((e) => e.type);
  const lines = toPolylines(file).polylines.map(({ layer, vertices }) => ({
    layer: layer?.name ?? '',
    points: vertices,
  }));
  return { types, lines };
}
