import { contourLength, pathLength } from '../contour/contour-length.ts';
import type { DrawingLayer } from '../drawing/drawing.ts';
import { lineSetKey, type CutterSide, type Face, type LineSet } from '../line-sets/line-set.ts';
import { formatLength } from '../units/format-length.ts';
import type { Unit } from '../units/unit.ts';
import type { WorkedFrame } from '../worked-frame.ts';
import { aciHex } from './aci-hex.ts';
import { cutterTag, type CutterGroup } from './cutter-groups.ts';
import { lineLook } from './line-look.ts';
import type { SheetCell, SheetTable } from './sheet-model.ts';

const SIDES: Record<CutterSide, string> = {
  inside: 'inside',
  outside: 'outside',
  on: 'on the line',
  waste: 'waste side',
  none: '–',
};
const MOST_PASSES = 6;

const COLUMNS: SheetTable['columns'] = [
  { key: 'order', heading: 'Order', align: 'left' },
  { key: 'layer', heading: 'Layer', align: 'left' },
  { key: 'colour', heading: 'Colour', align: 'left' },
  { key: 'cutter', heading: 'Cutter', align: 'left' },
  { key: 'side', heading: 'Runs', align: 'left' },
  { key: 'depth', heading: 'Depth', align: 'right' },
  { key: 'passes', heading: 'Passes to', align: 'right' },
  { key: 'count', heading: 'Count', align: 'right' },
  { key: 'length', heading: 'Length', align: 'right' },
];

const totalLength = (set: LineSet): number =>
  set.shapes.reduce((sum, s) => sum + (s.kind === 'contour' ? contourLength(s.contour) : pathLength(s.points)), 0);

function passesText(passes: readonly number[], unit: Unit): string {
  const texts = passes.map((p) => formatLength(p, unit));
  return texts.length <= MOST_PASSES
    ? texts.join(', ')
    : `${texts.length} passes: ${texts[0]}, ${texts[1]} … ${texts[texts.length - 1]}`;
}

/** "1", "2", "or 2" (the second of two layers that say one cut), "–" for what is not cut. */
function orders(sets: readonly LineSet[]): string[] {
  let order = 0;
  return sets.map((s, i) => {
    if (s.cutter === null) return '–';
    const alternative = s.set === 'OPENING_AXIS' && sets[i - 1]?.set === 'OPENING';
    if (!alternative) order += 1;
    return alternative ? `or ${order}` : String(order);
  });
}

/** The line sets that the files of `layers` hold for one face, in cutting order, as rows: what runs where, how deep, how often. */
export function lineSetTable(
  worked: WorkedFrame,
  face: Face,
  layers: ReadonlyMap<string, DrawingLayer>,
  groups: readonly CutterGroup[],
): SheetTable {
  const { unit } = worked.particulars;
  const sets = worked[face].lineSets.filter((s) => layers.has(lineSetKey(s)));
  const order = orders(sets);
  const rows = sets.map((set, i): SheetCell[] => {
    const layer = layers.get(lineSetKey(set))!;
    const look = lineLook(set.set);
    const length = totalLength(set);
    const climbs = set.shapes.some((s) => s.kind === 'climb');
    const side = set.set === 'DADO' ? 'inside, pocket' : set.cutter === null ? 'not cut' : SIDES[set.side];
    return [
      { text: order[i]!, bold: true, swatch: { kind: 'line', colour: look.colour, dashed: look.dash !== undefined } },
      { text: layer.name, bold: true },
      { text: String(layer.colour), value: layer.colour, swatch: { kind: 'layer', hex: aciHex(layer.colour) } },
      { text: set.cutter === null ? '–' : cutterTag(groups, set.cutter) },
      { text: side },
      {
        text: set.cutter === null ? '–' : `${formatLength(set.depth, unit)}${climbs ? ', climbs' : ''}`,
        value: set.depth,
      },
      { text: set.passes.length === 0 ? '–' : passesText(set.passes, unit) },
      { text: String(set.shapes.length), value: set.shapes.length },
      { text: formatLength(length, unit), value: length },
    ];
  });
  return { columns: COLUMNS, rows, whenEmpty: 'No lines on this face.' };
}
