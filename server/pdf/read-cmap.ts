/**
 * Code points that a TrueType font has glyphs for, from its cmap table, formats 4 and 12 (OpenType specification, cmap).
 * Needed because a subset's own list of ranges promises more than its files hold. Throws when there is no such table.
 */
export function readCmap(font: Uint8Array): Set<number> {
  const view = new DataView(font.buffer, font.byteOffset, font.byteLength);
  const cmap = findTable(view, 'cmap');
  const found = new Set<number>();
  for (let i = 0; i < view.getUint16(cmap + 2); i++) {
    const table = cmap + view.getUint32(cmap + 4 + 8 * i + 4);
    const format = view.getUint16(table);
    if (format === 4) readSegments(view, table, found);
    else if (format === 12) readGroups(view, table, found);
  }
  if (found.size === 0) throw new Error('font: its cmap has no table of format 4 or 12');
  return found;
}

function findTable(view: DataView, tag: string): number {
  for (let i = 0; i < view.getUint16(4); i++) {
    const entry = 12 + 16 * i;
    const name = String.fromCharCode(...[0, 1, 2, 3].map((k) => view.getUint8(entry + k)));
    if (name === tag) return view.getUint32(entry + 8);
  }
  throw new Error(`font: no ${tag} table`);
}

function readSegments(view: DataView, table: number, found: Set<number>): void {
  const twice = view.getUint16(table + 6);
  const [ends, starts] = [table + 14, table + 16 + twice];
  const [deltas, offsets] = [starts + twice, starts + 2 * twice];
  for (let s = 0; s < twice; s += 2) {
    const start = view.getUint16(starts + s);
    const offset = view.getUint16(offsets + s);
    for (let code = start; code <= view.getUint16(ends + s) && code < 0xffff; code++) {
      const raw = offset === 0 ? code : view.getUint16(offsets + s + offset + 2 * (code - start));
      if (raw !== 0 && ((raw + view.getUint16(deltas + s)) & 0xffff) !== 0) found.add(code);
    }
  }
}

function readGroups(view: DataView, table: number, found: Set<number>): void {
  for (let g = 0; g < view.getUint32(table + 12); g++) {
    const group = table + 16 + 12 * g;
    const [start, end, glyph] = [view.getUint32(group), view.getUint32(group + 4), view.getUint32(group + 8)];
    for (let code = start; code <= end; code++) if (glyph + code - start !== 0) found.add(code);
  }
}
