import type { Particulars } from '../kernel/particulars/particulars.ts';

// Order in which a person reads a frame file, for the keys of every level at once.
// prettier-ignore
const ORDER = [
  'format', 'name', 'unit', 'thickness', 'outline', 'edge', 'dados', 'setup', 'cutters', 'blank',
  'kind', 'width', 'height', 'stiles', 'rails', 'left', 'right', 'top', 'bottom', 'feet', 'layout',
  'columns', 'rows', 'between', 'label', 'arch',
  'part', 'runs', 'at', 'panel', 'clearance', 'depth', 'from', 'to', 'ends',
  'flip', 'allowance', 'trim', 'dado', 'squaring', 'spoilboard', 'opening', 'perimeter', 'openings', 'size',
  'style', 'sizeHeldAt', 'bead', 'radius', 'drop', 'quirk', 'corner',
  'number', 'diameter', 'includedAngle', 'tipRadius', 'sideAngle', 'profileRadius', 'tipFlat', 'fluteLength', 'maxPass',
];
const RANK = new Map(ORDER.map((key, i) => [key, i]));

const LONGEST_LINE = 100;

function entriesInOrder(value: object): [string, unknown][] {
  const rank = (key: string) => RANK.get(key) ?? ORDER.length;
  return Object.entries(value)
    .filter(([, v]) => v !== undefined)
    .sort(([a], [b]) => rank(a) - rank(b) || (a < b ? -1 : 1));
}

function write(value: unknown, indent: string, whole = false): string {
  if (value === null || typeof value !== 'object') {
    if (typeof value === 'number' && !Number.isFinite(value))
      throw new RangeError(`frame file: got the number ${value}, takes a finite one`);
    return JSON.stringify(value);
  }
  const deeper = `${indent}  `;
  const isList = Array.isArray(value);
  const parts = isList
    ? value.map((v) => write(v, deeper))
    : entriesInOrder(value).map(([k, v]) => `${JSON.stringify(k)}: ${write(v, deeper)}`);
  const [open, close, pad] = isList ? ['[', ']', ''] : ['{', '}', ' '];
  if (parts.length === 0) return `${open}${close}`;
  const line = `${open}${pad}${parts.join(', ')}${pad}${close}`;
  if (!whole && !line.includes('\n') && indent.length + line.length <= LONGEST_LINE) return line;
  return `${open}\n${parts.map((p) => deeper + p).join(',\n')}\n${indent}${close}`;
}

/**
 * The text of a frame file: the same particulars give the same text, in whatever order their keys come.
 * Read it with parseFrameFile. Throws for a number that is not finite.
 */
export const writeFrameFile = (particulars: Particulars): string => `${write(particulars, '', true)}\n`;
