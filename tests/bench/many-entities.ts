import { layerTable, layer, dxfText } from '../shared/kernel/tracing/read/dxf-text.ts';

/** Numbers as CAD programs write them: mostly short, some with all digits that a double has. */
const place = (i: number, step: number): string => ((i * step) % 5000).toFixed(i % 4 === 0 ? 14 : 6);

const common = (type: string, i: number): string =>
  `  0\r\n${type}\r\n  5\r\n${(0x100 + i).toString(16).toUpperCase()}\r\n330\r\n1F\r\n100\r\nAcDbEntity\r\n  8\r\nPART_${i % 7}\r\n`;

const pairs = (...values: readonly (readonly [number, string])[]): string =>
  values.map(([code, value]) => `${String(code).padStart(3)}\r\n${value}\r\n`).join('');

/** One in four a line, an arc, a circle, a polyline of four vertices: about 220 bytes each. */
function entityText(i: number): string {
  const [x, y] = [place(i, 1.37), place(i, 2.71)];
  const [x1, y1] = [place(i + 1, 1.37), place(i + 2, 2.71)];
  switch (i % 4) {
    case 0:
      return (
        common('LINE', i) + pairs([100, 'AcDbLine'], [10, x], [20, y], [30, '0.0'], [11, x1], [21, y1], [31, '0.0'])
      );
    case 1:
      return (
        common('ARC', i) +
        pairs([100, 'AcDbCircle'], [10, x], [20, y], [30, '0.0'], [40, '12.5']) +
        pairs([100, 'AcDbArc'], [50, '330.0'], [51, '45.25'])
      );
    case 2:
      return common('CIRCLE', i) + pairs([100, 'AcDbCircle'], [10, x], [20, y], [30, '0.0'], [40, '6.35']);
    default:
      return (
        common('LWPOLYLINE', i) +
        pairs([100, 'AcDbPolyline'], [90, '4'], [70, '1'], [43, '0.0'], [10, x], [20, y], [10, x1], [20, y]) +
        pairs([42, '0.41421356237'], [10, x1], [20, y1], [10, x], [20, y1])
      );
  }
}

/** Where the entities come in. */
const CUT = '0\nENTITIES-HERE\n';

/** A DXF of so many entities on seven layers. */
export function manyEntities(count: number): Uint8Array {
  const layers = layerTable(...Array.from({ length: 7 }, (_, i) => layer(`PART_${i}`, 0, i + 1)));
  const [head = '', tail = ''] = dxfText({ tables: layers, entities: CUT }).split(CUT);
  const encoder = new TextEncoder();
  const parts = [encoder.encode(head)];
  for (let from = 0; from < count; from += 5000) {
    let text = '';
    for (let i = from; i < Math.min(count, from + 5000); i++) text += entityText(i);
    parts.push(encoder.encode(text));
  }
  parts.push(encoder.encode(tail));
  const bytes = new Uint8Array(parts.reduce((sum, part) => sum + part.length, 0));
  let at = 0;
  for (const part of parts) {
    bytes.set(part, at);
    at += part.length;
  }
  return bytes;
}
