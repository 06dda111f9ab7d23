/** How a shop wants its DXFs. */
export interface FileProfile {
  readonly name: string;
  readonly flavour: 'R2007' | 'R12';
  readonly unit: 'as drawn' | 'in' | 'mm';
  /** Digits behind the point. */
  readonly decimals: 4 | 5 | 6;
  /** Where 0, 0 lies: where the board meets the pins, or the frame's lower left corner. */
  readonly origin: 'pins' | 'frame';
  /** Which of the two layers that say the same opening cut. */
  readonly openingLines: 'entered' | 'axis' | 'both';
  /** Layer name from {face}, {set}, {cutter}, {depth}; see layer-name.ts. */
  readonly layerTemplate: string;
  /** Opening labels and part names as text, on a layer of their own. */
  readonly labels: boolean;
}
