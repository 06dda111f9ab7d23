import { describe, expect, test } from 'vitest';
import { readDrawing } from '#shared/kernel/tracing/read/read-drawing.ts';
import { bytesOf, circle, dxfText, entity, latinBytes, layer, layerTable, line, type DxfPair } from './dxf-text.ts';
import { codesOf, rowsOf } from './found.ts';

const text = dxfText({
  tables: layerTable(layer('A', 0, 7)),
  entities:
    line(1, 2.5, 3, 4, [8, 'A']) +
    circle(1, 1, 2) +
    entity('LWPOLYLINE', [70, 1], [10, 0], [20, 0], [10, 1], [20, 0], [10, 1], [20, 1]),
});

describe('When lines end in other ways', () => {
  const plain = readDrawing(bytesOf(text));

  test.each([
    ['CR', '\r'],
    ['CR LF', '\r\n'],
    ['CR CR LF', '\r\r\n'],
  ])('then %s gives the same drawing with the same line numbers', (_, end) => {
    expect(rowsOf(plain).length).toBe(6);
    expect(readDrawing(bytesOf(text.replaceAll('\n', end)))).toEqual(plain);
  });

  test('then ways mixed line by line do', () => {
    const ends = ['\n', '\r\n', '\r\r\n'];
    let i = 0;
    expect(readDrawing(bytesOf(text.replaceAll('\n', () => ends[i++ % 3]!)))).toEqual(plain);
  });

  test('then space and tabs about codes and values do not count, nor does a DOS end mark', () => {
    const spaced = text.replaceAll('\n', ' \t\n  ');
    expect(readDrawing(bytesOf(`  ${spaced}\x1a`))).toEqual(plain);
  });

  test('then a byte order mark, comments (999) and empty lines at the end do not count', () => {
    expect(rowsOf(readDrawing(bytesOf(`\ufeff999\nmade by hand\n${text}\n\n`)))).toEqual(rowsOf(plain));
    expect(readDrawing(bytesOf(`\ufeff999\nmade by hand\n${text}`)).problems).toEqual([]);
  });
});

describe('When layers have letters beyond ASCII', () => {
  const version = (name: string): DxfPair[] => [
    [9, '$ACADVER'],
    [1, name],
  ];
  const page = (name: string): DxfPair[] => [
    [9, '$DWGCODEPAGE'],
    [3, name],
  ];
  const file = (header: readonly DxfPair[], name: string) => dxfText({ header, entities: line(0, 0, 1, 0, [8, name]) });
  const layerOf = (bytes: Uint8Array) => readDrawing(bytes).census[0]!.layer;

  test('then Windows-1252 is read by its table, 0x80 to 0x9F among it', () => {
    const bytes = latinBytes(file([...version('AC1015'), ...page('ANSI_1252')], 'T\xfcr \x80 \x96\xdf'));
    expect(layerOf(bytes)).toBe('Tür € –ß');
  });

  test('then versions from AC1021 on are UTF-8 whatever the code page says, with a mark or without', () => {
    const text = file([...version('AC1021'), ...page('ANSI_1252')], 'Tür € 木');
    expect(layerOf(bytesOf(text))).toBe('Tür € 木');
    expect(layerOf(bytesOf(`\ufeff${text}`))).toBe('Tür € 木');
  });

  test('then a mark makes UTF-8 of an older file', () => {
    expect(layerOf(bytesOf(`\ufeff${file([...version('AC1009'), ...page('ANSI_1252')], 'Tür')}`))).toBe('Tür');
  });

  test('then a file that says nothing is UTF-8 where it can be, Windows-1252 where not', () => {
    expect(layerOf(bytesOf(file([], 'Tür')))).toBe('Tür');
    expect(layerOf(latinBytes(file([], 'T\xfcr')))).toBe('Tür');
  });

  test('then other code pages are read by theirs', () => {
    expect(layerOf(latinBytes(file([...version('AC1015'), ...page('ANSI_1251')], '\xc4\xe2\xe5\xf0\xfc')))).toBe(
      'Дверь',
    );
    expect(layerOf(latinBytes(file([...version('AC1015'), ...page('ANSI_932')], '\x96\xd8')))).toBe('木');
  });

  test('then an unknown code page is told', () => {
    const found = readDrawing(bytesOf(file([...version('AC1015'), ...page('ANSI_7')], 'A')));
    expect(codesOf(found)).toContain('code-page-unknown');
  });

  test('then escapes become letters in either case', () => {
    expect(layerOf(bytesOf(file([...version('AC1015'), ...page('ANSI_1252')], 'T\\U+00FCr \\U+20ac \\U+12')))).toBe(
      'Tür € \\U+12',
    );
  });

  test('then a layer is one layer whatever its case and however it is written', () => {
    const tables = layerTable(layer('T\\U+00FCR', 1, 7));
    const found = readDrawing(bytesOf(dxfText({ tables, entities: line(0, 0, 1, 0, [8, 'tür']) })));
    expect(found.census[0]).toMatchObject({ fate: 'aside', reason: 'layer-frozen' });
  });
});
