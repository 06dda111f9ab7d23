/** DXF text, group codes and values in turn. */
const dxf = (tags: readonly (string | number)[]): string => `${tags.join('\n')}\n`;

const header = (insUnits: number | null): (string | number)[] =>
  insUnits === null ? [] : [0, 'SECTION', 2, 'HEADER', 9, '$INSUNITS', 70, insUnits, 0, 'ENDSEC'];

/** A drawing of these entities; `insUnits` as in DXF Reference, $INSUNITS: 1 inches, 4 millimetres, null leaves it out. */
export const drawing = (entities: readonly (string | number)[], insUnits: number | null = 1): string =>
  dxf([...header(insUnits), 0, 'SECTION', 2, 'ENTITIES', ...entities, 0, 'ENDSEC', 0, 'EOF']);

/** LINE entities round an upright rectangle. */
export function rectangleLines(
  minX: number,
  minY: number,
  maxX: number,
  maxY: number,
  layer = 'FRAME',
): (string | number)[] {
  const corners = [
    [minX, minY],
    [maxX, minY],
    [maxX, maxY],
    [minX, maxY],
  ] as const;
  return corners.flatMap(([x, y], i) => {
    const [toX, toY] = corners[(i + 1) % 4]!;
    return [0, 'LINE', 8, layer, 10, x, 20, y, 11, toX, 21, toY];
  });
}

/** A frame of 20 × 30 with stiles of 2 and rails of 3, drawn at 100, 50 in loose lines. */
export const frameDrawing = (insUnits: number | null = 1): string =>
  drawing([...rectangleLines(100, 50, 120, 80), ...rectangleLines(102, 53, 118, 77)], insUnits);
