import { LINE_DASH, LINE_WEIGHT, type PaperPicture, type PaperShape } from './paper-picture.ts';
import { SHEET_COLOURS } from './sheet-colours.ts';
import type { LineLook } from './sheet-drawing.ts';

const escape = (text: string) => text.replace(/[&<>"']/g, (c) => `&#${c.codePointAt(0)};`);

const attributes = (values: Record<string, string | number | undefined>): string =>
  Object.entries(values)
    .filter(([, value]) => value !== undefined)
    .map(([name, value]) => ` ${name}="${escape(String(value))}"`)
    .join('');

const strokeOf = (line: LineLook | undefined) =>
  line
    ? {
        stroke: SHEET_COLOURS[line.colour],
        'stroke-width': LINE_WEIGHT[line.weight],
        'stroke-dasharray': line.dash && LINE_DASH[line.dash].join(' '),
        'stroke-linejoin': 'round',
      }
    : {};

function shapeSvg(shape: PaperShape): string {
  const of = shape.of?.length ? shape.of.join(' ') : undefined;
  if (shape.kind === 'path') {
    const fill = shape.fill ? SHEET_COLOURS[shape.fill] : 'none';
    return `<path${attributes({ d: shape.d, fill, ...strokeOf(shape.line), 'data-of': of, 'data-set': shape.set || undefined })}/>`;
  }
  const { x, y } = shape;
  return `<text${attributes({
    x,
    y,
    'font-size': shape.size,
    'font-weight': shape.bold ? 700 : undefined,
    'text-anchor': shape.anchor === 'start' ? undefined : shape.anchor,
    fill: SHEET_COLOURS[shape.colour],
    transform: shape.turned ? `rotate(-90 ${x} ${y})` : undefined,
    'data-of': of,
  })}>${escape(shape.text)}</text>`;
}

/**
 * A picture as one SVG element: presentation attributes only, no style attribute, so that it stands under
 * `style-src 'self'`. The view box is in paper millimetres; features and line sets are named in data-of and data-set.
 */
export function pictureSvg(picture: PaperPicture): string {
  const head = attributes({
    xmlns: 'http://www.w3.org/2000/svg',
    viewBox: `0 0 ${picture.width} ${picture.height}`,
    role: 'img',
    'aria-label': picture.description,
    'font-family': 'JetBrains Mono, monospace',
  });
  return `<svg${head}>${picture.shapes.map(shapeSvg).join('')}</svg>`;
}
