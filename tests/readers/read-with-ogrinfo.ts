import { runReader } from './run-reader.ts';

/** A feature as GDAL sees it: arcs broken into chords. */
export interface OgrFeature {
  readonly layer: string;
  /** Well-known text, such as LINESTRING or POLYGON. */
  readonly kind: string;
  readonly points: readonly (readonly number[])[];
}

/** Reads a DXF with GDAL's ogrinfo. */
export function readWithOgrinfo(path: string): OgrFeature[] {
  const features = runReader('ogrinfo', ['-ro', '-al', '-geom=YES', path]).split('\nOGRFeature(').slice(1);
  return features.map((text) => {
    const layer = /^\s*Layer \(String\) = (.*)$/m.exec(text)?.[1] ?? '';
    const [, kind = '', places = ''] = /^\s*([A-Z]+)(?: Z)? (\(.*\))$/m.exec(text) ?? [];
    const points = places
      .replace(/[()]/g, '')
      .split(',')
      .map((p) => p.trim().split(/\s+/).map(Number));
    return { layer, kind, points };
  });
}
