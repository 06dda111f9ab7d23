import { contourLength, pathLength } from '#shared/kernel/contour/contour-length.ts';
import { describeCutter } from '#shared/kernel/cutters/describe-cutter.ts';
import type { Drawing, DrawingEntity } from '#shared/kernel/drawing/drawing.ts';
import { lineSetKey, type CutterSide, type Face, type LineSet } from '#shared/kernel/line-sets/line-set.ts';
import { carriedLineSets } from '#shared/kernel/profiles/carried-line-sets.ts';
import type { FileProfile } from '#shared/kernel/profiles/file-profile.ts';
import { nameLayers } from '#shared/kernel/profiles/name-layers.ts';
import { convertLength } from '#shared/kernel/units/convert-length.ts';
import type { WorkedFrame } from '#shared/kernel/worked-frame.ts';
import { csvLine } from './csv-line.ts';

const COLUMNS = ['face', 'layer', 'colour', 'cutter', 'side of line', 'depth', 'passes', 'entities', 'length', 'unit'];

const SIDES: Record<CutterSide, string> = {
  inside: 'inside',
  outside: 'outside',
  on: 'on the line',
  waste: 'waste side',
  none: 'not cut',
};

function cutterText(worked: WorkedFrame, { cutter: role }: LineSet): string {
  const cutter = role === null ? undefined : worked.particulars.cutters[role];
  if (cutter === undefined) return '';
  const number = cutter.number === undefined ? '' : `T${cutter.number} `;
  const name = cutter.name === undefined ? '' : `${cutter.name}: `;
  return `${number}${name}${describeCutter(cutter, worked.particulars.unit)}`;
}

const lengthOf = (e: DrawingEntity): number =>
  e.kind === 'polyline' ? contourLength(e) : e.kind === 'polyline3d' ? pathLength(e.points) : 0;

/** The layers of both files as CSV (RFC 4180, UTF-8), in cutting order; lengths and depths in the files' unit, passes with blanks between. */
export function layersCsv(
  worked: WorkedFrame,
  profile: FileProfile,
  drawings: Readonly<Record<Face, Drawing>>,
): string {
  const layers = nameLayers(worked, profile);
  const lines = [csvLine(COLUMNS)];
  for (const face of ['back', 'front'] as const) {
    const { unit, decimals, entities, layers: drawn } = drawings[face];
    const number = (value: number) => value.toFixed(decimals);
    const depth = (value: number) => number(convertLength(value, worked.particulars.unit, unit));
    const on = (layer: string) => entities.filter((e) => e.layer === layer);
    const seen = new Set<string>();
    for (const set of carriedLineSets(worked, face, profile)) {
      const { name, colour } = layers.get(lineSetKey(set))!;
      const lies = on(name);
      const length = number(lies.reduce((sum, e) => sum + lengthOf(e), 0));
      const deep = set.cutter === null ? '' : depth(set.depth);
      const cells = [
        face,
        name,
        String(colour),
        cutterText(worked, set),
        SIDES[set.side],
        deep,
        set.passes.map(depth).join(' '),
        String(lies.length),
        length,
        unit,
      ];
      lines.push(csvLine(cells));
      seen.add(name);
    }
    for (const { name, colour } of drawn.filter((l) => !seen.has(l.name))) {
      lines.push(csvLine([face, name, String(colour), '', 'text', '', '', String(on(name).length), '', unit]));
    }
  }
  return lines.join('');
}
