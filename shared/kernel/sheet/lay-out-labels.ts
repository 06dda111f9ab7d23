import type { Extents } from '../contour/contour.ts';
import { CHARACTER_WIDTH, type PaperShape } from './paper-picture.ts';
import { box, pointOnPaper, type OnPaper } from './paper-shapes.ts';
import type { DrawingItem, LabelSpot } from './sheet-drawing.ts';
import { countCharacters } from './wrap-text.ts';

type Label = Extract<DrawingItem, { kind: 'label' }>;

/** Heights tried, in millimetres on paper; the least is for the shortest wording alone. */
const SIZES = [2.8, 2.4, 2.1];
const LEAST_SIZE = 1.7;
const LINE = 1.25;
const MARGIN = 0.5;

const overlaps = (a: Extents, b: Extents) => a.minX < b.maxX && b.minX < a.maxX && a.minY < b.maxY && b.minY < a.maxY;

/**
 * Words where there is room for them: each label takes the first wording, size and spot that fits, touching neither
 * another label nor a place to keep clear. A label that fits nowhere is left out; tables carry every word.
 */
export function layOutLabels(labels: readonly Label[], keepClear: readonly Extents[], to: OnPaper): PaperShape[] {
  const taken: Extents[] = [];
  const clear = keepClear.map((e) => areaOnPaper(to, e));
  const isFree = (place: Extents, onFeature: boolean) =>
    !taken.some((t) => overlaps(t, place)) && (onFeature || !clear.some((c) => overlaps(c, place)));
  return labels.flatMap((label) => {
    for (const [lines, size, spot] of choices(label)) {
      const place = boxIn(areaOnPaper(to, spot.area), lines, size, spot);
      if (!place || !isFree(place, spot.onFeature === true)) continue;
      taken.push(place);
      return [...groundUnder(label, spot, place), ...drawLabel(label, lines, size, spot, place)];
    }
    return [];
  });
}

/** Wordings, each at every size and spot, best first. */
function* choices(label: Label): Generator<[readonly string[], number, LabelSpot]> {
  for (const [i, text] of label.texts.entries())
    for (const size of i === label.texts.length - 1 ? [...SIZES, LEAST_SIZE] : SIZES)
      for (const spot of label.spots) yield [text.split('\n'), size, spot];
}

function areaOnPaper(to: OnPaper, e: Extents): Extents {
  const low = pointOnPaper(to, { x: e.minX, y: e.minY });
  const high = pointOnPaper(to, { x: e.maxX, y: e.maxY });
  return { minX: low.x, maxX: high.x, minY: high.y, maxY: low.y };
}

/** The words' box on paper within an area, or undefined when they do not fit. */
function boxIn(
  area: Extents,
  lines: readonly string[],
  size: number,
  { turned, close }: LabelSpot,
): Extents | undefined {
  const long = Math.max(...lines.map(countCharacters)) * CHARACTER_WIDTH * size + 2 * MARGIN;
  const high = lines.length * size * LINE;
  const [width, height] = turned ? [high, long] : [long, high];
  if (width > area.maxX - area.minX || height > area.maxY - area.minY) return undefined;
  const left =
    close === 'left' ? area.minX : close === 'right' ? area.maxX - width : (area.minX + area.maxX - width) / 2;
  const top =
    close === 'top' ? area.minY : close === 'bottom' ? area.maxY - height : (area.minY + area.maxY - height) / 2;
  return { minX: left, maxX: left + width, minY: top, maxY: top + height };
}

function groundUnder(label: Label, spot: LabelSpot, area: Extents): PaperShape[] {
  if (!label.ground || spot.onFeature) return [];
  const inset = 0.2;
  return [
    box(area.minX + inset, area.minY + inset, area.maxX - area.minX - 2 * inset, area.maxY - area.minY - 2 * inset, {
      fill: label.ground,
    }),
  ];
}

function drawLabel(label: Label, lines: readonly string[], size: number, spot: LabelSpot, area: Extents): PaperShape[] {
  const middle = { x: (area.minX + area.maxX) / 2, y: (area.minY + area.maxY) / 2 };
  return lines.map((text, i) => {
    const off = (i - (lines.length - 1) / 2) * size * LINE + 0.365 * size;
    const base = spot.turned ? { x: middle.x + off, y: middle.y } : { x: middle.x, y: middle.y + off };
    return {
      kind: 'text',
      text,
      ...base,
      size,
      anchor: 'middle',
      turned: spot.turned ?? false,
      bold: label.bold ?? false,
      colour: label.colour,
      of: label.of,
    };
  });
}
