/** A pair of a DXF: group code and value, as they stand on two lines. */
export type DxfPair = readonly [code: number, value: string | number];

const lines = (pairs: readonly DxfPair[]): string => pairs.map(([code, value]) => `${code}\n${value}\n`).join('');

/** One entity: its type, then its pairs. */
export const entity = (type: string, ...pairs: readonly DxfPair[]): string => lines([[0, type], ...pairs]);

interface DxfParts {
  readonly header?: readonly DxfPair[];
  readonly tables?: string;
  readonly blocks?: string;
  readonly entities?: string;
  /** What stands in the place of the end mark. */
  readonly end?: string;
}

const section = (name: string, contents: string | undefined): string =>
  contents === undefined ? '' : `0\nSECTION\n2\n${name}\n${contents}0\nENDSEC\n`;

/** The text of a DXF that says millimetres, with the sections named and nothing else. */
export const dxfText = ({ header = MILLIMETRES, tables, blocks, entities = '', end = '0\nEOF\n' }: DxfParts): string =>
  section('HEADER', lines(header)) +
  section('TABLES', tables) +
  section('BLOCKS', blocks) +
  section('ENTITIES', entities) +
  end;

export const MILLIMETRES: readonly DxfPair[] = [
  [9, '$INSUNITS'],
  [70, 4],
];

export const layer = (name: string, flags: number, colour: number): string =>
  entity('LAYER', [2, name], [70, flags], [62, colour]);

export const layerTable = (...layers: readonly string[]): string =>
  lines([
    [0, 'TABLE'],
    [2, 'LAYER'],
    [70, layers.length],
  ]) +
  layers.join('') +
  lines([[0, 'ENDTAB']]);

export const block = (name: string, contents: string, x = 0, y = 0, flags = 0): string =>
  entity('BLOCK', [8, '0'], [2, name], [70, flags], [10, x], [20, y], [30, 0], [3, name]) + contents + entity('ENDBLK');

export const insert = (name: string, x: number, y: number, ...more: readonly DxfPair[]): string =>
  entity('INSERT', [8, '0'], [2, name], [10, x], [20, y], ...more);

export const line = (x0: number, y0: number, x1: number, y1: number, ...more: readonly DxfPair[]): string =>
  entity('LINE', [10, x0], [20, y0], [11, x1], [21, y1], ...more);

export const circle = (x: number, y: number, radius: number, ...more: readonly DxfPair[]): string =>
  entity('CIRCLE', [10, x], [20, y], [40, radius], ...more);

/** Extrusion straight down: what is drawn is seen from below. */
export const FROM_BELOW: readonly DxfPair[] = [
  [210, 0],
  [220, 0],
  [230, -1],
];

export const bytesOf = (text: string): Uint8Array => new TextEncoder().encode(text);
/** One byte a letter, as in files of before UTF-8. */
export const latinBytes = (text: string): Uint8Array => Uint8Array.from(text, (letter) => letter.charCodeAt(0));
