import type { Extents } from '../contour/contour.ts';
import type { FeatureId } from './members.ts';

/** One dado as it is cut, before touching ones are merged; frame view. */
export interface DadoOutline {
  readonly id: FeatureId;
  readonly part: string;
  readonly index: number;
  readonly extents: Extents;
  readonly depth: number;
}
