import { DrawingRefused } from '../drawing/drawing-refused.ts';
import type { Face } from '../line-sets/line-set.ts';
import type { Unit } from '../units/unit.ts';

/** {depth}: thousandths of an inch or hundredths of a millimetre, at least four digits. 0.25 in is "0250", 6.35 mm "0635". */
export const depthDigits = (depth: number, unit: Unit): string =>
  String(Math.round(depth * (unit === 'in' ? 1000 : 100))).padStart(4, '0');

/** What a layer template may hold in braces. */
export const LAYER_TOKENS = ['face', 'set', 'cutter', 'depth'] as const;
const KNOWN = new RegExp(`\\{(${LAYER_TOKENS.join('|')})\\}`, 'g');
type LayerToken = (typeof LAYER_TOKENS)[number];

/** Gives BACK_DADO, FRONT_OPENING_AXIS, BACK_DADO_D0250 … */
export const DEFAULT_LAYER_TEMPLATE = '{face}_{set}';

/** R12 takes no longer layer names (DXF Reference, release 12). */
export const LONGEST_LAYER_NAME = 31;

// "0" is every drawing's own layer, on which nothing of ours may lie; DEFPOINTS is not plotted by most programs.
const TAKEN_NAMES = ['0', 'DEFPOINTS'];

/** Values for one line set. */
export interface LayerTokenValues {
  readonly face: Face;
  /** Set name with its variant, such as DADO_D0250. */
  readonly set: string;
  /** The cutter's name, its number, or its task. */
  readonly cutter: string;
  /** Digits of the depth; see depthDigits. */
  readonly depth: string;
}

/** Letters with marks lose them, everything else outside `[A-Z0-9_-]` becomes "_"; at most 31 characters. */
function cleanLayerName(text: string): string {
  // Names are made while a person types, and nearly all are plain already.
  const plain = /^[ -~]*$/.test(text) ? text : text.normalize('NFKD').replace(/\p{M}/gu, '');
  return plain
    .toUpperCase()
    .replace(/[^A-Z0-9_-]+/g, '_')
    .replace(/^[_-]+/, '')
    .slice(0, LONGEST_LAYER_NAME)
    .replace(/[_-]+$/, '');
}

/** Tokens of a template that are not known, and braces without a partner. Empty when all is well. */
export function strayTokens(template: string): string[] {
  return template.replace(KNOWN, '').match(/\{[^{}]*\}|[{}]/g) ?? [];
}

/**
 * The layer name that a template gives for one line set: `[A-Z0-9_-]`, at most 31 characters.
 * Throws DrawingRefused for an unknown token, and when nothing is left or the name is one that drawings keep for themselves.
 */
export function layerName(template: string, values: LayerTokenValues): string {
  const stray = strayTokens(template);
  if (stray.length > 0)
    throw new DrawingRefused(
      `layer template "${template}" has ${stray.join(', ')}; takes {face}, {set}, {cutter} and {depth}`,
    );
  const name = cleanLayerName(template.replace(/\{(\w+)\}/g, (_, token: LayerToken) => values[token]));
  if (name === '' || TAKEN_NAMES.includes(name)) {
    throw new DrawingRefused(
      `layer template "${template}" gives the name "${name}"; takes one that is not empty, "0" or "DEFPOINTS"`,
    );
  }
  return name;
}
