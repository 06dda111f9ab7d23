import { SAME } from '../tolerances.ts';
import { CHARACTER_WIDTH, type PaperShape } from './paper-picture.ts';
import { stroke } from './paper-shapes.ts';
import type { PinDimension } from './sheet-drawing.ts';
import { spreadPlaces } from './spread-places.ts';
import { countCharacters } from './wrap-text.ts';

/** Height of dimension figures, and the least distance between two in a row, in millimetres on paper. */
export const DIMENSION_SIZE = 2.4;
const PITCH = 3;
/** From the board: clear of the pins, then the bend that leads a line to its figure, then the figure. */
const PIN_CLEAR = 4.4;
const BEND = 3.4;
const GAP = 1;

/** How far figures reach out from the board, in millimetres. */
export function dimensionBand(dimensions: readonly PinDimension[]): number {
  const longest = Math.max(0, ...dimensions.map((d) => countCharacters(d.text)));
  return longest === 0 ? PIN_CLEAR : PIN_CLEAR + BEND + 2 * GAP + longest * CHARACTER_WIDTH * DIMENSION_SIZE;
}

/** Rising, each place once; of several at one place the one that begins nearest to the figures. */
function inOrder(dimensions: readonly PinDimension[]): PinDimension[] {
  const sorted = [...dimensions].sort((a, b) => a.at - b.at || a.from - b.from);
  return sorted.reduce<PinDimension[]>((kept, d) => {
    const before = kept[kept.length - 1];
    if (before === undefined || d.at - before.at > SAME) return [...kept, d];
    kept[kept.length - 1] = { ...before, always: before.always || d.always, of: [...before.of, ...d.of] };
    return kept;
  }, []);
}

/** The paper's place of a dimension along its axis, and where figures may stand along it. */
export interface DimensionAxis {
  readonly axis: 'across' | 'up';
  readonly along: (at: number) => number;
  readonly outward: (from: number) => number;
  /** Where the board ends on the side of the figures. */
  readonly edge: number;
  readonly low: number;
  readonly high: number;
}

/**
 * Dimension lines from a common origin with their figures (running dimensions, ISO 129-1), figures moved apart so that
 * none touches the next. When they cannot all stand, only those marked `always`; `leftOut` says how many are missing.
 */
export function layOutDimensions(
  dimensions: readonly PinDimension[],
  on: DimensionAxis,
): { shapes: PaperShape[]; leftOut: number } {
  const all = inOrder(dimensions);
  const place = (chosen: readonly PinDimension[]) =>
    spreadInRange(
      chosen.map((d) => on.along(d.at)),
      on.low,
      on.high,
    );
  const wide = place(all);
  const chosen = wide ? all : all.filter((d) => d.always);
  const places = wide ?? place(chosen) ?? [];
  const shapes = places.flatMap((figure, i) => drawDimension(chosen[i]!, figure, on));
  return { shapes, leftOut: all.length - places.length };
}

/** Along paper's Y places fall as the board's rise: turn them, spread, turn back. */
function spreadInRange(places: readonly number[], low: number, high: number): number[] | undefined {
  const falling = places.length > 1 && places[0]! > places[places.length - 1]!;
  const rising = falling ? places.map((p) => -p) : places;
  const spread = falling ? spreadPlaces(rising, PITCH, -high, -low) : spreadPlaces(rising, PITCH, low, high);
  return falling ? spread?.map((p) => -p) : spread;
}

function drawDimension(d: PinDimension, figure: number, on: DimensionAxis): PaperShape[] {
  const at = on.along(d.at);
  const across = on.axis === 'across';
  const out = across ? 1 : -1;
  const point = (along: number, outward: number) => (across ? { x: along, y: outward } : { x: outward, y: along });
  const bendStart = on.edge + out * PIN_CLEAR;
  const bendEnd = bendStart + out * BEND;
  const line = stroke(
    [point(at, on.outward(d.from)), point(at, bendStart), point(figure, bendEnd), point(figure, bendEnd + out * GAP)],
    {
      colour: d.colour,
      weight: 'hairline',
    },
  );
  // Figures are centred on their line: capitals are 0.73 of the em high.
  const middle = figure + 0.365 * DIMENSION_SIZE;
  const end = point(middle, bendEnd + out * 1.6 * GAP);
  return [
    { ...line, of: d.of },
    {
      kind: 'text',
      text: d.text,
      x: end.x,
      y: end.y,
      size: DIMENSION_SIZE,
      anchor: 'end',
      turned: across,
      colour: d.colour,
      of: d.of,
    },
  ];
}
