import type { Extents } from '../contour/contour.ts';
import { CHARACTER_WIDTH, type PaperShape } from './paper-picture.ts';
import { pointOnPaper, type OnPaper } from './paper-shapes.ts';
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
  const clear = keepClear.map((e) => boxOnPaper(to, (e.minX + e.maxX) / 2, (e.minY + e.maxY) / 2, (e.maxX - e.minX) * to.scale, (e.maxY - e.minY) * to.scale));
  return labels.flatMap((label) => {
    for (const [i, text] of label.texts.entries())
      for (const size of i === label.texts.length - 1 ? [...SIZES, LEAST_SIZE] : SIZES)
        for (const spot of label.spots) {
          const lines = text.split('\n');
          const long = Math.max(...lines.map(countCharacters)) * CHARACTER_WIDTH * size + 2 * MARGIN;
          const high = lines.length * size * LINE;
          const [width, height] = spot.turned ? [high, long] : [long, high];
          if (width > spot.width * to.scale || height > spot.height * to.scale) continue;
          const area = boxOnPaper(to, spot.middle.x, spot.middle.y, width, height);
          if (taken.some((t) => overlaps(t, area)) || (!spot.onFeature && clear.some((c) => overlaps(c, area)))) continue;
          taken.push(area);
          return drawLabel(label, lines, size, spot, to);
        }
    return [];
  });
}

function boxOnPaper(to: OnPaper, x: number, y: number, width: number, height: number): Extents {
  const middle = pointOnPaper(to, { x, y });
  return { minX: middle.x - width / 2, maxX: middle.x + width / 2, minY: middle.y - height / 2, maxY: middle.y + height / 2 };
}

function drawLabel(label: Label, lines: readonly string[], size: number, spot: LabelSpot, to: OnPaper): PaperShape[] {
  const middle = pointOnPaper(to, spot.middle);
  return lines.map((text, i) => {
    const off = (i - (lines.length - 1) / 2) * size * LINE + 0.365 * size;
    const place = spot.turned ? { x: middle.x + off, y: middle.y } : { x: middle.x, y: middle.y + off };
    return { kind: 'text', text, ...place, size, anchor: 'middle', turned: spot.turned ?? false, bold: label.bold ?? false, colour: label.colour, of: label.of };
  });
}
