import type { Particulars } from '#shared/kernel/particulars/particulars.ts';
import { readField } from '#shared/kernel/particulars/read-field.ts';

const NAMES: Readonly<Record<string, string>> = {
  '': 'the frame',
  name: 'Name of the frame',
  thickness: 'Board thickness',
  outline: 'Outline',
  'outline.width': 'Width',
  'outline.height': 'Height',
  'outline.stiles.left': 'Left stile',
  'outline.stiles.right': 'Right stile',
  'outline.rails.top': 'Top rail',
  'outline.rails.bottom': 'Bottom rail',
  'outline.feet': 'Feet',
  'outline.layout': 'Openings',
  'outline.squareOpenings': 'Openings with a square edge',
  edge: 'Edge of the openings',
  'edge.sizeHeldAt': 'Size held at',
  'edge.corners': 'Inside corners',
  'edge.bead': 'Bead',
  'edge.bead.radius': 'Bead radius',
  'edge.bead.drop': 'Bead below the face',
  'edge.bead.quirk': 'Quirk',
  dados: 'Box joints',
  'setup.flip': 'Turning over',
  'setup.allowance': 'Allowance',
  'setup.trim': 'Trim',
  'setup.squaring': 'Squaring edge',
  'setup.spoilboard': 'Into the spoilboard',
  blank: 'Board given',
  'blank.width': 'Board width',
  'blank.height': 'Board height',
};

const LAST_WORDS: Readonly<Record<string, string>> = {
  part: 'part',
  runs: 'runs',
  at: 'at',
  panel: 'panel',
  clearance: 'clearance',
  depth: 'depth',
  from: 'from',
  to: 'to',
  'ends.0': 'end at from',
  'ends.1': 'end at to',
  size: 'size',
  between: 'width between',
  'opening.label': 'label',
  'opening.arch': 'arch',
  'opening.edge': 'edge',
  kind: 'kind',
  diameter: 'diameter',
  includedAngle: 'included angle',
  tipRadius: 'tip radius',
  sideAngle: 'side angle',
  profileRadius: 'profile radius',
  tipFlat: 'tip flat',
  fluteLength: 'flute length',
  maxPass: 'deepest pass',
  name: 'name',
  number: 'place',
};

const ROLES: Readonly<Record<string, string>> = {
  dado: 'Dado cutter',
  squaring: 'Squaring cutter',
  opening: 'Opening cutter',
  perimeter: 'Perimeter cutter',
  bead: 'Bead cutter',
  quirk: 'Quirk cutter',
  corner: 'Corner cutter',
};

const withDetail = (thing: string, rest: string): string =>
  rest === '' ? thing : `${thing}, ${LAST_WORDS[rest] ?? rest}`;

/** "opening A", or for a divided part "column 2, row 1". */
function describePart(particulars: Particulars, field: string): string {
  const part = readField(particulars, field) as { opening?: { label?: string } } | undefined;
  if (part?.opening?.label) return `Opening ${part.opening.label}`;
  const steps = [...field.matchAll(/(columns|rows)\.(\d+)/g)].map(
    ([, kind, i]) => `${kind === 'columns' ? 'column' : 'row'} ${Number(i) + 1}`,
  );
  const words = steps.join(', ');
  return words === '' ? 'Openings' : words[0]!.toUpperCase() + words.slice(1);
}

/** What a person calls an entry: 'dados.0.depth' of the particulars → "Left end, depth". */
export function describeField(particulars: Particulars, path: string): string {
  const known = NAMES[path];
  if (known !== undefined) return known;
  const dado = /^dados\.(\d+)\.?(.*)$/.exec(path);
  if (dado) return withDetail(particulars.dados[Number(dado[1])]?.part ?? `Dado ${Number(dado[1]) + 1}`, dado[2]!);
  const cutter = /^cutters\.(\w+)\.?(.*)$/.exec(path);
  if (cutter) return withDetail(ROLES[cutter[1]!] ?? cutter[1]!, cutter[2]!);
  const part = /^(outline\.layout(?:\.(?:columns|rows)\.\d+)*)\.?(.*)$/.exec(path);
  if (part) return withDetail(describePart(particulars, part[1]!), part[2]!);
  return path;
}
