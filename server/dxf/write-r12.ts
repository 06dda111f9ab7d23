import type { Drawing, DrawingEntity } from '#shared/kernel/drawing/drawing.ts';
import { BULGE_DECIMALS, formatNumber } from './format-number.ts';
import { headerValues, INSUNITS } from './header-values.ts';
import { inLayerOrder } from './layer-order.ts';

/** R12 files are ASCII: other characters are written as \U+XXXX, which readers of later releases turn back. */
function asciiText(text: string): string {
  return text.replace(/[^\x20-\x7e]/g, (c) => `\\U+${c.charCodeAt(0).toString(16).toUpperCase().padStart(4, '0')}`);
}

/**
 * A drawing as R12 (AC1009) after the DXF Reference of release 12: HEADER, TABLES, ENTITIES, with POLYLINE, VERTEX,
 * SEQEND and TEXT alone; no handles, no subclass markers, no owners. $INSUNITS is younger than R12, which passes over
 * header variables that it does not know; without it nobody could tell inches from millimetres.
 */
export function writeR12(drawing: Drawing): string {
  const lines: string[] = [];
  const tag = (code: number, value: string | number) => lines.push(String(code), String(value));
  const n = (value: number) => formatNumber(value, drawing.decimals);
  const zero = n(0);

  const point = (x: number, y: number, z: string) => {
    tag(10, n(x));
    tag(20, n(y));
    tag(30, z);
  };

  const entity = (e: DrawingEntity) => {
    if (e.kind === 'text') {
      tag(0, 'TEXT');
      tag(8, e.layer);
      point(e.at.x, e.at.y, zero);
      tag(40, n(e.height));
      tag(1, asciiText(e.text));
      return;
    }
    tag(0, 'POLYLINE');
    tag(8, e.layer);
    tag(66, 1);
    point(0, 0, zero);
    tag(70, e.kind === 'polyline3d' ? 8 : e.closed ? 1 : 0);
    for (const v of e.kind === 'polyline3d' ? e.points : e.vertices) {
      tag(0, 'VERTEX');
      tag(8, e.layer);
      if ('z' in v) {
        point(v.x, v.y, n(v.z));
        tag(70, 32);
      } else {
        point(v.x, v.y, zero);
        if (v.bulge !== 0) tag(42, formatNumber(v.bulge, BULGE_DECIMALS));
      }
    }
    tag(0, 'SEQEND');
    tag(8, e.layer);
  };

  const section = (name: string, content: () => void) => {
    tag(0, 'SECTION');
    tag(2, name);
    content();
    tag(0, 'ENDSEC');
  };
  const table = (name: string, size: number, content: () => void) => {
    tag(0, 'TABLE');
    tag(2, name);
    tag(70, size);
    content();
    tag(0, 'ENDTAB');
  };
  const layer = (name: string, colour: number) => {
    tag(0, 'LAYER');
    tag(2, name);
    tag(70, 0);
    tag(62, colour);
    tag(6, 'CONTINUOUS');
  };

  section('HEADER', () => {
    const variables = [
      ['ACADVER', [[1, 'AC1009']]],
      ['INSUNITS', [[70, INSUNITS[drawing.unit]]]],
      ...headerValues(drawing),
    ] as const;
    for (const [name, values] of variables) {
      tag(9, `$${name}`);
      for (const [code, value] of values) tag(code, value);
    }
  });
  section('TABLES', () => {
    table('LTYPE', 1, () => {
      tag(0, 'LTYPE');
      tag(2, 'CONTINUOUS');
      tag(70, 0);
      tag(3, 'Solid line');
      tag(72, 65);
      tag(73, 0);
      tag(40, zero);
    });
    table('LAYER', drawing.layers.length + 1, () => {
      layer('0', 7);
      for (const { name, colour } of drawing.layers) layer(name, colour);
    });
    table('STYLE', 1, () => {
      tag(0, 'STYLE');
      tag(2, 'STANDARD');
      tag(70, 0);
      tag(40, zero);
      tag(41, n(1));
      tag(50, zero);
      tag(71, 0);
      tag(42, n(1));
      tag(3, 'txt');
      tag(4, '');
    });
  });
  section('ENTITIES', () => inLayerOrder(drawing).forEach(entity));
  tag(0, 'EOF');
  return `${lines.join('\n')}\n`;
}
